/** Millimetres. Every length inside the engine is in millimetres; inches exist only where text is read or written. */
export type Millimetres = number

/** Units an author may write. `um`, `mil` and `pt` (a thousandth of an inch) are for thickness. */
export type LengthUnit = 'mm' | 'cm' | 'in' | 'um' | 'mil' | 'pt'

/** The two unit systems a set can be designed and printed in. */
export type RulerUnit = 'mm' | 'in'

/** A length as it was written: its value, the unit it was written in and the text itself. */
export interface Length {
  readonly mm: Millimetres
  readonly unit: LengthUnit
  readonly text: string
}

/** An interval; an open end is `null`. */
export interface Range {
  readonly min: Millimetres | null
  readonly max: Millimetres | null
}

/** A length that may vary: centred nominal and half-width; `halfWidth` is `null` where none was given. */
export interface TolerancedLength {
  readonly nominal: Millimetres
  readonly halfWidth: Millimetres | null
  readonly text: string
}

/** The finest marks makers are asked to find, one for cutting and one for scoring. */
export interface Ruler {
  readonly cut: Millimetres
  readonly score: Millimetres
}

/** What a reader of text gives back: the value, or what is wrong and what to write instead. */
export type Reading<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly code: string; readonly fact: string; readonly remedy: string }
