import type { Millimetres } from '../units/units.ts'

/** What every piece may carry, whatever its kind. */
export interface PieceBase {
  readonly name: string
  /** Stock it is cut from; `null` for a bought thing. */
  readonly stock: string | null
  readonly made: 'measured' | 'printed'
  readonly scored: 'turning' | 'one-edge'
  /** How many to make; `null` takes it from the counts of the fits. */
  readonly make: number | null
  readonly workmanship: string | null
  readonly note: string | null
  /** Radius of rounded corners; 0 for square ones. */
  readonly corner: Millimetres
}

/** A pair in the plane; `length` is the first as given, not necessarily the larger. */
export interface GivenSize {
  readonly length: Millimetres
  readonly width: Millimetres
}

/** A size left open for sizing. */
export type Open = 'fit'
