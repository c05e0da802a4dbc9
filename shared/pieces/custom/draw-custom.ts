import { boundsOf } from '../../geometry/bounds.ts'
import { point } from '../../geometry/rectangle.ts'
import { area, grainAlong, makeBlank, measure, type DrawContext } from '../blank-parts.ts'
import type { Blank } from '../blank.ts'
import type { CustomGiven } from './custom-given.ts'

/** A custom piece as its author drew it. */
export function drawCustom(given: CustomGiven, context: DrawContext): readonly Blank[] {
  const { left, bottom, right, top } = boundsOf(given.outline)
  return [
    makeBlank({
      name: context.name,
      stock: given.stock,
      outline: given.outline,
      scores: given.scores.map((line, index) => ({ ...line, name: `score ${String(index + 1)}` })),
      areas: () => [area('panel', context.name, given.outline)],
      measures: () => [
        measure('overall across', point(left, bottom), point(right, bottom)),
        measure('overall up', point(left, bottom), point(left, top)),
      ],
      grain: grainAlong(context, given.stock, right - left >= top - bottom ? 'x' : 'y'),
    }),
  ]
}
