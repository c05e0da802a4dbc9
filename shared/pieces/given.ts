import type { BagGiven } from './bag/bag-given.ts'
import type { BandGiven } from './band/band-given.ts'
import type { BoughtGiven } from './bought/bought-given.ts'
import type { BoxGiven } from './box/box-given.ts'
import type { CardGiven } from './card/card-given.ts'
import type { CustomGiven } from './custom/custom-given.ts'
import type { EnvelopeGiven } from './envelope/envelope-given.ts'
import type { InsertGiven } from './insert/insert-given.ts'
import type { SleeveGiven } from './sleeve/sleeve-given.ts'

/** A piece as its author gave it, every length read into millimetres, defaults of the language filled in. */
export type PieceGiven =
  BagGiven | BandGiven | BoughtGiven | BoxGiven | CardGiven | CustomGiven | EnvelopeGiven | InsertGiven | SleeveGiven

/** The word an author writes as `kind`. A lid is a box turned over; a divider is an insert that stands. */
export type PieceKindName = PieceGiven['kind']
