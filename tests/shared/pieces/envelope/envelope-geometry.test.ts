import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { areaOf } from '../../../../shared/geometry/area.ts'
import { coveredArea, differenceOf, intersectionOf, unionOf } from '../../../../shared/geometry/combine.ts'
import { isSimple } from '../../../../shared/geometry/crossings.ts'
import { point, rectangle } from '../../../../shared/geometry/rectangle.ts'
import { mirrorAcross, movePolygon, rotation, translation } from '../../../../shared/geometry/transform.ts'
import {
  baronialFlaps,
  baronialFromCorners,
  baronialFromPocket,
  baronialOutline,
  baronialPocket,
  baronialSeamArea,
  foldedBaronialFlaps,
} from '../../../../shared/pieces/envelope/baronial-geometry.ts'
import {
  gluedArea,
  layerMap,
  layerShares,
  openBack,
  protrudingArea,
} from '../../../../shared/pieces/envelope/layer-map.ts'
import { foldedSquareFlaps, squareFlapOutline } from '../../../../shared/pieces/envelope/square-flap-geometry.ts'

const sample = baronialFromPocket({ along: 140, across: 100 }, { bottom: 12, top: 4 })

const length = fc.double({ min: 40, max: 300, noNaN: true })
const seam = fc.double({ min: 1, max: 25, noNaN: true })
const anyBaronial = fc
  .record({ along: length, across: length, bottom: seam, top: seam })
  .map(({ along, across, bottom, top }) => baronialFromPocket({ along, across }, { bottom, top }))

describe('a baronial of 140 × 100 with seams of 12 and 4', () => {
  it('comes from the least square of 177.705627, its pocket 2.828427 above the middle', () => {
    expect(sample.square).toBeCloseTo(177.705627, 6)
    expect(sample.offset.y).toBeCloseTo(2.828427, 6)
    expect(sample.halfDiagonal).toBeCloseTo(125.656854, 6)
    expect(sample.surplus).toBeCloseTo(5.656854, 6)
  })

  it('has the reaches, notches and marks worked out by hand', () => {
    expect(sample.reach.left).toBeCloseTo(55.656854, 6)
    expect(sample.reach.right).toBeCloseTo(55.656854, 6)
    expect(sample.reach.bottom).toBeCloseTo(78.485281, 6)
    expect(sample.reach.top).toBeCloseTo(72.828427, 6)
    expect(sample.notch.bottom).toBeCloseTo(8.485281, 6)
    expect(sample.notch.top).toBeCloseTo(2.828427, 6)
    expect(sample.marks.lower.left).toBeCloseTo(98.994949, 6)
    expect(sample.marks.lower.bottom).toBeCloseTo(110.994949, 6)
    expect(sample.marks.upper.right).toBeCloseTo(98.994949, 6)
    expect(sample.marks.upper.top).toBeCloseTo(102.994949, 6)
  })

  it('is glued over 836.528137 mm² a side and wastes 80 mm² of its square', () => {
    expect(baronialSeamArea(sample)).toBeCloseTo(836.528137, 6)
    const [left, , bottom] = baronialFlaps(sample)
    expect(gluedArea(bottom?.folded ?? [], left?.folded ?? [])).toBeCloseTo(836.528137, 6)
    expect(sample.square ** 2 - areaOf(baronialOutline(sample))).toBeCloseTo(80, 6)
  })

  it('lies in two, three and four layers over 75.7 %, 23.6 % and 0.7 % of its pocket', () => {
    const { pocket, flaps } = foldedBaronialFlaps(sample)
    const shares = layerShares(pocket, flaps)
    // The reference figures come from a raster, hence three decimals.
    expect(shares[2]).toBeCloseTo(0.757098, 3)
    expect(shares[4]).toBeCloseTo(0.007074, 3)
    const layers = layerMap(pocket, flaps)
    expect(layers.mean).toBeCloseTo(2.249975, 4)
    expect([layers.min, layers.max]).toEqual([2, 4])
  })
})

describe('any baronial', () => {
  it('gives back the pocket and seams it was made from, through its corners', () => {
    fc.assert(
      fc.property(anyBaronial, (shape) => {
        const again = baronialFromCorners(shape.square, shape.corners)
        expect(again.along).toBeCloseTo(shape.along, 8)
        expect(again.across).toBeCloseTo(shape.across, 8)
        expect(again.seam.bottom).toBeCloseTo(shape.seam.bottom, 8)
        expect(again.seam.top).toBeCloseTo(shape.seam.top, 8)
      }),
    )
  })

  it('is made of its face, its flaps and its waste, and no more', () => {
    fc.assert(
      fc.property(anyBaronial, (shape) => {
        const parts =
          areaOf(baronialPocket(shape)) + baronialFlaps(shape).reduce((sum, flap) => sum + areaOf(flap.flat), 0)
        const outline = baronialOutline(shape)
        expect(areaOf(outline)).toBeCloseTo(parts, 6)
        expect(shape.square ** 2 - parts).toBeCloseTo(shape.notch.bottom ** 2 + shape.notch.top ** 2, 6)
        expect(isSimple(outline)).toBe(true)
      }),
    )
  })

  it('has no hole in its back', () => {
    fc.assert(
      fc.property(anyBaronial, (shape) => {
        const { pocket, flaps } = foldedBaronialFlaps(shape)
        expect(openBack(pocket, flaps)).toBe(0)
        expect(layerMap(pocket, flaps).min).toBeGreaterThanOrEqual(2)
      }),
    )
  })

  it('has a mean of one layer and its flaps over its pocket', () => {
    fc.assert(
      fc.property(anyBaronial, (shape) => {
        const { pocket, flaps } = foldedBaronialFlaps(shape)
        const over = flaps.reduce((sum, flap) => sum + areaOf(flap) - protrudingArea(pocket, flap), 0)
        expect(layerMap(pocket, flaps).mean).toBeCloseTo(1 + over / areaOf(pocket), 6)
      }),
    )
  })

  it('has the same layers moved, turned or mirrored', () => {
    fc.assert(
      fc.property(anyBaronial, fc.integer({ min: 0, max: 3 }), (shape, quarter) => {
        const { pocket, flaps } = foldedBaronialFlaps(shape)
        const plain = layerMap(pocket, flaps)
        for (const move of [translation(37.5, -12), rotation(90 * quarter), mirrorAcross]) {
          const moved = layerMap(
            movePolygon(pocket, move),
            flaps.map((flap) => movePolygon(flap, move)),
          )
          expect([moved.min, moved.max]).toEqual([plain.min, plain.max])
          expect(moved.mean).toBeCloseTo(plain.mean, 8)
        }
      }),
    )
  })
})

