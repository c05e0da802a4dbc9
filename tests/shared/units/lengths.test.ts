import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formatLength, formatMark } from '../../../shared/units/format-length.ts'
import { ceilToGrid, floorToGrid, isOnGrid, roundToGrid } from '../../../shared/units/grid.ts'
import { nearestName } from '../../../shared/units/did-you-mean.ts'
import { parseLength } from '../../../shared/units/parse-length.ts'
import { parseRange } from '../../../shared/units/parse-range.ts'
import { parseSize } from '../../../shared/units/parse-size.ts'
import { parseTolerancedLength, parseTolerancedSize } from '../../../shared/units/parse-toleranced-length.ts'

const mm = (text: string): number => {
  const reading = parseLength(text, 'mm')
  if (!reading.ok) throw new Error(`${reading.code}: ${reading.fact}`)
  return reading.value.mm
}

describe('lengths are read as people write them', () => {
  it.each([
    ['148', 148],
    ['0.37', 0.37],
    ['148 mm', 148],
    ['14.8cm', 148],
    ['1 in', 25.4],
    ['3/4 in', 19.05],
    ['8 1/4 in', 209.55],
    ['8-1/4 in', 209.55],
    ['8¼ in', 209.55],
    ['8 ¼ in', 209.55],
    ['½"', 12.7],
    ['5″', 127],
    ['12 pt', 0.3048],
    ['10 mil', 0.254],
    ['150 um', 0.15],
    ['150 µm', 0.15],
    ['.5 mm', 0.5],
  ])('%s', (text, value) => {
    expect(mm(text)).toBeCloseTo(value, 12)
  })

  it.each([
    ['12,5', 'length-decimal-comma', 'write a dot: 12.5'],
    ['1e3', 'length-exponent', 'write it out: 1000'],
    ['0x1f', 'length-hexadecimal', 'write it in ordinary digits: 31'],
    ['0o17', 'length-octal', 'write it in ordinary digits: 15'],
    ['0777', 'length-octal', 'write 777'],
    ['3/', 'length-missing-operand', 'write both numbers, such as 3/4'],
    ['3/0', 'length-zero-denominator', 'write a fraction such as 3/4'],
    ['0', 'length-zero', 'write a length larger than nought'],
    ['-4 mm', 'length-negative', 'only a clearance may be; write the length without the sign'],
    ['10001 mm', 'length-too-long', 'check the unit; templates are made of sheets a hand can turn'],
    ['12 inch', 'length-unknown-unit', 'units are mm, cm, in, and for thickness um, mil, pt'],
    ['12 nm', 'length-unknown-unit', 'did you mean mm?'],
    ['', 'length-empty', 'write a number with a unit, such as 148 mm'],
    ['mm', 'length-missing-operand', 'write one before the unit, such as 12 mm'],
    ['wide', 'length-unknown-unit', 'units are mm, cm, in, and for thickness um, mil, pt'],
    ['1 2 3', 'length-not-understood', 'write a number with a unit, such as 148 mm, 8 1/4 in or 0.32 mm'],
  ])('“%s” is refused as %s', (text, code, remedy) => {
    const reading = parseLength(text, 'mm')
    expect(reading.ok ? null : [reading.code, reading.remedy]).toEqual([code, remedy])
  })

  it('never throws, whatever is written', () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        for (const read of [parseLength, parseRange, parseTolerancedLength] as const)
          expect(read(text, 'mm')).toHaveProperty('ok')
        expect(parseSize(text, 'in', 2)).toHaveProperty('ok')
      }),
    )
  })

  it('round-trips sixty-fourths of an inch exactly', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 64 * 300 }), (count) => {
        const length = (count * 25.4) / 64
        expect(mm(formatLength(length, 'in'))).toBeCloseTo(length, 9)
      }),
    )
  })

  it('round-trips hundredths of a millimetre exactly', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 900_000 }), (count) => {
        expect(mm(formatLength(count / 100, 'mm'))).toBe(count / 100)
      }),
    )
  })
})

