import type { Millimetres, TolerancedLength } from '../../units/units.ts'
import type { GivenSize, Open, PieceBase } from '../piece-base.ts'

/** A panel or flag glued on a card, placed from the card's centre. */
export interface CardLayer {
  readonly stock: string
  readonly size: GivenSize
  readonly at: { readonly x: Millimetres; readonly y: Millimetres }
  /** Where it is glued: outside on the front, or inside. */
  readonly side: 'front' | 'inside'
  readonly banner: { readonly depth: Millimetres; readonly point: 'in' | 'out' } | null
}

/** A folded card, or a flat one where `fold` is `none`. */
export interface CardGiven extends PieceBase {
  readonly kind: 'card'
  readonly stock: string
  /** Size when folded. For an unfolded card, its size. */
  readonly folded: GivenSize | Open
  readonly fold: 'long-edge' | 'short-edge' | 'none'
  readonly panels: number
  readonly style: 'single' | 'roll' | 'accordion' | 'gate'
  /** Size of the flat sheet where the author gave it. */
  readonly blank: GivenSize | null
  /** Widths of the panels across the fold, outermost first, where the author gave them (roll folds). */
  readonly panelWidths: readonly Millimetres[] | null
  readonly raised: TolerancedLength | null
  readonly raisedToEdge: boolean
  readonly layers: readonly CardLayer[]
  readonly insert: { readonly stock: string; readonly loose: boolean; readonly folded: boolean } | null
  /** A panel folded up from the bottom edge that holds another piece; `side` is the glued strip at each end. */
  readonly pocket: { readonly depth: Millimetres; readonly side: Millimetres } | null
}
