import { turnOf } from './area.ts'
import type { Point, Polygon } from './shapes.ts'
import { sliver } from './tolerance.ts'

/** True for an outline that runs counter-clockwise and never turns right. */
export function isConvex(polygon: Polygon): boolean {
  const count = polygon.length
  if (count < 3) return false
  for (let index = 0; index < count; index += 1) {
    const a = polygon[index]
    const b = polygon[(index + 1) % count]
    const c = polygon[(index + 2) % count]
    if (a === undefined || b === undefined || c === undefined) return false
    const edge = Math.hypot(b.x - a.x, b.y - a.y)
    if (turnOf(a, b, c) < -sliver * edge) return false
  }
  return true
}

/**
 * The part of a convex outline that lies left of the line from `a` to `b`; empty where none does.
 * One step of Sutherland and Hodgman's re-entrant clipping (published).
 */
export function clipToHalfPlane(polygon: Polygon, a: Point, b: Point): Polygon {
  const kept: Point[] = []
  let last = polygon[polygon.length - 1]
  if (last === undefined) return kept
  let lastSide = turnOf(a, b, last)
  for (const here of polygon) {
    const side = turnOf(a, b, here)
    if (side >= 0 !== lastSide >= 0) {
      const share = lastSide / (lastSide - side)
      kept.push({ x: last.x + share * (here.x - last.x), y: last.y + share * (here.y - last.y) })
    }
    if (side >= 0) kept.push(here)
    last = here
    lastSide = side
  }
  return kept
}

/** What two outlines share, the second convex and counter-clockwise; the first convex too, or the shape may be pinched. */
export function clipToConvex(subject: Polygon, clip: Polygon): Polygon {
  let kept = subject
  let last = clip[clip.length - 1]
  for (const here of clip) {
    if (last !== undefined && kept.length > 0) kept = clipToHalfPlane(kept, last, here)
    last = here
  }
  return kept.length < 3 ? [] : kept
}
