import type { FoldContext } from '../../shared/pieces/fold-context.ts'
import type { FoldedPiece } from '../../shared/pieces/folded-piece.ts'
import { foldPiece } from '../../shared/pieces/fold-registry.ts'
import type { PieceGiven } from '../../shared/pieces/given.ts'
import type { BagGiven } from '../../shared/pieces/bag/bag-given.ts'
import type { BandGiven } from '../../shared/pieces/band/band-given.ts'
import type { BoxGiven } from '../../shared/pieces/box/box-given.ts'
import type { CardGiven } from '../../shared/pieces/card/card-given.ts'
import type { CustomGiven } from '../../shared/pieces/custom/custom-given.ts'
import type {
  BaronialByCorners,
  BaronialByPocket,
  SquareFlapGiven,
} from '../../shared/pieces/envelope/envelope-given.ts'
import type { InsertGiven } from '../../shared/pieces/insert/insert-given.ts'
import type { SleeveGiven } from '../../shared/pieces/sleeve/sleeve-given.ts'

const base = {
  name: 'piece',
  stock: 'card-stock',
  made: 'measured',
  scored: 'turning',
  make: null,
  workmanship: null,
  note: null,
  corner: 0,
} as const

export const aBox = (given: Partial<BoxGiven> = {}): BoxGiven => ({
  ...base,
  kind: 'box',
  by: {
    given: 'blank',
    blank: { length: 200, width: 158 },
    wall: { length: [20, 20], width: [20, 20] },
  },
  tabs: { at: 'ends', glued: 'inside', trim: 1, taper: 5 },
  walls: 'single',
  thumbNotch: false,
  covered: null,
  layers: [],
  ...given,
})

export const aBaronial = (given: Partial<BaronialByPocket> = {}): BaronialByPocket => ({
  ...base,
  kind: 'envelope',
  style: 'baronial',
  by: 'pocket',
  liner: null,
  pocket: { length: 140, width: 100 },
  seam: { bottom: 12, top: 8 },
  ...given,
})

export const aBaronialByCorners = (given: Partial<BaronialByCorners> = {}): BaronialByCorners => ({
  ...base,
  kind: 'envelope',
  style: 'baronial',
  by: 'corners',
  liner: null,
  square: 210,
  corners: { left: 101, right: 101, bottom: 126, flap: 126 },
  ...given,
})

export const aSquareFlap = (given: Partial<SquareFlapGiven> = {}): SquareFlapGiven => ({
  ...base,
  kind: 'envelope',
  style: 'square-flap',
  liner: null,
  pocket: { length: 150, width: 108 },
  back: null,
  sideFlap: null,
  flap: null,
  ...given,
})

export const aCard = (given: Partial<CardGiven> = {}): CardGiven => ({
  ...base,
  kind: 'card',
  folded: { length: 148, width: 105 },
  fold: 'long-edge',
  panels: 2,
  style: 'single',
  blank: null,
  panelWidths: null,
  raised: null,
  raisedToEdge: false,
  layers: [],
  insert: null,
  pocket: null,
  ...given,
})

export const aSleeve = (given: Partial<SleeveGiven> = {}): SleeveGiven => ({
  ...base,
  kind: 'sleeve',
  around: null,
  width: null,
  overlap: 15,
  girth: 'width',
  blank: { length: 300, width: 80, scores: [110, 140, 250, 280] },
  ...given,
})

export const aBand = (given: Partial<BandGiven> = {}): BandGiven => ({
  ...base,
  kind: 'band',
  around: null,
  width: 40,
  overlap: 15,
  girth: 'width',
  ribbon: false,
  tie: 'knot',
  blank: { length: 330, scores: [] },
  ...given,
})

export const aBag = (given: Partial<BagGiven> = {}): BagGiven => ({
  ...base,
  kind: 'bag',
  inside: { width: 150, depth: 60, height: 200 },
  blank: null,
  top: null,
  bottom: null,
  seam: null,
  ...given,
})

export const anInsert = (given: Partial<InsertGiven> = {}): InsertGiven => ({
  ...base,
  kind: 'insert',
  size: { length: 140, width: 95 },
  count: 1,
  ...given,
})

export const aCustom = (given: Partial<CustomGiven> = {}): CustomGiven => ({
  ...base,
  kind: 'custom',
  outline: [
    { x: 10, y: 10 },
    { x: 90, y: 10 },
    { x: 90, y: 70 },
    { x: 10, y: 70 },
  ],
  scores: [{ from: { x: 50, y: 10 }, to: { x: 50, y: 70 }, fold: 'valley', angle: 180 }],
  inside: null,
  outside: null,
  ...given,
})

/** A context with one caliper for every stock and no sources of variation that a drawing would see. */
export const plainContext = (caliper = 0.3): FoldContext => ({
  maker: { name: 'home', cut: 0.35, score: 0.25, fence: 0.25 },
  ruler: { cut: 1, score: 1 },
  scale: 1,
  humidityHalfRange: 0,
  stock: (name) => ({
    name,
    title: null,
    grammage: 270,
    caliper,
    caliperHalfWidth: null,
    grain: 'long',
    sheet: null,
  }),
  caliper: () => ({ nominal: caliper, sources: [] }),
  around: () => null,
})

export const foldGiven = (given: PieceGiven, caliper = 0.3): FoldedPiece => foldPiece(given, plainContext(caliper))
