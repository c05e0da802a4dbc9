import { point, rectangle } from '../../geometry/rectangle.ts'
import { area, grainAlong, makeBlank, measure, score, segment, type DrawContext } from '../blank-parts.ts'
import type { Blank } from '../blank.ts'
import type { FoldedPiece } from '../folded-piece.ts'

/** A gusseted bag, inside up: the seam at the left, faces and gussets along x, the bottom below and the top above. */
export function drawBag(piece: FoldedPiece, context: DrawContext): readonly Blank[] {
  const { form, given } = piece
  if (form.kind !== 'bag') return []
  const { face, gusset, height } = form.panels
  const floor = form.bottom
  const rim = floor + height
  const high = rim + form.top
  const corners = [form.seam, form.seam + face, form.seam + face + gusset, form.seam + 2 * face + gusset]
  const total = form.seam + 2 * (face + gusset)
  const middles = [form.seam + face + gusset / 2, total - gusset / 2]
  const names = ['front', 'first gusset', 'back', 'second gusset'] as const
  const outline = rectangle(0, 0, total, high)
  return [
    makeBlank({
      name: context.name,
      stock: given.stock,
      outline,
      scores: [
        ...corners.map((x, index) => score(`upright ${String(index + 1)}`, segment(x, 0, x, high), 90)),
        ...middles.map((x, index) =>
          score(`gusset middle ${String(index + 1)}`, segment(x, 0, x, high), 180, 'mountain'),
        ),
        ...(form.bottom > 0 ? [score('bottom', segment(0, floor, total, floor), 90)] : []),
        ...(form.top > 0 ? [score('turned-in top', segment(0, rim, total, rim), 180)] : []),
      ],
      areas: () => [
        ...corners.map((x, index) =>
          area('panel', names[index] ?? 'panel', rectangle(x, floor, corners[index + 1] ?? total, rim)),
        ),
        ...(form.seam > 0
          ? [
              area('tab', 'seam', rectangle(0, floor, form.seam, rim)),
              area('glue', 'seam', rectangle(0, floor, form.seam, rim)),
            ]
          : []),
        ...(form.bottom > 0 ? [area('flap', 'bottom', rectangle(0, 0, total, floor))] : []),
        ...(form.top > 0 ? [area('flap', 'turned-in top', rectangle(0, rim, total, high))] : []),
      ],
      measures: () => [
        measure('blank length', point(0, high), point(total, high)),
        measure('blank height', point(0, 0), point(0, high)),
        measure('seam', point(0, 0), point(form.seam, 0)),
        measure('first face', point(0, 0), point(form.seam + face, 0)),
        measure('first gusset', point(0, 0), point(form.seam + face + gusset, 0)),
        measure('second face', point(0, 0), point(form.seam + 2 * face + gusset, 0)),
        measure('bottom', point(total, 0), point(total, floor)),
        measure('turned-in top', point(total, rim), point(total, high)),
      ],
      // Length of a bag is its face, along x.
      grain: grainAlong(context, given.stock, 'x'),
    }),
  ]
}
