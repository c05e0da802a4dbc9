import type { JudgedSet } from '../../../assembly/judge-set.ts'
import type { FoldedPiece } from '../../../pieces/folded-piece.ts'
import { sameLength } from '../../../units/epsilon.ts'
import type { Finding, Rule } from '../../rule.ts'
import { inSetUnits } from '../../wording.ts'

function judgeCard(judged: JudgedSet, name: string, { given, form }: FoldedPiece): readonly Finding[] {
  if (given.kind !== 'card' || form.kind !== 'card' || given.style !== 'single' || given.fold === 'none') return []
  const [first, second] = form.panels
  if (first === undefined || second === undefined) return []
  const grid = judged.set.tokens.ruler.score
  const apart = Math.abs(first - second)
  const isEqual = apart <= grid + sameLength
  const middle = (first + second) / 2
  return [
    {
      subject: name,
      severity: isEqual ? 'pass' : 'warn',
      measure: { actual: apart, limit: grid, sense: 'at-most', unit: 'mm' },
      message: isEqual
        ? `The two panels of ${name} are ${apart < sameLength ? 'equal' : `${inSetUnits(judged, apart)} apart`}.`
        : `The fold of ${name} is not in the middle: its panels are ${inSetUnits(judged, first)} and ${inSetUnits(judged, second)}. Half of the blank is ${inSetUnits(judged, middle)}; fold it there, or waive this where the step is meant.`,
      path: ['pieces', name],
    },
  ]
}

export const panelsUnequalRule: Rule = {
  id: 'blank/panels-unequal',
  level: 'warn',
  title: 'A card folded once is folded in the middle',
  why: 'A fold mark that is not half of the blank is an easy slip, and a published size table has one: a blank of 10 1/2 in with its fold at 5 in.',
  origin: { kind: 'derived', source: 'Difference of the two panels against the mark a maker can find for a score.' },
  remedy: 'Fold at half the blank; where the step is meant, waive the rule for that card.',
  judge: (judged) => [...judged.pieces].flatMap(([name, piece]) => judgeCard(judged, name, piece)),
}
