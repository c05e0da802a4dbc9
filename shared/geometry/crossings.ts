import { turnOf } from './area.ts'
import { distanceToSegment, edgesOf } from './contains-point.ts'
import type { Point, Polygon, Segment } from './shapes.ts'
import { samePoint } from './tolerance.ts'

const boxesMeet = (a: Segment, b: Segment): boolean =>
  Math.max(a.from.x, a.to.x) + samePoint >= Math.min(b.from.x, b.to.x) &&
  Math.max(b.from.x, b.to.x) + samePoint >= Math.min(a.from.x, a.to.x) &&
  Math.max(a.from.y, a.to.y) + samePoint >= Math.min(b.from.y, b.to.y) &&
  Math.max(b.from.y, b.to.y) + samePoint >= Math.min(a.from.y, a.to.y)

interface Box {
  readonly left: number
  readonly right: number
  readonly bottom: number
  readonly top: number
}

/** A segment's bounds, widened by what counts as the same point. */
const boxOf = ({ from, to }: Segment): Box => ({
  left: Math.min(from.x, to.x) - samePoint,
  right: Math.max(from.x, to.x) + samePoint,
  bottom: Math.min(from.y, to.y) - samePoint,
  top: Math.max(from.y, to.y) + samePoint,
})

/** Most pairs of edges are far apart; this is all that is asked of them. */
const areApart = (a: Box, b: Box): boolean =>
  a.left > b.right || b.left > a.right || a.bottom > b.top || b.bottom > a.top

/** A point that two segments share, touching ends included; `null` where they keep apart. */
export function meetingPoint(a: Segment, b: Segment): Point | null {
  if (!boxesMeet(a, b)) return null
  for (const [end, other] of [
    [a.from, b],
    [a.to, b],
    [b.from, a],
    [b.to, a],
  ] as const) {
    if (distanceToSegment(end, other) <= samePoint) return end
  }
  const fromA = turnOf(b.from, b.to, a.from)
  const toA = turnOf(b.from, b.to, a.to)
  const fromB = turnOf(a.from, a.to, b.from)
  const toB = turnOf(a.from, a.to, b.to)
  if (fromA > 0 === toA > 0 || fromB > 0 === toB > 0) return null
  const share = fromA / (fromA - toA)
  return { x: a.from.x + share * (a.to.x - a.from.x), y: a.from.y + share * (a.to.y - a.from.y) }
}

/** True where two edges that follow one another turn straight back over the same line. */
function turnsBack(a: Segment, b: Segment): boolean {
  const along = (a.to.x - a.from.x) * (b.to.x - b.from.x) + (a.to.y - a.from.y) * (b.to.y - b.from.y)
  return along < 0 && (distanceToSegment(b.to, a) <= samePoint || distanceToSegment(a.from, b) <= samePoint)
}

/** Points at which a closed outline crosses, touches or runs back over itself; none for a simple outline. */
export function crossingsOf(polygon: Polygon): readonly Point[] {
  const edges = edgesOf(polygon)
  const boxes = edges.map(boxOf)
  const found: Point[] = []
  edges.forEach((edge, index) => {
    const box = boxes[index]
    for (let other = index + 1; other < edges.length; other += 1) {
      const second = edges[other]
      const secondBox = boxes[other]
      if (second === undefined || box === undefined || secondBox === undefined || areApart(box, secondBox)) continue
      const isNext = other === index + 1
      const isLast = index === 0 && other === edges.length - 1
      if (isNext || isLast) {
        if (isNext ? turnsBack(edge, second) : turnsBack(second, edge)) found.push(isNext ? edge.to : edge.from)
        continue
      }
      const meeting = meetingPoint(edge, second)
      if (meeting !== null) found.push(meeting)
    }
  })
  return found
}

/** True for a closed outline of at least three points that never meets itself. */
export const isSimple = (polygon: Polygon): boolean => polygon.length >= 3 && crossingsOf(polygon).length === 0
