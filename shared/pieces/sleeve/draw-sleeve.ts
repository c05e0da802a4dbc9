import { point, rectangle } from '../../geometry/rectangle.ts'
import { area, grainAlong, makeBlank, measure, score, segment, type DrawContext } from '../blank-parts.ts'
import type { Blank } from '../blank.ts'
import type { FoldedPiece } from '../folded-piece.ts'

const panelNames = ['bottom', 'side', 'top', 'far side'] as const

/** A sleeve, inside up: its girth along x, the lap last, glued under the first panel. */
export function drawSleeve(piece: FoldedPiece, context: DrawContext): readonly Blank[] {
  const { form, given } = piece
  if (form.kind !== 'sleeve') return []
  const ends = form.panels.reduce<number[]>((found, panel) => [...found, (found.at(-1) ?? 0) + panel], [])
  const lap = ends.at(-1) ?? 0
  const total = lap + form.overlap.nominal
  const high = form.length
  const outline = rectangle(0, 0, total, high)
  return [
    makeBlank({
      name: context.name,
      stock: given.stock,
      outline,
      scores: ends.map((x, index) => score(`score ${String(index + 1)}`, segment(x, 0, x, high), 90)),
      areas: () => [
        ...ends.map((x, index) =>
          area('panel', panelNames[index] ?? 'panel', rectangle(x - (form.panels[index] ?? 0), 0, x, high)),
        ),
        area('tab', 'lap', rectangle(lap, 0, total, high)),
        area('glue', 'lap', rectangle(lap, 0, total, high)),
      ],
      measures: () => [
        measure('blank length', point(0, high), point(total, high)),
        measure('width along the tube', point(0, 0), point(0, high)),
        ...ends.map((x, index) => measure(`score ${String(index + 1)}`, point(0, 0), point(x, 0))),
      ],
      grain: grainAlong(context, given.stock, form.wrapped === 'width' ? 'y' : 'x'),
    }),
  ]
}