describe('a baronial given by unequal corners', () => {
  const shape = baronialFromCorners(210, { left: 101, right: 96, bottom: 126, flap: 124 })

  it('has its pocket off the middle by half the difference of the reaches', () => {
    expect(shape.along).toBeCloseTo(Math.SQRT2 * 210 - 197 / Math.SQRT2, 9)
    expect(shape.across).toBeCloseTo(Math.SQRT2 * 210 - 250 / Math.SQRT2, 9)
    expect(shape.offset.x).toBeCloseTo(5 / Math.SQRT2 / 2, 9)
    expect(shape.seam.bottom).toBeCloseTo(Math.SQRT2 * shape.notches.bottomRight, 9)
  })

  it('still accounts for all of its square', () => {
    const parts = areaOf(baronialPocket(shape)) + baronialFlaps(shape).reduce((sum, flap) => sum + areaOf(flap.flat), 0)
    expect(areaOf(baronialOutline(shape))).toBeCloseTo(parts, 6)
  })
})

describe('folds too far from the corners to meet', () => {
  it('leave a hole in the back and a bottom flap that reaches nothing', () => {
    const shape = baronialFromCorners(150, { left: 60, right: 60, bottom: 60, flap: 60 })
    const { pocket, flaps } = foldedBaronialFlaps(shape)
    expect(shape.seam.bottom).toBeLessThan(0)
    expect(openBack(pocket, flaps)).toBeGreaterThan(100)
    expect(layerMap(pocket, flaps).min).toBe(1)
  })
})

describe('a square-flap envelope of 132 × 96', () => {
  it('glues 969 mm² of an 18 mm side flap under a 62 mm back, both tapered', () => {
    // Tapers in millimetres as in the reference: 6 on the side flap, 3 on the back.
    const side = [point(0, 0), point(18, 6), point(18, 90), point(0, 96)]
    const back = [point(0, 0), point(132, 0), point(129, 62), point(3, 62)]
    expect(gluedArea(back, side)).toBeCloseTo(969, 6)
  })

  it('has a throat covered by its seal flap alone', () => {
    const sizes = { along: 132, across: 96, back: 90, sideFlap: 15, flap: 38, taper: 10 }
    const { pocket, flaps } = foldedSquareFlaps(sizes)
    const layers = layerMap(pocket, flaps)
    expect(layers.min).toBe(2)
    expect(layers.max).toBe(4)
    expect(openBack(pocket, flaps)).toBe(0)
    expect(isSimple(squareFlapOutline(sizes))).toBe(true)
  })

  it('is open where the flap does not reach the back', () => {
    const { pocket, flaps } = foldedSquareFlaps({ along: 132, across: 96, back: 40, sideFlap: 15, flap: 38, taper: 10 })
    expect(openBack(pocket, flaps)).toBeCloseTo((132 - 30) * 18, 6)
  })
})

describe('a flap that is not convex', () => {
  it('needs a general clipper and is then counted right', () => {
    const notched = [point(0, 0), point(100, 0), point(50, 30), point(100, 100), point(0, 100)]
    const pocket = rectangle(0, 0, 100, 100)
    expect(() => layerMap(pocket, [notched])).toThrow(/not convex/)
    const layers = layerMap(pocket, [notched], intersectionOf)
    expect(layers.mean).toBeCloseTo(1 + areaOf(notched) / 1e4, 9)
    expect([layers.min, layers.max]).toEqual([1, 2])
  })
})

describe('the layer map', () => {
  it('agrees with a general clipper on how much lies uncovered', () => {
    fc.assert(
      fc.property(
        fc.array(
          fc
            .tuple(length, length, length, length)
            .map(([x, y, w, h]) => rectangle(x - 100, y - 100, x - 100 + w, y - 100 + h)),
          { minLength: 1, maxLength: 4 },
        ),
        (flaps) => {
          const pocket = rectangle(0, 0, 150, 120)
          const bare = coveredArea(differenceOf(pocket, flaps))
          const own = (layerShares(pocket, flaps)[1] ?? 0) * 18000
          expect(Math.abs(own - bare)).toBeLessThan(1e-3)
          const inside = unionOf(flaps.flatMap((flap) => intersectionOf(flap, pocket)))
          expect(coveredArea(inside)).toBeCloseTo(18000 - bare, 2)
        },
      ),
      { numRuns: 60 },
    )
  })
})
