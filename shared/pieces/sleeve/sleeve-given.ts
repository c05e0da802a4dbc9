import type { Millimetres } from '../../units/units.ts'
import type { Open, PieceBase } from '../piece-base.ts'

/** An open tube with square corners round a box. */
export interface SleeveGiven extends PieceBase {
  readonly kind: 'sleeve'
  readonly stock: string
  /** The piece it goes round. */
  readonly around: string | null
  /** Extent along the tube; `null` covers what it goes round. */
  readonly width: Millimetres | null
  readonly overlap: Millimetres
  /** Which girth it goes round. */
  readonly girth: 'width' | 'length'
  /** Blank given by hand: its length round the girth, its width along the tube, and the four scores from one end. */
  readonly blank:
    { readonly length: Millimetres; readonly width: Millimetres; readonly scores: readonly Millimetres[] } | Open | null
}
