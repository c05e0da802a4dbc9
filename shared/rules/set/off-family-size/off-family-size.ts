import type { JudgedSet } from '../../../assembly/judge-set.ts'
import type { PieceGiven } from '../../../pieces/given.ts'
import type { NamedSize } from '../../../template/template-model.ts'
import { ruleLimits } from '../../rule-limits.ts'
import type { Finding, Rule } from '../../rule.ts'
import { listInWords, sizeInSetUnits } from '../../wording.ts'

/** Finished size of a card or an insert; other pieces take theirs from these. */
function finishedSize(piece: PieceGiven): NamedSize | null {
  const size = piece.kind === 'card' ? piece.folded : piece.kind === 'insert' ? piece.size : null
  return size === null || size === 'fit'
    ? null
    : { length: Math.max(size.length, size.width), width: Math.min(size.length, size.width) }
}

/** How far two sizes lie apart, the larger side with the larger. */
function apart(a: NamedSize, b: NamedSize): number {
  const long = Math.max(b.length, b.width)
  const short = Math.min(b.length, b.width)
  return Math.max(Math.abs(a.length - long), Math.abs(a.width - short))
}

function judgePiece(judged: JudgedSet, piece: PieceGiven): readonly Finding[] {
  const size = finishedSize(piece)
  const nearest =
    size === null ? [] : [...judged.set.familySizes].toSorted((a, b) => apart(size, a[1]) - apart(size, b[1]))
  const [best] = nearest
  if (size === null || best === undefined) return []
  const [name, bestSize] = best
  const by = apart(size, bestSize)
  const limit = ruleLimits.familySizeNear.value
  const isNear = by <= limit
  const has = sizeInSetUnits(judged, [size.length, size.width])
  const family = judged.set.family ?? ''
  return [
    {
      subject: piece.name,
      severity: isNear ? 'pass' : 'warn',
      measure: { actual: by, limit, sense: 'at-most', unit: 'mm' },
      message: isNear
        ? `${piece.name} is ${has}, the size ${name} of ${family}.`
        : `${piece.name} is ${has}, which is none of the sizes of ${family} (${listInWords([...judged.set.familySizes.keys()])}). The nearest is ${name}, ${sizeInSetUnits(judged, [bestSize.length, bestSize.width])}: take it, or add this size to the family.`,
      path: ['pieces', piece.name],
    },
  ]
}

export const offFamilySizeRule: Rule = {
  id: 'set/off-family-size',
  level: 'warn',
  title: 'Cards keep to the sizes of their family',
  why: 'A family promises that cards of one set go into envelopes and boxes of another. One card a few millimetres off breaks that without any fit failing.',
  origin: { kind: 'common practice', source: 'The sizes a family names in the workspace.' },
  remedy: 'Take the nearest size of the family, or add the new size to it.',
  judge: (judged) => [...judged.set.pieces.values()].flatMap((piece) => judgePiece(judged, piece)),
}
