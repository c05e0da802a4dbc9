import type { Point, Polygon } from './shapes.ts'

/** Twice the area turned through from `a` by `b` to `c`: positive where they turn left. */
export const turnOf = (a: Point, b: Point, c: Point): number => (b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x)

/**
 * Area of a closed outline by the shoelace formula, in square millimetres: positive where it runs counter-clockwise.
 * Reckoned from the first point, so that an outline far from the origin loses no digits.
 */
export function signedAreaOf(polygon: Polygon): number {
  const origin = polygon[0]
  if (origin === undefined) return 0
  let twice = 0
  for (let index = 1; index + 1 < polygon.length; index += 1) {
    const here = polygon[index]
    const next = polygon[index + 1]
    if (here !== undefined && next !== undefined) twice += turnOf(origin, here, next)
  }
  return twice / 2
}

/** Area of a closed outline in square millimetres, whichever way it runs. */
export const areaOf = (polygon: Polygon): number => Math.abs(signedAreaOf(polygon))

/** The same outline, run counter-clockwise. */
export const counterClockwise = (polygon: Polygon): Polygon =>
  signedAreaOf(polygon) < 0 ? [...polygon].reverse() : polygon

/** Length of the outline in millimetres. */
export function perimeterOf(polygon: Polygon): number {
  let total = 0
  let last = polygon[polygon.length - 1]
  for (const point of polygon) {
    if (last !== undefined) total += Math.hypot(point.x - last.x, point.y - last.y)
    last = point
  }
  return total
}
