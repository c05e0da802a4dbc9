import type { Millimetres } from '../units/units.ts'

export interface Point {
  readonly x: Millimetres
  readonly y: Millimetres
}

/** A closed outline without its first point repeated; counter-clockwise with y upwards. */
export type Polygon = readonly Point[]

export interface Segment {
  readonly from: Point
  readonly to: Point
}
