import type { Millimetres } from '../../units/units.ts'
import type { Open, PieceBase } from '../piece-base.ts'

/** A gusseted bag with a flat bottom. */
export interface BagGiven extends PieceBase {
  readonly kind: 'bag'
  readonly stock: string
  /** Face width, gusset depth, height: of the open bag, inside. */
  readonly inside: { readonly width: Millimetres; readonly depth: Millimetres; readonly height: Millimetres } | Open
  /** Blank given by hand: its length round the bag, its height, and the vertical scores from one end. */
  readonly blank: {
    readonly length: Millimetres
    readonly height: Millimetres
    readonly scores: readonly Millimetres[]
  } | null
  /** Turned-in strip at the top, folded-under strip at the bottom, and the glued seam; `null` takes the default. */
  readonly top: Millimetres | null
  readonly bottom: Millimetres | null
  readonly seam: Millimetres | null
}