describe('sizes, ranges and tolerances', () => {
  it('gives the last unit to those before it', () => {
    const reading = parseSize('9 x 7 3/4 in', 'mm', 2)
    expect(reading.ok && reading.value.map((length) => length.mm)).toEqual([228.6, 196.85])
    const three = parseSize('152 × 120 × 38', 'mm', '2 or 3')
    expect(three.ok && three.value.map((length) => length.mm)).toEqual([152, 120, 38])
  })

  it.each([
    ['1/8..1/2 in', { min: 3.175, max: 12.7 }],
    ['0.4.. mm', { min: 0.4, max: null }],
    ['..3 mm', { min: null, max: 3 }],
    ['-0.3..4 mm', { min: -0.3, max: 4 }],
    ['0.2..3', { min: 0.2, max: 3 }],
  ])('range %s', (text, value) => {
    expect(parseRange(text, 'mm')).toEqual({ ok: true, value })
  })

  it.each(['3..1 mm', '..', '5 mm', 'a..b'])('range %s is refused with a remedy', (text) => {
    const reading = parseRange(text, 'mm')
    expect(reading.ok ? '' : reading.remedy).not.toBe('')
  })

  it.each([
    ['0.37 mm ± 5 %', 0.37, 0.0185],
    ['0.37 mm +- 0.02 mm', 0.37, 0.02],
    ['0.37 +0.03/-0.01 mm', 0.38, 0.02],
    ['0.32 mm', 0.32, null],
    ['13 pt', 0.3302, null],
  ])('tolerance %s', (text, nominal, halfWidth) => {
    const reading = parseTolerancedLength(text, 'mm')
    if (!reading.ok) throw new Error(reading.fact)
    expect(reading.value.nominal).toBeCloseTo(nominal, 12)
    if (halfWidth === null) expect(reading.value.halfWidth).toBeNull()
    else expect(reading.value.halfWidth).toBeCloseTo(halfWidth, 12)
  })

  it('divides a stack of ten sheets', () => {
    const reading = parseTolerancedLength('3.2 mm / 10', 'mm', { allowStack: true })
    expect(reading.ok && reading.value.nominal).toBeCloseTo(0.32, 12)
  })

  it('lets one tolerance hold for a whole size', () => {
    const reading = parseTolerancedSize('162 x 114 mm ± 0.8 mm', 'mm', 2)
    expect(reading.ok && reading.value.map((length) => [length.nominal, length.halfWidth])).toEqual([
      [162, 0.8],
      [114, 0.8],
    ])
  })
})

describe('marks of a ruler', () => {
  const grid = fc.constantFrom(0.5, 1, 25.4 / 16, 25.4 / 8, 25.4 / 32)
  const length = fc.double({ min: 0.01, max: 2000, noNaN: true })

  it('rounding up, down and to the nearest stay on the grid and in order', () => {
    fc.assert(
      fc.property(length, grid, (value, step) => {
        const [down, near, up] = [floorToGrid(value, step), roundToGrid(value, step), ceilToGrid(value, step)]
        for (const mark of [down, near, up]) expect(isOnGrid(mark, step)).toBe(true)
        expect(down).toBeLessThanOrEqual(value + 1e-5)
        expect(up).toBeGreaterThanOrEqual(value - 1e-5)
        expect(Math.abs(near - value)).toBeLessThanOrEqual(step / 2 + 1e-6)
        expect(up - down).toBeLessThanOrEqual(step + 1e-6)
      }),
    )
  })

  it('a mark says how far it is off', () => {
    fc.assert(
      fc.property(length, grid, (value, step) => {
        const mark = formatMark(value, step, 'mm')
        expect(mark.mm - mark.error).toBeCloseTo(value, 9)
        expect(Math.abs(mark.error)).toBeLessThanOrEqual(step / 2 + 1e-6)
      }),
    )
  })
})

describe('the nearest name', () => {
  it.each([
    ['envelop', 'envelope'],
    ['ldi', 'lid'],
    ['smoth-270', 'smooth-270'],
  ])('of %s is %s', (word, name) => {
    expect(nearestName(word, ['lid', 'base', 'envelope', 'smooth-270'])).toBe(name)
  })

  it('is none where nothing is near', () => {
    expect(nearestName('zebra', ['lid', 'base'])).toBeNull()
  })
})
