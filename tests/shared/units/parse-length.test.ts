import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { parseLength } from '../../../shared/units/parse-length.ts'
import type { LengthUnit } from '../../../shared/units/units.ts'
import { isNearest } from './nearest-double.ts'
import { valueOf } from './reading-of.ts'

const mm = (text: string, unit: LengthUnit = 'mm'): number => valueOf(parseLength(text, unit)).mm

describe('lengths as people write them', () => {
  it.each([
    ['148', 148],
    ['0.37', 0.37],
    ['.37', 0.37],
    ['148.0', 148],
    ['3/4', 0.75],
    ['8 1/4', 8.25],
    ['8-1/4', 8.25],
    ['8 1 / 4', 8.25],
    ['8¼', 8.25],
    ['8 ¼', 8.25],
    ['8-¼', 8.25],
    ['¼', 0.25],
    ['8 1⁄4', 8.25],
    ['5/4', 1.25],
    ['  148  ', 148],
    ['+148', 148],
  ])('%s without a unit is that many of the file’s unit', (text, count) => {
    expect(mm(text)).toBe(count)
    expect(mm(text, 'cm')).toBeCloseTo(count * 10, 12)
    expect(mm(text, 'in')).toBeCloseTo(count * 25.4, 12)
  })

  it.each([
    ['20 mm', 20],
    ['20mm', 20],
    ['2 cm', 20],
    ['8 1/4 in', 209.55],
    ['8 1/4"', 209.55],
    ['8¼″', 209.55],
    ['8 1/4”', 209.55],
    ['320 um', 0.32],
    ['320 \u00b5m', 0.32],
    ['320\u03bcm', 0.32],
    ['10 mil', 0.254],
    ['13 pt', 0.3302],
    ['13.5 pt', 0.3429],
  ])('%s has its own unit, whatever the file’s', (text, length) => {
    expect(mm(text, 'mm')).toBe(length)
    expect(mm(text, 'in')).toBe(length)
  })

  it.each([
    ['½', 1 / 2],
    ['⅓', 1 / 3],
    ['⅔', 2 / 3],
    ['¼', 1 / 4],
    ['¾', 3 / 4],
    ['⅕', 1 / 5],
    ['⅖', 2 / 5],
    ['⅗', 3 / 5],
    ['⅘', 4 / 5],
    ['⅙', 1 / 6],
    ['⅚', 5 / 6],
    ['⅐', 1 / 7],
    ['⅛', 1 / 8],
    ['⅜', 3 / 8],
    ['⅝', 5 / 8],
    ['⅞', 7 / 8],
    ['⅑', 1 / 9],
    ['⅒', 1 / 10],
  ])('%s is its fraction', (glyph, value) => {
    expect(mm(`${glyph} mm`)).toBe(value)
  })

  it('keeps the unit and the text as written', () => {
    expect(valueOf(parseLength(' 8 1/4 in ', 'mm'))).toEqual({ mm: 209.55, unit: 'in', text: '8 1/4 in' })
    expect(valueOf(parseLength('9', 'in'))).toEqual({ mm: 228.6, unit: 'in', text: '9' })
  })

  it('reads a negative length and none where they make sense, and no negative nought', () => {
    const options = { allowNegative: true, allowZero: true }
    expect(valueOf(parseLength('-0.3', 'mm', options)).mm).toBe(-0.3)
    expect(valueOf(parseLength('−1/8 in', 'mm', options)).mm).toBe(-3.175)
    expect(Object.is(valueOf(parseLength('-0', 'mm', options)).mm, 0)).toBe(true)
    expect(valueOf(parseLength('0 mm', 'mm', options)).mm).toBe(0)
  })

  it('reads ten metres and no more', () => {
    expect(mm('10000 mm')).toBe(10_000)
    expect(parseLength('10000.1 mm', 'mm').ok).toBe(false)
  })
})

describe('the value of a length is the double nearest to it', () => {
  const perUnit = {
    mm: [1n, 1n],
    cm: [10n, 1n],
    in: [127n, 5n],
    um: [1n, 1000n],
    mil: [127n, 5000n],
    pt: [127n, 5000n],
  } as const
  const units = fc.constantFrom<LengthUnit>('mm', 'cm', 'in', 'um', 'mil', 'pt')
  const isCorrect = (text: string, unit: LengthUnit, top: bigint, bottom: bigint): boolean => {
    const [times, over] = perUnit[unit]
    return isNearest(mm(`${text} ${unit}`), top * times, bottom * over)
  }

  it('for decimals', () => {
    fc.assert(
      fc.property(units, fc.integer({ min: 1, max: 300 }), fc.stringMatching(/^\d{1,40}$/), (unit, whole, places) => {
        const text = `${String(whole)}.${places}`
        return isCorrect(text, unit, BigInt(`${String(whole)}${places}`), 10n ** BigInt(places.length))
      }),
      { numRuns: 2000 },
    )
  })

  it('for fractions and mixed numbers', () => {
    const part = fc.bigInt({ min: 1n, max: 10n ** 24n })
    fc.assert(
      fc.property(units, fc.bigInt({ min: 0n, max: 200n }), part, part, (unit, whole, a, b) => {
        const [top, bottom] = a < b ? [a, b] : [b, a]
        return isCorrect(`${String(whole)} ${String(top)}/${String(bottom)}`, unit, whole * bottom + top, bottom)
      }),
      { numRuns: 2000 },
    )
  })

  it('where a decimal lies just above the middle between two doubles', () => {
    // 1 + 2^-53 is the middle; one part in 10^60 more must go up, and the middle itself to the even one, 1.
    const middle = '1.00000000000000011102230246251565404236316680908203125'
    expect(mm(middle)).toBe(1)
    expect(mm(`${middle}0000001`)).toBe(1 + Number.EPSILON)
  })

  it('the same for a plain decimal and for the fraction it is', () => {
    fc.assert(
      fc.property(
        units,
        fc.integer({ min: 1, max: 9_999 }),
        fc.integer({ min: 0, max: 999 }),
        (unit, whole, places) => {
          const decimal = `${String(whole)}.${String(places).padStart(3, '0')} pt`
          const fraction = `${String(whole * 1000 + places)}/1000 pt`
          return mm(decimal, unit) === mm(fraction, unit)
        },
      ),
    )
  })
})
