import type { Finding, Rule } from '../../rule.ts'
import { listInWords } from '../../wording.ts'
import { advice, judgeMail, packInWords, type MailedItem } from '../mailed-items.ts'
import type { MailPack } from '../packs.ts'

const grams = (value: number): string => `${value < 10 ? value.toFixed(1) : value.toFixed(0)} g`

function judgeWeight(pack: MailPack, item: MailedItem): Pick<Finding, 'severity' | 'measure' | 'message'> {
  const { min, max } = pack.weight
  const unknown =
    item.unweighed.length === 0 ? '' : ` without ${listInWords(item.unweighed)}, whose weight is not known`
  const has = `The paper of ${item.words} weighs about ${grams(item.weight)}${unknown}`
  const isHeavy = max !== null && item.weight > max
  if (isHeavy)
    return {
      severity: 'info',
      measure: { actual: item.weight, limit: max, sense: 'at-most', unit: 'g' },
      message: `${has}, more than the ${grams(max)} of ${packInWords(pack)}. ${advice}`,
    }
  if (item.unweighed.length > 0)
    return { severity: 'unchecked', measure: null, message: `${has}; ${packInWords(pack)} is not held against that.` }
  const isLight = min !== null && item.weight < min
  return {
    severity: isLight ? 'info' : 'pass',
    measure: isLight
      ? { actual: item.weight, limit: min, sense: 'at-least', unit: 'g' }
      : { actual: item.weight, limit: max ?? item.weight, sense: 'at-most', unit: 'g' },
    message: isLight
      ? `${has}, less than the ${grams(min)} of ${packInWords(pack)}. ${advice}`
      : `${has}, within ${packInWords(pack)}.`,
  }
}

export const mailWeightRule: Rule = {
  id: 'mail/weight',
  level: 'info',
  title: 'The filled envelope is light enough',
  why: 'A heavier card moves a letter into the next class, which whoever posts it should know before buying stamps.',
  origin: {
    kind: 'published',
    source:
      'Dated limits of postal operators; the weight is that of the sheets by area and grammage, without glue and what is stuck on.',
  },
  remedy: 'Use lighter paper, or name the class it belongs to.',
  judge: (judged) => judgeMail(judged, (pack) => pack.weight.min !== null || pack.weight.max !== null, judgeWeight),
}
