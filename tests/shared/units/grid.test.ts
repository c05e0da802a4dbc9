import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { ceilToGrid, floorToGrid, isOnGrid, roundToGrid } from '../../../shared/units/grid.ts'
import { inchesToMillimetres } from '../../../shared/units/inches.ts'

const sixteenth = 1.5875
const grids = fc.constantFrom(1, 0.5, 0.1, 25.4 / 8, sixteenth, 25.4 / 32)
const lengths = fc.double({ min: -2000, max: 2000, noNaN: true })

describe('rounding to the marks of a ruler', () => {
  it.each([
    [20.4, 1, 20, 21, 20],
    [20.5, 1, 21, 21, 20],
    [-20.5, 1, -20, -20, -21],
    [20, 1, 20, 20, 20],
    [20.3, 0.5, 20.5, 20.5, 20],
    [110, sixteenth, 109.5375, 111.125, 109.5375],
  ])('%d mm on marks %d mm apart', (mm, grid, nearest, up, down) => {
    expect(roundToGrid(mm, grid)).toBeCloseTo(nearest, 9)
    expect(ceilToGrid(mm, grid)).toBeCloseTo(up, 9)
    expect(floorToGrid(mm, grid)).toBeCloseTo(down, 9)
  })

  it('leaves every mark where it is, however it was reckoned', () => {
    fc.assert(
      fc.property(fc.integer({ min: -2000, max: 2000 }), grids, fc.constantFrom(-5e-7, 0, 5e-7), (count, grid, off) => {
        const mark = count * grid + off
        for (const round of [roundToGrid, ceilToGrid, floorToGrid])
          expect(round(mark, grid)).toBeCloseTo(count * grid, 9)
        expect(isOnGrid(mark, grid)).toBe(true)
      }),
    )
  })

  it('keeps what is off a mark off it', () => {
    expect(isOnGrid(20.00001, 1)).toBe(false)
    expect(isOnGrid(19.99999, 1)).toBe(false)
    expect(ceilToGrid(20.00001, 1)).toBe(21)
    expect(floorToGrid(19.99999, 1)).toBe(19)
  })

  it('up is never smaller, down never larger, and both less than a mark away', () => {
    fc.assert(
      fc.property(lengths, grids, (mm, grid) => {
        const up = ceilToGrid(mm, grid)
        const down = floorToGrid(mm, grid)
        expect(up).toBeGreaterThanOrEqual(mm - 2e-6)
        expect(down).toBeLessThanOrEqual(mm + 2e-6)
        expect(up - mm).toBeLessThan(grid)
        expect(mm - down).toBeLessThan(grid)
        expect([up, down].some((mark) => Math.abs(mark - roundToGrid(mm, grid)) < 1e-9)).toBe(true)
      }),
    )
  })

  it('never gives a negative nought', () => {
    for (const round of [roundToGrid, ceilToGrid, floorToGrid]) {
      expect(Object.is(round(-0, 1), -0)).toBe(false)
      expect(Object.is(round(-1e-7, 1), -0)).toBe(false)
    }
    expect(Object.is(ceilToGrid(-0.3, 1), 0)).toBe(true)
  })

  it('an inch is exactly 25.4 mm, rounded once', () => {
    expect(inchesToMillimetres(1)).toBe(25.4)
    expect(inchesToMillimetres(4.375)).toBe(111.125)
    expect(inchesToMillimetres(8.5)).toBe(215.9)
  })
})
