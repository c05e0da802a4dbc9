import { rectangle } from '../../geometry/rectangle.ts'
import { point } from '../../geometry/rectangle.ts'
import { area, grainAlong, makeBlank, measure, score, segment, type DrawContext } from '../blank-parts.ts'
import type { Blank } from '../blank.ts'
import type { FoldedPiece } from '../folded-piece.ts'
import type { BandGiven } from './band-given.ts'

/** A band's strip along x, inside up, its lap at the right; a ribbon is bought by the length and has no sheet. */
export function drawBand(piece: FoldedPiece, given: BandGiven, context: DrawContext): readonly Blank[] {
  if (piece.form.kind !== 'band' || given.ribbon) return []
  const long = piece.form.stripLength.nominal
  const wide = given.width
  const scores = given.blank === null || given.blank === 'fit' ? [] : given.blank.scores
  const lap = Math.min(given.overlap, long)
  return [
    makeBlank({
      name: context.name,
      stock: given.stock,
      outline: rectangle(0, 0, long, wide),
      scores: scores.map((x, index) => score(`score ${String(index + 1)}`, segment(x, 0, x, wide), 90)),
      areas: () => [
        area('panel', 'band', rectangle(0, 0, long, wide)),
        ...(lap > 0 ? [area('glue', 'lap', rectangle(long - lap, 0, long, wide))] : []),
      ],
      measures: () => [
        measure('length', point(0, wide), point(long, wide)),
        measure('width', point(0, 0), point(0, wide)),
        ...scores.map((x, index) => measure(`score ${String(index + 1)}`, point(0, 0), point(x, 0))),
      ],
      grain: grainAlong(context, given.stock, 'x'),
    }),
  ]
}
