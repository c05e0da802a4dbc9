import type { Millimetres } from '../units/units.ts'
import type { Point, Polygon, Segment } from './shapes.ts'
import { samePoint } from './tolerance.ts'

/** Shortest way from a point to a segment, in millimetres. */
export function distanceToSegment(p: Point, { from, to }: Segment): Millimetres {
  const dx = to.x - from.x
  const dy = to.y - from.y
  const square = dx * dx + dy * dy
  const share = square === 0 ? 0 : Math.min(1, Math.max(0, ((p.x - from.x) * dx + (p.y - from.y) * dy) / square))
  return Math.hypot(p.x - from.x - share * dx, p.y - from.y - share * dy)
}

/** The edges of a closed outline, in order. */
export function edgesOf(polygon: Polygon): readonly Segment[] {
  return polygon.map((from, index) => ({ from, to: polygon[(index + 1) % polygon.length] ?? from }))
}

/** True where a point lies inside an outline or on its edge, by even-odd crossings. */
export function containsPoint(polygon: Polygon, p: Point, edgeWidth: Millimetres = samePoint): boolean {
  let isInside = false
  for (let index = 0; index < polygon.length; index += 1) {
    const a = polygon[index]
    const b = polygon[index + 1 === polygon.length ? 0 : index + 1]
    if (a === undefined || b === undefined) continue
    const isNear =
      Math.min(a.x, b.x) - edgeWidth <= p.x &&
      Math.max(a.x, b.x) + edgeWidth >= p.x &&
      Math.min(a.y, b.y) - edgeWidth <= p.y &&
      Math.max(a.y, b.y) + edgeWidth >= p.y
    if (isNear && distanceToSegment(p, { from: a, to: b }) <= edgeWidth) return true
    if (a.y > p.y !== b.y > p.y && p.x < a.x + ((p.y - a.y) / (b.y - a.y)) * (b.x - a.x)) isInside = !isInside
  }
  return isInside
}
