import { boundsOf } from '../../geometry/bounds.ts'
import { clipToHalfPlane } from '../../geometry/clip-convex.ts'
import { edgesOf } from '../../geometry/contains-point.ts'
import { point } from '../../geometry/rectangle.ts'
import type { Point, Polygon } from '../../geometry/shapes.ts'
import { samePoint } from '../../geometry/tolerance.ts'
import { withoutRepeats } from '../../geometry/without-repeats.ts'
import type { Millimetres } from '../../units/units.ts'
import { area, grainAlong, makeBlank, measure, score, segment, type DrawContext } from '../blank-parts.ts'
import type { Blank } from '../blank.ts'
import type { EnvelopeGiven } from './envelope-given.ts'

/** A liner stays this far inside the face, and clear of the gummed edge of the seal flap (common practice). */
const insetAtSides: Millimetres = 2
const insetAtGum: Millimetres = 12

/** The seal flap less its gummed edges: every edge but the fold moved inwards. */
function withoutGum(flap: Polygon, fold: Millimetres): Polygon {
  let kept = flap
  for (const { from, to } of edgesOf(flap)) {
    const isFold = Math.abs(from.y - fold) < samePoint && Math.abs(to.y - fold) < samePoint
    const isUpright = Math.abs(from.x - to.x) < samePoint
    const inset = isFold ? 0 : isUpright ? insetAtSides : insetAtGum
    const long = Math.hypot(to.x - from.x, to.y - from.y)
    if (long < samePoint) continue
    const inward = point((-(to.y - from.y) / long) * inset, ((to.x - from.x) / long) * inset)
    const move = (p: Point): Point => point(p.x + inward.x, p.y + inward.y)
    kept = clipToHalfPlane(kept, move(from), move(to))
  }
  return kept
}

/** A liner: one sheet behind the face that runs up into the seal flap, short of the gum; scored at the flap's fold. */
export function drawLiner(
  context: DrawContext,
  given: EnvelopeGiven,
  [face, flap]: readonly [Polygon, Polygon],
  lengthRuns: 'x' | 'y',
): readonly Blank[] {
  if (given.liner === null) return []
  const { left, right, bottom, top } = boundsOf(face)
  const [x1, x2, floor] = [left + insetAtSides, right - insetAtSides, bottom + insetAtSides]
  const upper = withoutGum(flap, top)
  const onFold = upper.filter((corner) => Math.abs(corner.y - top) < samePoint)
  const ends = boundsOf(onFold)
  const above = upper.filter((corner) => corner.y - top >= samePoint)
  // Above the fold the points run counter-clockwise too, so they follow on from the lower right corner.
  const start = above.findIndex((corner) => corner.x === Math.max(...above.map((other) => other.x)))
  const ordered = [...above.slice(start), ...above.slice(0, start)]
  const shoulders = [point(x2, top), point(ends.right, top), ...ordered, point(ends.left, top), point(x1, top)]
  const outline = withoutRepeats([point(x1, floor), point(x2, floor), ...shoulders])
  const peak = boundsOf(outline).top
  const middle = (x1 + x2) / 2
  return [
    makeBlank({
      name: `${context.name}/liner`,
      stock: given.liner,
      outline,
      scores: onFold.length < 2 ? [] : [score('flap fold', segment(ends.left, top, ends.right, top), 180)],
      areas: () => [area('panel', 'liner', outline)],
      measures: () => [
        measure('width', point(x1, floor), point(x2, floor)),
        measure('height', point(middle, floor), point(middle, peak)),
        measure('flap fold', point(x1, floor), point(x1, top)),
      ],
      grain: grainAlong(context, given.liner, lengthRuns),
    }),
  ]
}
