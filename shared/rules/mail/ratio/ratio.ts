import type { JudgedSet } from '../../../assembly/judge-set.ts'
import { add, scale, shift } from '../../../uncertainty/arithmetic.ts'
import type { Dimension } from '../../../uncertainty/dimension.ts'
import { distributionOf } from '../../../uncertainty/distribution.ts'
import type { Finding, Rule } from '../../rule.ts'
import { outOfHundred } from '../../wording.ts'
import { advice, judgeMail, packInWords, type MailedItem } from '../mailed-items.ts'
import type { MailPack } from '../packs.ts'

/** Length over width, linearised at the nominal: r = L/W, dr = dL/W − L dW/W² (derived). */
export function ratioOf(length: Dimension, width: Dimension): Dimension {
  const nominal = length.nominal / width.nominal
  return shift(add(scale(length, 1 / width.nominal), scale(width, -nominal / width.nominal)), nominal)
}

function judgeRatio(
  judged: JudgedSet,
  pack: MailPack,
  item: MailedItem,
): Pick<Finding, 'severity' | 'measure' | 'message'> {
  const ratio = ratioOf(item.length, item.width)
  const { min, max } = pack.ratio ?? { min: null, max: null }
  const distribution = distributionOf(ratio)
  // The limit itself is allowed: what is drawn exactly on it is not outside.
  const below = min === null ? 0 : distribution.below(min - 1e-9)
  const above = max === null ? 0 : 1 - distribution.below(max + 1e-9)
  const share = 1 - below - above
  const { target } = judged.set.tokens
  const isWithin = share >= target
  const isLow = below >= above
  const limits = max === null ? `at least ${String(min ?? 0)}` : `${String(min ?? 0)} to ${String(max)}`
  const has = `${item.words} is ${ratio.nominal.toFixed(2)} times as long as wide`
  return {
    severity: isWithin ? 'pass' : 'warn',
    measure: { actual: share, limit: target, sense: 'at-least', unit: 'share' },
    message: isWithin
      ? `${has}, within ${limits} of ${packInWords(pack)} in ${outOfHundred(share)} of 100 builds.`
      : `${has}; ${packInWords(pack)} takes ${limits}, and ${outOfHundred(isLow ? below : above)} of 100 builds are ${isLow ? 'squarer' : 'longer'}. ${pack.note === null ? '' : `${pack.note} `}${advice}`,
  }
}

export const mailRatioRule: Rule = {
  id: 'mail/ratio',
  level: 'warn',
  title: 'The filled envelope is as oblong as the post wants it',
  why: 'Sorting machines turn square envelopes round; a size right at the limit fails in some builds and passes in others.',
  origin: {
    kind: 'published',
    source:
      'Dated limits of postal operators; the share of builds from the length and width with all their sources, linearised.',
  },
  remedy: 'Make the envelope longer or narrower by a mark, or say that it goes at a surcharge.',
  judge: (judged) =>
    judgeMail(
      judged,
      (pack) => pack.ratio !== null,
      (pack, item) => judgeRatio(judged, pack, item),
    ),
}
