import type { Millimetres } from '../units/units.ts'
import type { Point, Polygon } from './shapes.ts'
import { chordError } from './tolerance.ts'
import { withoutRepeats } from './without-repeats.ts'

/** Points along an arc, ends included, near enough that no chord lies more than the chord error inside it. Angles in radians. */
export function arcPoints(centre: Point, radius: Millimetres, fromAngle: number, toAngle: number): readonly Point[] {
  const turned = toAngle - fromAngle
  const step = 2 * Math.acos(Math.max(-1, 1 - chordError / Math.max(radius, chordError)))
  const count = Math.max(1, Math.ceil(Math.abs(turned) / step))
  return Array.from({ length: count + 1 }, (_, index) => {
    const angle = fromAngle + (turned * index) / count
    return { x: centre.x + radius * Math.cos(angle), y: centre.y + radius * Math.sin(angle) }
  })
}

/** One corner of an outline, rounded: the points that take its place. The radius shrinks where an edge is too short for it. */
function roundOne(before: Point, corner: Point, after: Point, radius: Millimetres): readonly Point[] {
  const inLength = Math.hypot(before.x - corner.x, before.y - corner.y)
  const outLength = Math.hypot(after.x - corner.x, after.y - corner.y)
  const a = { x: (before.x - corner.x) / inLength, y: (before.y - corner.y) / inLength }
  const b = { x: (after.x - corner.x) / outLength, y: (after.y - corner.y) / outLength }
  const half = Math.acos(Math.min(1, Math.max(-1, a.x * b.x + a.y * b.y))) / 2
  const tangent = Math.min(radius / Math.tan(half), inLength / 2, outLength / 2)
  const used = tangent * Math.tan(half)
  if (!(used > 0) || half > Math.PI / 2 - 1e-9) return [corner]
  const bisector = { x: a.x + b.x, y: a.y + b.y }
  const along = used / Math.sin(half) / Math.hypot(bisector.x, bisector.y)
  const centre = { x: corner.x + bisector.x * along, y: corner.y + bisector.y * along }
  const start = Math.atan2(corner.y + a.y * tangent - centre.y, corner.x + a.x * tangent - centre.x)
  const end = Math.atan2(corner.y + b.y * tangent - centre.y, corner.x + b.x * tangent - centre.x)
  const turned = ((((end - start) % (2 * Math.PI)) + 3 * Math.PI) % (2 * Math.PI)) - Math.PI
  return arcPoints(centre, used, start, start + turned)
}

/** An outline with the corners that `isRounded` picks rounded to a radius; the rest stay sharp. */
export function roundCorners(
  polygon: Polygon,
  radius: Millimetres,
  isRounded: (corner: Point, index: number) => boolean = () => true,
): Polygon {
  if (radius <= 0) return polygon
  const rounded = polygon.flatMap((corner, index) => {
    const before = polygon[(index + polygon.length - 1) % polygon.length]
    const after = polygon[(index + 1) % polygon.length]
    if (before === undefined || after === undefined || !isRounded(corner, index)) return [corner]
    return roundOne(before, corner, after, radius)
  })
  return withoutRepeats(rounded)
}
