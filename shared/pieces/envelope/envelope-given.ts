import type { Millimetres } from '../../units/units.ts'
import type { GivenSize, Open, PieceBase } from '../piece-base.ts'

interface EnvelopeBase extends PieceBase {
  readonly kind: 'envelope'
  readonly stock: string
  readonly liner: string | null
}

/** Pointed flaps folded from a square standing on a corner, given by its pocket (score to score). */
export interface BaronialByPocket extends EnvelopeBase {
  readonly style: 'baronial'
  readonly by: 'pocket'
  readonly pocket: GivenSize | Open
  /** Perpendicular width of the seams, bottom and top. */
  readonly seam: { readonly bottom: Millimetres; readonly top: Millimetres }
}

/** The same given by its square and by how far from each corner the folds cut both edges. */
export interface BaronialByCorners extends EnvelopeBase {
  readonly style: 'baronial'
  readonly by: 'corners'
  readonly square: Millimetres
  readonly corners: {
    readonly left: Millimetres
    readonly right: Millimetres
    readonly bottom: Millimetres
    readonly flap: Millimetres
  }
}

/** A square-flap envelope; `null` takes the model's default. */
export interface SquareFlapGiven extends EnvelopeBase {
  readonly style: 'square-flap'
  readonly pocket: GivenSize | Open
  readonly back: Millimetres | null
  readonly sideFlap: Millimetres | null
  readonly flap: Millimetres | null
}

export type EnvelopeGiven = BaronialByPocket | BaronialByCorners | SquareFlapGiven
