import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { placementIn } from '../../../../shared/rules/sheet/fits-turned.ts'
import { smallestRectangle } from '../../../../shared/rules/sheet/sheet-of.ts'

const size = (length: number, width: number) => ({ length: Math.max(length, width), width: Math.min(length, width) })

describe('a blank on a sheet', () => {
  it('goes on it at an angle from the height Wetzel names (worked example: 300 x 20 mm, sheet 297 mm long)', () => {
    expect(placementIn(size(300, 20), { length: 297, width: 85.82 })).toBe('at an angle')
    expect(placementIn(size(300, 20), { length: 297, width: 85.81 })).toBeNull()
  })

  it('lies straight where it can, whichever way either is given', () => {
    expect(placementIn(size(210, 148), { length: 210, width: 297 })).toBe('straight')
    expect(placementIn(size(210, 297), { length: 297, width: 210 })).toBe('straight')
    expect(placementIn(size(298, 210), { length: 297, width: 210 })).toBeNull()
  })

  it('goes on exactly where some angle leaves its bounds within the sheet', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 400, noNaN: true }),
        fc.double({ min: 1, max: 400, noNaN: true }),
        fc.double({ min: 50, max: 400, noNaN: true }),
        fc.double({ min: 50, max: 400, noNaN: true }),
        (a, b, x, y) => {
          const sheet = size(x, y)
          const angles = Array.from({ length: 2001 }, (_, index) => (index / 2000) * (Math.PI / 2))
          const isInside = (slack: number): boolean =>
            angles.some((angle) => {
              const [sine, cosine] = [Math.sin(angle), Math.cos(angle)]
              return a * cosine + b * sine <= sheet.length + slack && a * sine + b * cosine <= sheet.width + slack
            })
          const placement = placementIn(size(a, b), sheet)
          // Angles are tried in steps, so a hair is allowed where the answer turns on it.
          if (isInside(0)) expect(placement).not.toBeNull()
          if (!isInside(0.5)) expect(placement).toBeNull()
        },
      ),
      { numRuns: 200 },
    )
  })
})

describe('the smallest rectangle round an outline', () => {
  const square = [
    { x: 0, y: -100 },
    { x: 100, y: 0 },
    { x: 0, y: 100 },
    { x: -100, y: 0 },
  ]

  it('is the square itself where it stands on a corner', () => {
    const found = smallestRectangle(square)
    expect(found.length).toBeCloseTo(100 * Math.SQRT2, 9)
    expect(found.width).toBeCloseTo(100 * Math.SQRT2, 9)
  })

  it('is no larger than the upright bounds, and the same however the outline is turned', () => {
    const corner = fc.record({
      x: fc.double({ min: -90, max: 90, noNaN: true }),
      y: fc.double({ min: -90, max: 90, noNaN: true }),
    })
    fc.assert(
      fc.property(
        fc.array(corner, { minLength: 3, maxLength: 12 }),
        fc.double({ min: 0, max: 6.3, noNaN: true }),
        (outline, angle) => {
          const turned = outline.map(({ x, y }) => ({
            x: x * Math.cos(angle) - y * Math.sin(angle),
            y: x * Math.sin(angle) + y * Math.cos(angle),
          }))
          const xs = outline.map(({ x }) => x)
          const ys = outline.map(({ y }) => y)
          const upright = (Math.max(...xs) - Math.min(...xs)) * (Math.max(...ys) - Math.min(...ys))
          const found = smallestRectangle(outline)
          const again = smallestRectangle(turned)
          expect(found.length * found.width).toBeLessThanOrEqual(upright + 1e-6)
          // A rectangle of least area has a side along the hull, so turning the outline changes nothing.
          expect(again.length * again.width).toBeCloseTo(found.length * found.width, 3)
        },
      ),
    )
  })
})
