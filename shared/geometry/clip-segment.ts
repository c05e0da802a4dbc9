import type { Bounds } from './bounds.ts'
import type { Point, Segment } from './shapes.ts'

/** The point a share of the way along a segment. */
export const pointAlong = ({ from, to }: Segment, share: number): Point => ({
  x: from.x + share * (to.x - from.x),
  y: from.y + share * (to.y - from.y),
})

/**
 * Shares of a segment at which it enters and leaves an upright rectangle; `null` where it passes by.
 * Liang and Barsky's line clipping (published).
 */
export function sharesInside(segment: Segment, { left, bottom, right, top }: Bounds): readonly [number, number] | null {
  const { from, to } = segment
  const [dx, dy] = [to.x - from.x, to.y - from.y]
  let enter = 0
  let leave = 1
  for (const [p, q] of [
    [-dx, from.x - left],
    [dx, right - from.x],
    [-dy, from.y - bottom],
    [dy, top - from.y],
  ] as const) {
    if (p === 0 && q < 0) return null
    if (p < 0) enter = Math.max(enter, q / p)
    if (p > 0) leave = Math.min(leave, q / p)
  }
  return enter >= leave ? null : [enter, leave]
}

/** The part of a segment inside a rectangle; `null` where none is. */
export function clipSegment(segment: Segment, bounds: Bounds): Segment | null {
  const shares = sharesInside(segment, bounds)
  return shares === null ? null : { from: pointAlong(segment, shares[0]), to: pointAlong(segment, shares[1]) }
}

/** The parts of a segment outside a rectangle: none, one or two. */
export function segmentOutside(segment: Segment, bounds: Bounds): readonly Segment[] {
  const shares = sharesInside(segment, bounds)
  if (shares === null) return [segment]
  const [enter, leave] = shares
  return [
    ...(enter > 0 ? [{ from: segment.from, to: pointAlong(segment, enter) }] : []),
    ...(leave < 1 ? [{ from: pointAlong(segment, leave), to: segment.to }] : []),
  ]
}
