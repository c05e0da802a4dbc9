import type { JudgedSet } from '../../../assembly/judge-set.ts'
import { add } from '../../../uncertainty/arithmetic.ts'
import { distributionOf } from '../../../uncertainty/distribution.ts'
import type { Finding, Rule } from '../../rule.ts'
import { inSetUnits, outOfHundred, sizeInSetUnits } from '../../wording.ts'
import { advice, judgeMail, packInWords, type MailedItem } from '../mailed-items.ts'
import type { MailPack } from '../packs.ts'
import { worstBeyond } from '../share-within.ts'

interface Miss {
  readonly what: string
  readonly share: number
}

/** Everything about its size that an item can miss, with the share of builds that do. */
function missesOf(judged: JudgedSet, pack: MailPack, item: MailedItem): readonly Miss[] {
  const misses: Miss[] = []
  for (const axis of ['length', 'width'] as const) {
    const beyond = worstBeyond(item[axis], pack[axis], pack.tolerance)
    if (beyond === null) continue
    const word = { length: { below: 'shorter', above: 'longer' }, width: { below: 'narrower', above: 'wider' } }
    misses.push({ what: `${word[axis][beyond.side]} than ${inSetUnits(judged, beyond.limit)}`, share: beyond.share })
  }
  if (pack.sum !== null) {
    const sum = worstBeyond(add(item.length, item.width, item.thickness), { min: null, max: pack.sum })
    if (sum !== null)
      misses.push({ what: `longer, wider and thicker together than ${inSetUnits(judged, pack.sum)}`, share: sum.share })
  }
  if (pack.exceeds !== null) {
    const { exceeds } = pack
    const within = (['length', 'width', 'thickness'] as const).map((axis) =>
      distributionOf(item[axis]).below(exceeds[axis]),
    )
    const least = sizeInSetUnits(judged, [exceeds.length, exceeds.width, exceeds.thickness])
    misses.push({ what: `no larger than ${least} anywhere, which is a smaller class`, share: Math.min(...within) })
  }
  return misses
}

function judgeSize(
  judged: JudgedSet,
  pack: MailPack,
  item: MailedItem,
): Pick<Finding, 'severity' | 'measure' | 'message'> {
  const worst = missesOf(judged, pack, item).toSorted((a, b) => b.share - a.share)[0]
  const { target } = judged.set.tokens
  const share = worst?.share ?? 0
  const isWithin = 1 - share >= target
  const size = sizeInSetUnits(judged, [item.length.nominal, item.width.nominal])
  return {
    severity: isWithin ? 'pass' : 'warn',
    measure: { actual: 1 - share, limit: target, sense: 'at-least', unit: 'share' },
    message:
      isWithin || worst === undefined
        ? `${item.words} is ${size}, within ${packInWords(pack)}: ${outOfHundred(1 - share)} of 100 builds.`
        : `${item.words} is ${size}, and ${outOfHundred(share)} of 100 builds are ${worst.what}, outside ${packInWords(pack)}. ${advice}`,
  }
}

export const mailSizeRule: Rule = {
  id: 'mail/size',
  level: 'warn',
  title: 'The filled envelope has a size the post takes',
  why: 'An envelope a little beyond the limit costs more or comes back, and people learn it at the counter.',
  origin: {
    kind: 'published',
    source: 'Dated limits of postal operators; each pack names its text, its date and how it was read.',
  },
  remedy: 'Make the envelope smaller, name the class it belongs to, or take the rule out for that set.',
  judge: (judged) =>
    judgeMail(
      judged,
      () => true,
      (pack, item) => judgeSize(judged, pack, item),
    ),
}
