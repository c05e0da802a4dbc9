import fc from 'fast-check'
import type { PieceGiven } from '../../shared/pieces/given.ts'
import { aBag, aBand, aBaronial, aBox, aCard, anInsert, aSleeve, aSquareFlap } from './given-pieces.ts'

/** Pieces of every kind that can be made: what properties of drawings and exports are tried on. */
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const size = fc.record({ length: between(80, 250), width: between(60, 200) })

export const validBox = fc
  .record({
    scored: size,
    ends: fc.tuple(between(10, 28), between(10, 28)),
    sides: fc.tuple(between(10, 28), between(10, 28)),
    at: fc.constantFrom('ends' as const, 'sides' as const),
    trim: between(0, 3),
    taper: between(0, 12),
    thumbNotch: fc.boolean(),
    walls: fc.constantFrom('single' as const, 'doubled' as const),
    covered: fc.constantFrom(null, 'wrap'),
    kind: fc.constantFrom('box' as const, 'lid' as const),
  })
  .map(({ scored, ends, sides, at, trim, taper, ...rest }): PieceGiven => {
    const longer = Math.max(scored.length, scored.width)
    const shorter = Math.min(scored.length, scored.width)
    return aBox({
      ...rest,
      by: {
        given: 'blank',
        blank: { length: longer + ends[0] + ends[1], width: shorter + sides[0] + sides[1] },
        wall: { length: ends, width: sides },
      },
      tabs: { at, glued: 'inside', trim, taper },
    })
  })

const layer = { stock: 'text', size: { length: 60, width: 40 }, at: { x: 0, y: 0 } }

export const validCard = fc
  .record({
    folded: size,
    fold: fc.constantFrom('long-edge' as const, 'short-edge' as const, 'none' as const),
    style: fc.constantFrom('single' as const, 'roll' as const, 'accordion' as const, 'gate' as const),
    panels: fc.integer({ min: 3, max: 6 }),
    corner: fc.constantFrom(0, 3, 6),
    pocket: fc.constantFrom(null, { depth: 40, side: 8 }),
    banner: fc.constantFrom(null, { depth: 8, point: 'in' as const }, { depth: 8, point: 'out' as const }),
    side: fc.constantFrom('front' as const, 'inside' as const),
    insert: fc.constantFrom(
      null,
      { stock: 'text', loose: true, folded: true },
      { stock: 'text', loose: false, folded: false },
    ),
  })
  .map(({ banner, side, panels, ...rest }): PieceGiven =>
    aCard({
      ...rest,
      panels: rest.fold === 'none' ? 1 : rest.style === 'single' ? 2 : panels,
      layers: [{ ...layer, side, banner }],
    }),
  )

export const validBaronial = fc
  .record({
    pocket: size,
    bottom: between(6, 20),
    top: between(6, 20),
    corner: fc.constantFrom(0, 3),
    liner: fc.constantFrom(null, 'text'),
  })
  .map(({ pocket, bottom, top, ...rest }): PieceGiven => aBaronial({ pocket, seam: { bottom, top }, ...rest }))

export const validSquareFlap = fc
  .record({
    pocket: size,
    sideFlap: between(8, 25),
    corner: fc.constantFrom(0, 4),
    liner: fc.constantFrom(null, 'text'),
  })
  .map((given): PieceGiven => aSquareFlap(given))

export const validSleeve = fc
  .record({ panels: fc.tuple(between(40, 120), between(10, 60)), overlap: between(8, 25), width: between(20, 150) })
  .map(({ panels: [wide, high], overlap, width }): PieceGiven => {
    const scores = [wide, wide + high, 2 * wide + high, 2 * wide + 2 * high]
    return aSleeve({ overlap, blank: { length: (scores[3] ?? 0) + overlap, width, scores } })
  })

export const validBag = fc
  .record({ inside: fc.record({ width: between(50, 200), depth: between(20, 90), height: between(80, 250) }) })
  .map((given): PieceGiven => aBag(given))

export const validPiece: fc.Arbitrary<PieceGiven> = fc.oneof(
  validBox,
  validCard,
  validBaronial,
  validSquareFlap,
  validSleeve,
  validBag,
  size.map((both): PieceGiven => anInsert({ size: both, corner: 3 })),
  size.map((both): PieceGiven => aBand({ width: both.width / 3, blank: { length: both.length * 2, scores: [] } })),
)
