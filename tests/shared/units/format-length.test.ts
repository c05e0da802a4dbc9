import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formatLength, formatMark, formatRange, formatSize } from '../../../shared/units/format-length.ts'
import { parseLength } from '../../../shared/units/parse-length.ts'
import { parseRange } from '../../../shared/units/parse-range.ts'
import { parseSize } from '../../../shared/units/parse-size.ts'
import { valueOf } from './reading-of.ts'

const signed = { allowNegative: true, allowZero: true }

describe('a length is written', () => {
  it.each([
    [20.5, '20.5 mm'],
    [20, '20 mm'],
    [0.37, '0.37 mm'],
    [20.004, '20 mm'],
    [-0.3, '-0.3 mm'],
    [-0.001, '0 mm'],
    [1000, '1000 mm'],
  ])('in millimetres with just enough decimals: %d', (mm, text) => {
    expect(formatLength(mm, 'mm')).toBe(text)
  })

  it.each([
    [209.55, '8 1/4 in'],
    [3.175, '1/8 in'],
    [-3.175, '-1/8 in'],
    [-28.575, '-1 1/8 in'],
    [25.4, '1 in'],
    [0, '0 in'],
    [25.4 / 64, '1/64 in'],
    [25.4 * (2 + 63 / 64), '2 63/64 in'],
    [20, '0.787 in'],
    [25.4 / 128, '0.008 in'],
  ])('in inches as a fraction where it is one of a ruler: %d', (mm, text) => {
    expect(formatLength(mm, 'in')).toBe(text)
  })

  it('with as many decimals as asked for, or without its unit', () => {
    expect(formatLength(0.12345, 'mm', { decimals: 4 })).toBe('0.1235 mm')
    expect(formatLength(209.55, 'in', { bare: true })).toBe('8 1/4')
  })

  it('so that it can be read again, to half of the last decimal in millimetres', () => {
    fc.assert(
      fc.property(fc.double({ min: -5000, max: 5000, noNaN: true }), fc.integer({ min: 0, max: 6 }), (mm, decimals) => {
        const again = valueOf(parseLength(formatLength(mm, 'mm', { decimals }), 'in', signed)).mm
        expect(Math.abs(again - mm)).toBeLessThanOrEqual(0.5 * 10 ** -decimals + 1e-9)
      }),
    )
  })

  it('so that it can be read again, to half of the last decimal in inches', () => {
    fc.assert(
      fc.property(fc.double({ min: -5000, max: 5000, noNaN: true }), (mm) => {
        const again = valueOf(parseLength(formatLength(mm, 'in'), 'mm', signed)).mm
        expect(Math.abs(again - mm)).toBeLessThanOrEqual(25.4 * 0.0005 + 1e-9)
      }),
    )
  })

  it('so that hundredths of a millimetre come back exactly', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 900_000 }), (count) => {
        expect(valueOf(parseLength(formatLength(count / 100, 'mm'), 'in')).mm).toBe(count / 100)
      }),
    )
  })

  it('so that a fraction of an inch comes back exactly', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 64 * 390 }), fc.constantFrom(2, 4, 8, 16, 32, 64), (count, denominator) => {
        fc.pre(count / denominator < 390)
        const mm = valueOf(parseLength(`${String(count)}/${String(denominator)} in`, 'mm')).mm
        const text = formatLength(mm, 'in')
        expect(text).toMatch(/^(\d+|\d+ \d+\/\d+|\d+\/\d+) in$/)
        expect(valueOf(parseLength(text, 'mm')).mm).toBe(mm)
      }),
    )
  })
})

describe('the nearest mark of a ruler', () => {
  // Worked numbers of the derivation of rounding (section K), in exact fractions: the sixteenth, halves up.
  it.each([
    [149.225, '5 7/8 in', 0],
    [152.3, '6 in', 0.1],
    [12.7, '1/2 in', 0],
    [25.39, '1 in', 0.01],
    [0.7, '0 in', -0.7],
    [-3.2, '-1/8 in', 0.025],
  ])('to %d mm in sixteenths is %s, off by %d', (mm, text, error) => {
    const mark = formatMark(mm, 25.4 / 16, 'in')
    expect(mark.text).toBe(text)
    expect(mark.error).toBeCloseTo(error, 9)
    expect(mark.mm).toBeCloseTo(mm + error, 9)
  })

  it.each([
    [20.4, 1, '20 mm', -0.4],
    [20.5, 1, '21 mm', 0.5],
    [-20.5, 1, '-20 mm', 0.5],
    [20.3, 0.5, '20.5 mm', 0.2],
    [20.26, 0.1, '20.3 mm', 0.04],
    [-0.2, 1, '0 mm', 0.2],
  ])('to %d mm on a metric ruler of %d mm is %s, off by %d', (mm, grid, text, error) => {
    const mark = formatMark(mm, grid, 'mm')
    expect(mark.text).toBe(text)
    expect(mark.error).toBeCloseTo(error, 9)
  })

  it('goes up from the middle between two marks', () => {
    expect(formatMark((25.4 / 16) * 1.5, 25.4 / 16, 'in').text).toBe('1/8 in')
  })

  it('is never further off than half a mark, and is read back as where it lies', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -900, max: 900, noNaN: true }),
        fc.constantFrom(
          ['in', 8] as const,
          ['in', 16] as const,
          ['in', 32] as const,
          ['mm', 1] as const,
          ['mm', 2] as const,
        ),
        (mm, [unit, marks]) => {
          const grid = (unit === 'in' ? 25.4 : 1) / marks
          const mark = formatMark(mm, grid, unit)
          expect(Math.abs(mark.error)).toBeLessThanOrEqual(grid / 2 + 2e-6)
          expect(valueOf(parseLength(mark.text, 'mm', signed)).mm).toBeCloseTo(mark.mm, 9)
          expect(mark.mm - mark.error).toBeCloseTo(mm, 9)
        },
      ),
    )
  })
})

describe('ranges and sizes are written', () => {
  it.each([
    [{ min: 0.2, max: 3 }, 'mm', '0.2..3 mm'],
    [{ min: 0.4, max: null }, 'mm', '0.4.. mm'],
    [{ min: null, max: 3 }, 'mm', '..3 mm'],
    [{ min: -0.3, max: 4 }, 'mm', '-0.3..4 mm'],
    [{ min: 3.175, max: 12.7 }, 'in', '1/8..1/2 in'],
  ] as const)('%j in %s', (range, unit, text) => {
    expect(formatRange(range, unit)).toBe(text)
    expect(valueOf(parseRange(text, 'mm'))).toEqual(range)
  })

  it.each([
    [[105, 148], 'mm', '105 x 148 mm'],
    [[152.5, 120, 38], 'mm', '152.5 x 120 x 38 mm'],
    [[228.6, 196.85], 'in', '9 x 7 3/4 in'],
  ] as const)('%j in %s', (lengths, unit, text) => {
    expect(formatSize(lengths, unit)).toBe(text)
    expect(valueOf(parseSize(text, 'mm', '2 or 3')).map(({ mm }) => mm)).toEqual(lengths)
  })
})
