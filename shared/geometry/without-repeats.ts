import type { Polygon } from './shapes.ts'
import { samePoint } from './tolerance.ts'

/** A closed outline without points that repeat the one before them. */
export function withoutRepeats(polygon: Polygon): Polygon {
  return polygon.filter((here, index) => {
    const before = polygon[(index + polygon.length - 1) % polygon.length]
    return before === undefined || Math.hypot(here.x - before.x, here.y - before.y) > samePoint
  })
}
