import { foldedSize } from '../../../pieces/card/card-panels.ts'
import type { FoldedPiece } from '../../../pieces/folded-piece.ts'
import { ruleLimits } from '../../rule-limits.ts'

/** Two measures of a piece that must be the same. */
export interface Sum {
  /** In the author's nouns: `the panels`, `the scores`. */
  readonly what: string
  readonly is: number
  readonly stated: string
  readonly must: number
}

/** Panels against the blank they are cut from, and the widest against the size of the folded card. */
function cardSums({ given, form }: FoldedPiece): readonly Sum[] {
  if (given.kind !== 'card' || form.kind !== 'card') return []
  const size = foldedSize(given)
  if (size.across === null) return []
  const across = size[size.across]
  const along = size[size.across === 'width' ? 'length' : 'width']
  const total = form.panels.reduce((sum, panel) => sum + panel, 0)
  const widest = Math.max(...form.panels)
  const folded: Sum = { what: 'the widest panel', is: widest, stated: 'the folded size', must: across }
  if (given.blank === null) return [folded]
  const sides = [given.blank.length, given.blank.width] as const
  const isFirstAlong = Math.abs(sides[0] - along) <= Math.abs(sides[1] - along)
  return [
    { what: 'the blank along the fold', is: sides[isFirstAlong ? 0 : 1], stated: 'the folded size', must: along },
    { what: 'the panels together', is: total, stated: 'the blank', must: sides[isFirstAlong ? 1 : 0] },
    folded,
  ]
}

/** Panels between given scores that face each other. */
function facing(panels: readonly number[], names: readonly [string, string]): readonly Sum[] {
  const [first, second, third, fourth] = panels
  if (first === undefined || second === undefined || third === undefined || fourth === undefined) return []
  return [
    { what: `the third ${names[0]}`, is: third, stated: `the ${names[0]} it faces`, must: first },
    { what: `the fourth ${names[1]}`, is: fourth, stated: `the ${names[1]} it faces`, must: second },
  ]
}

function wrapSums({ given, form }: FoldedPiece): readonly Sum[] {
  if (form.kind === 'sleeve') return facing(form.panels, ['panel', 'panel'])
  if (given.kind !== 'bag' || given.blank === null || form.kind !== 'bag') return []
  const { length, scores } = given.blank
  const first = scores[0] ?? 0
  const { face, gusset } = form.panels
  return [
    {
      what: 'the second face and gusset',
      is: length - first - face - gusset,
      stated: 'the first',
      must: face + gusset,
    },
  ]
}

/** What the boxes of a set are cut from against what their scores leave: blank = between the scores + both walls. */
function boxSums({ form, blank }: FoldedPiece): readonly Sum[] {
  if (form.kind !== 'box' || blank === null) return []
  return (['length', 'width'] as const).map((axis) => ({
    what: `the ${axis} between the scores and both walls`,
    is: form.scored[axis] + form.walls[axis][0] + form.walls[axis][1],
    stated: 'the blank',
    must: blank[axis],
  }))
}

/** Sums among the measures of a piece; none where it states nothing twice. */
export const sumsOf = (piece: FoldedPiece): readonly Sum[] => [
  ...cardSums(piece),
  ...boxSums(piece),
  ...wrapSums(piece),
]

/** How far a sum is off. */
export const offBy = (sum: Sum): number => Math.abs(sum.is - sum.must)

export const addsUp = (sum: Sum): boolean => offBy(sum) <= ruleLimits.addsUpWithin.value
