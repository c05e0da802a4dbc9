import type { TolerancedLength } from '../../units/units.ts'
import type { PieceBase } from '../piece-base.ts'

/** A size with tolerances; `depth` is `null` for a flat thing. */
export interface BoughtSize {
  readonly length: TolerancedLength
  readonly width: TolerancedLength
  readonly depth: TolerancedLength | null
}

/** A thing not made from our sheets: an envelope from a shop, a photo, a tin. At least one of the sizes is given. */
export interface BoughtGiven extends PieceBase {
  readonly kind: 'bought'
  readonly stock: null
  readonly inside: BoughtSize | null
  readonly outside: BoughtSize | null
  /** Of its body; for a solid thing its height; of its wall where `inside` is reckoned from `outside`. */
  readonly thickness: TolerancedLength | null
}
