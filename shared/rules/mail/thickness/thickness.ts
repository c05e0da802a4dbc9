import type { JudgedSet } from '../../../assembly/judge-set.ts'
import type { Range } from '../../../units/units.ts'
import type { Finding, Rule } from '../../rule.ts'
import { inSetUnits, outOfHundred } from '../../wording.ts'
import { advice, judgeMail, packInWords, type MailedItem } from '../mailed-items.ts'
import type { MailPack } from '../packs.ts'
import { worstBeyond } from '../share-within.ts'

/** Limits of thickness for an item of this size: large ones must be thicker under some rules. */
function limitsFor(pack: MailPack, item: MailedItem): Range {
  const { largeLeast } = pack
  const isLarge =
    largeLeast !== null && (item.length.nominal > largeLeast.length || item.width.nominal > largeLeast.width)
  return isLarge ? { min: largeLeast.thickness, max: pack.thickness.max } : pack.thickness
}

function judgeThickness(
  judged: JudgedSet,
  pack: MailPack,
  item: MailedItem,
): Pick<Finding, 'severity' | 'measure' | 'message'> {
  const beyond = worstBeyond(item.thickness, limitsFor(pack, item))
  const share = beyond?.share ?? 0
  const { target } = judged.set.tokens
  const isWithin = 1 - share >= target
  const thick = inSetUnits(judged, item.thickness.nominal)
  return {
    severity: isWithin ? 'pass' : 'warn',
    measure: { actual: 1 - share, limit: target, sense: 'at-least', unit: 'share' },
    message:
      isWithin || beyond === null
        ? `${item.words} is ${thick} thick, within ${packInWords(pack)}: ${outOfHundred(1 - share)} of 100 builds.`
        : `${item.words} is ${thick} thick, and ${outOfHundred(share)} of 100 builds are ${beyond.side === 'below' ? 'thinner' : 'thicker'} than ${inSetUnits(judged, beyond.limit)}, outside ${packInWords(pack)}. ${advice}`,
  }
}

export const mailThicknessRule: Rule = {
  id: 'mail/thickness',
  level: 'warn',
  title: 'The filled envelope has a thickness the post takes',
  why: 'Layers, flags and raised decoration add up. Lumpy letters are charged more, or torn by the machines.',
  origin: {
    kind: 'published',
    source: 'Dated limits of postal operators; the thickness is that of a pack of one, with its loft (a guess).',
  },
  remedy: 'Take a layer off, use thinner paper, or name the class it belongs to.',
  judge: (judged) =>
    judgeMail(
      judged,
      (pack) => pack.thickness.min !== null || pack.thickness.max !== null,
      (pack, item) => judgeThickness(judged, pack, item),
    ),
}
