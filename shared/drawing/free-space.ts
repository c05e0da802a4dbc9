import { boundsOf, type Bounds } from '../geometry/bounds.ts'
import type { Point } from '../geometry/shapes.ts'
import type { Millimetres } from '../units/units.ts'

/** A rectangle that something already takes, turned with what lies in it. */
export interface Taken {
  readonly corners: readonly Point[]
  readonly bounds: Bounds
}

/** The rectangle round a line of text or a dimension: about its middle, turned by an angle in degrees. */
export function takenBy(middle: Point, wide: Millimetres, high: Millimetres, degrees: number): Taken {
  const angle = (degrees * Math.PI) / 180
  const [c, s] = [Math.cos(angle), Math.sin(angle)]
  const corners = (
    [
      [-1, -1],
      [1, -1],
      [1, 1],
      [-1, 1],
    ] as const
  ).map(([i, j]) => ({
    x: middle.x + (c * i * wide) / 2 - (s * j * high) / 2,
    y: middle.y + (s * i * wide) / 2 + (c * j * high) / 2,
  }))
  return { corners, bounds: boundsOf(corners) }
}

/** True where two turned rectangles overlap, by separating axes. */
export function overlaps(a: Taken, b: Taken): boolean {
  if (a.bounds.right <= b.bounds.left || b.bounds.right <= a.bounds.left) return false
  if (a.bounds.top <= b.bounds.bottom || b.bounds.top <= a.bounds.bottom) return false
  for (const { corners } of [a, b]) {
    for (const index of [0, 1] as const) {
      const p = corners[index]
      const q = corners[index + 1]
      if (p === undefined || q === undefined) continue
      const project = (other: Taken): readonly number[] =>
        other.corners.map((corner) => corner.x * (q.x - p.x) + corner.y * (q.y - p.y))
      const [first, second] = [project(a), project(b)]
      if (Math.max(...first) <= Math.min(...second) || Math.max(...second) <= Math.min(...first)) return false
    }
  }
  return true
}

/** Keeps account of what lies where, so that words go where nothing lies yet. */
export interface FreeSpace {
  readonly take: (area: Taken) => void
  readonly isFree: (area: Taken) => boolean
}

export function freeSpace(): FreeSpace {
  const taken: Taken[] = []
  return {
    take: (area) => {
      taken.push(area)
    },
    isFree: (area) => taken.every((other) => !overlaps(area, other)),
  }
}
