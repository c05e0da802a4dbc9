import type { Millimetres } from '../units/units.ts'
import type { Point } from './shapes.ts'

/** The upright rectangle round some points. */
export interface Bounds {
  readonly left: Millimetres
  readonly bottom: Millimetres
  readonly right: Millimetres
  readonly top: Millimetres
}

/** Bounds of points; all zero where there are none. */
export function boundsOf(points: Iterable<Point>): Bounds {
  let left = Infinity
  let bottom = Infinity
  let right = -Infinity
  let top = -Infinity
  for (const { x, y } of points) {
    if (x < left) left = x
    if (x > right) right = x
    if (y < bottom) bottom = y
    if (y > top) top = y
  }
  return left === Infinity ? { left: 0, bottom: 0, right: 0, top: 0 } : { left, bottom, right, top }
}

export const widthOf = (bounds: Bounds): Millimetres => bounds.right - bounds.left
export const heightOf = (bounds: Bounds): Millimetres => bounds.top - bounds.bottom
