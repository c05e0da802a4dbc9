import type { Millimetres } from '../units/units.ts'
import type { Point, Polygon } from './shapes.ts'

export const point = (x: Millimetres, y: Millimetres): Point => ({ x, y })

/** An upright rectangle between two opposite corners, counter-clockwise from its lower left. */
export const rectangle = (left: Millimetres, bottom: Millimetres, right: Millimetres, top: Millimetres): Polygon => [
  point(left, bottom),
  point(right, bottom),
  point(right, top),
  point(left, top),
]
