import { boundsOf } from '../../geometry/bounds.ts'
import { point, rectangle } from '../../geometry/rectangle.ts'
import { roundCorners } from '../../geometry/round-corner.ts'
import type { Polygon } from '../../geometry/shapes.ts'
import type { Millimetres } from '../../units/units.ts'
import { area, grainAlong, makeBlank, measure, type DrawContext } from '../blank-parts.ts'
import type { Blank } from '../blank.ts'
import type { FoldedPiece } from '../folded-piece.ts'

/** A flat sheet, its longer side along x, with an outline that may be other than a rectangle. */
export function drawFlatSheet(
  context: DrawContext,
  sheet: { readonly name: string; readonly stock: string | null; readonly part: string; readonly outline: Polygon },
): Blank {
  const { left, bottom, right, top } = boundsOf(sheet.outline)
  return makeBlank({
    name: sheet.name,
    stock: sheet.stock,
    outline: sheet.outline,
    areas: () => [area('panel', sheet.part, sheet.outline)],
    measures: () => [
      measure('length', point(left, bottom), point(right, bottom)),
      measure('width', point(left, bottom), point(left, top)),
    ],
    grain: grainAlong(context, sheet.stock, 'x'),
  })
}

/** A rectangle lying along x with rounded corners. */
export const flatRectangle = (length: Millimetres, width: Millimetres, corner: Millimetres): Polygon =>
  roundCorners(rectangle(0, 0, length, width), corner)

/** An insert or divider: one flat sheet, as often as its count says. */
export function drawInsert(piece: FoldedPiece, context: DrawContext): readonly Blank[] {
  const { given, blank } = piece
  if (blank === null) return []
  const outline = flatRectangle(blank.length, blank.width, given.corner)
  return [drawFlatSheet(context, { name: context.name, stock: given.stock, part: given.kind, outline })]
}
