import type { Millimetres } from '../../units/units.ts'
import type { Open, PieceBase } from '../piece-base.ts'

/** A tight wrap of paper, or a ribbon (no scores, length only). */
export interface BandGiven extends PieceBase {
  readonly kind: 'band'
  /** `null` for a ribbon, which is bought. */
  readonly stock: string | null
  readonly around: string | null
  readonly width: Millimetres
  /** How far the ends lap where the blank is computed. Unused for a ribbon. */
  readonly overlap: Millimetres
  readonly girth: 'width' | 'length'
  readonly ribbon: boolean
  readonly tie: 'knot' | 'bow'
  /** Length of the strip where the author gave it. */
  readonly blank: { readonly length: Millimetres; readonly scores: readonly Millimetres[] } | Open | null
}
