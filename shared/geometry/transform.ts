import type { Point, Polygon, Segment } from './shapes.ts'

/** Something done to every point of a shape: a move, a turn or a mirror image. */
export interface Transform {
  readonly point: (point: Point) => Point
  /** True where it turns a shape over, so that an outline must be run backwards to stay counter-clockwise. */
  readonly turnsOver: boolean
}

export const translation = (dx: number, dy: number): Transform => ({
  point: ({ x, y }) => ({ x: x + dx, y: y + dy }),
  turnsOver: false,
})

/** A turn about the origin, degrees counter-clockwise; quarter turns are exact. */
export function rotation(degrees: number): Transform {
  const quarters = degrees / 90
  const [cos, sin] = Number.isInteger(quarters)
    ? ([
        [1, 0],
        [0, 1],
        [-1, 0],
        [0, -1],
      ][((quarters % 4) + 4) % 4] ?? [1, 0])
    : [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)]
  const [c = 1, s = 0] = [cos, sin]
  return { point: ({ x, y }) => ({ x: c * x - s * y, y: s * x + c * y }), turnsOver: false }
}

/** A mirror image in the upright line through the origin. */
export const mirrorAcross: Transform = { point: ({ x, y }) => ({ x: -x, y }), turnsOver: true }

/**
 * Where a point of a flat blank comes to lie when its flap is folded flat about the line from `a` to `b`:
 * u = (p−a)·(b−a)/|b−a|², p′ = 2(a + u(b−a)) − p (derived).
 */
export function reflection({ from: a, to: b }: Segment): Transform {
  const dx = b.x - a.x
  const dy = b.y - a.y
  const square = dx * dx + dy * dy
  return {
    point: (p) => {
      const u = ((p.x - a.x) * dx + (p.y - a.y) * dy) / square
      return { x: 2 * (a.x + u * dx) - p.x, y: 2 * (a.y + u * dy) - p.y }
    },
    turnsOver: true,
  }
}

/** A closed outline moved; it keeps running counter-clockwise where it did. */
export function movePolygon(polygon: Polygon, transform: Transform): Polygon {
  const moved = polygon.map(transform.point)
  return transform.turnsOver ? moved.reverse() : moved
}

export const moveSegment = <T extends Segment>(segment: T, transform: Transform): T => ({
  ...segment,
  from: transform.point(segment.from),
  to: transform.point(segment.to),
})
