import type { Millimetres } from '../../units/units.ts'
import type { GivenSize, Open, PieceBase } from '../piece-base.ts'
import type { CardLayer } from '../card/card-given.ts'

/** Where the corner tabs are: part of the end walls (which face each other along the length) or of the side walls. */
export interface TabsGiven {
  readonly at: 'ends' | 'sides'
  readonly glued: 'inside' | 'outside'
  readonly trim: Millimetres
  /** Degrees. */
  readonly taper: number
}

/** Distance of each score from its cut edge, the two walls that face each other along each axis. */
export interface WallsGiven {
  readonly length: readonly [Millimetres, Millimetres]
  readonly width: readonly [Millimetres, Millimetres]
}

/** A tray with four walls: the base of a box, or, turned over, its lid. */
export interface BoxGiven extends PieceBase {
  readonly kind: 'box' | 'lid'
  readonly stock: string
  readonly by:
    | { readonly given: 'blank'; readonly blank: GivenSize | Open; readonly wall: WallsGiven | Open }
    | { readonly given: 'inside'; readonly inside: (GivenSize & { readonly depth: Millimetres }) | Open }
  readonly tabs: TabsGiven
  readonly walls: 'single' | 'doubled'
  readonly thumbNotch: boolean
  readonly covered: string | null
  /** Panels stuck on the outside of a wall or on the top. */
  readonly layers: readonly (Pick<CardLayer, 'stock' | 'size' | 'banner'> & {
    readonly on: 'top' | 'length' | 'width'
  })[]
}
