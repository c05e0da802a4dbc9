import type { Maker, Stock } from '../template/template-model.ts'
import type { Dimension } from '../uncertainty/dimension.ts'
import type { Ruler } from '../units/units.ts'

/** Outside sizes of something closed, to wrap a sleeve or band round. */
export interface Girded {
  readonly length: Dimension
  readonly width: Dimension
  readonly height: Dimension
}

/** What folding a piece depends on besides the piece itself. */
export interface FoldContext {
  readonly maker: Maker
  readonly ruler: Ruler
  /** Print scale of printed pieces. */
  readonly scale: number
  /** Half-range of relative humidity in percent; 0 leaves humidity out. */
  readonly humidityHalfRange: number
  stock(name: string): Stock
  caliper(stock: string): Dimension
  /** Closed outside of what a sleeve or band goes round; `null` where it has none. */
  around(piece: string): Girded | null
}
