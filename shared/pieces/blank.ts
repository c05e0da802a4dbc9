import type { Point, Polygon, Segment } from '../geometry/shapes.ts'
import type { Millimetres } from '../units/units.ts'

/** A line pressed for folding. `valley` folds towards the face that is up on the blank, `mountain` away from it. */
export interface Score extends Segment {
  readonly name: string
  readonly fold: 'valley' | 'mountain'
  /** Degrees turned through when folded. */
  readonly angle: number
}

/** A part of a blank between its edges and scores, named in the trade's words: `face`, `side flap`, `tab`, `end wall`. */
export interface BlankArea {
  readonly name: string
  readonly role: 'panel' | 'wall' | 'flap' | 'tab' | 'glue' | 'notch'
  readonly polygon: Polygon
}

/** A dimension to print: between two points, its text made from `length`. */
export interface BlankMeasure {
  readonly name: string
  readonly from: Point
  readonly to: Point
  readonly length: Millimetres
}

/** One flat sheet to cut, before folding. Millimetres, y upwards, origin at the lower left of its bounds. */
export interface Blank {
  /** The piece's name, with the part behind a slash where a piece needs several sheets: `card`, `card/layer 1`. */
  readonly name: string
  readonly stock: string | null
  readonly outline: Polygon
  readonly holes: readonly Polygon[]
  readonly scores: readonly Score[]
  /** Further cut lines inside the outline: tabs cut free, slots. */
  readonly cuts: readonly Segment[]
  readonly perforations: readonly Segment[]
  readonly areas: readonly BlankArea[]
  readonly measures: readonly BlankMeasure[]
  /** Direction the grain should run, where the stock says. */
  readonly grain: 'x' | 'y' | null
}
