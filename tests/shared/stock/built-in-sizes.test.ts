import { describe, expect, it } from 'vitest'
import { ambiguousSize, builtInSize, builtInSizeNames } from '../../../shared/stock/built-in-sizes.ts'
import { sheetByName, sheetNames } from '../../../shared/stock/sheets.ts'
import { parseSize } from '../../../shared/units/parse-size.ts'
import { readCsv } from '../../support/csv.ts'
import { valueOf } from '../units/reading-of.ts'

const sides = (name: string): readonly [number, number] => {
  const size = builtInSize(name)
  if (size === null) throw new Error(`no size ${name}`)
  return [size.length, size.width]
}
const numbers = [0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 10]

describe('the ISO 216 sizes', () => {
  it.each(['a', 'b', 'c'])('of series %s halve the longer side from one to the next', (series) => {
    for (const number of numbers.slice(1)) {
      const [length, width] = sides(`iso-${series}${String(number - 1)}`)
      // The fraction of a millimetre is dropped: A1 is 594 mm wide, not 595.
      expect(sides(`iso-${series}${String(number)}`)).toEqual([width, Math.floor(length / 2)])
    }
  })

  it.each([
    ['a', 2 ** (1 / 4), 0.7],
    ['b', 2 ** (1 / 2), 1],
    ['c', 2 ** (3 / 8), 1],
  ] as const)('of series %s lie within a millimetre of their design sizes', (series, longest, most) => {
    for (const number of numbers) {
      const [length, width] = sides(`iso-${series}${String(number)}`)
      expect(Math.abs(length - 1000 * longest * 2 ** (-number / 2))).toBeLessThan(most)
      expect(Math.abs(width - 1000 * longest * 2 ** (-(number + 1) / 2))).toBeLessThan(most)
    }
  })

  it('leave room for a flat A sheet in the C envelope of its number', () => {
    for (const number of numbers) {
      const [length, width] = sides(`iso-a${String(number)}`)
      const [long, short] = sides(`iso-c${String(number)}`)
      expect(long).toBeGreaterThan(length)
      expect(short).toBeGreaterThan(width)
    }
  })
})

describe('the sizes published for envelopes and cards', () => {
  const rows = readCsv(new URL('../../reference/envelope-sizes.csv', import.meta.url))
  const words = (name: string): string =>
    name
      .replace(/\(.*\)/, '')
      .replace('booklet/catalog', '')
      .replace(/^No\./, 'no')
      .replace(/(\d) x (\d)/, '$1x$2')
      .replace('/', '-')
      .trim()
      .replace(/[\s-]+/g, '-')
      .replace('1/', '1-')
      .toLowerCase()
  const nameOf = (row: Readonly<Record<string, string>>): string => {
    const name = row['name'] ?? ''
    if (name === 'E4') return 'din-e4'
    if (row['series'] === 'printer media list' || name === 'Italy') return `metric-${words(name)}`
    return row['region'] === 'US' ? `us-${words(name)}` : `iso-${words(name)}`
  }
  const expectSides = (name: string, row: Readonly<Record<string, string>>, of: 'env' | 'card'): void => {
    const isInches = row['native_unit'] === 'in'
    const written = isInches
      ? [row[`${of}_long_in`], row[`${of}_short_in`]].map((inches) => Number(inches) * 25.4)
      : [row[`${of}_long_mm`], row[`${of}_short_mm`]].map(Number)
    expect(sides(name)[0], name).toBeCloseTo(written[0] ?? NaN, 9)
    expect(sides(name)[1], name).toBeCloseTo(written[1] ?? NaN, 9)
  }

  it('hold every envelope', () => {
    expect(rows.length).toBeGreaterThan(40)
    for (const row of rows) expectSides(row['region'] === 'US' ? `${nameOf(row)}-envelope` : nameOf(row), row, 'env')
  })

  it('hold every card, the variants under their own names', () => {
    const plain = ['common', 'craft', 'listed', 'rule of thumb', 'merchant maximum']
    let cards = 0
    for (const row of rows.filter((each) => each['region'] === 'US' && each['card_variant'] !== '')) {
      const variant = row['card_variant'] ?? ''
      const isOnly = rows.filter((each) => each['name'] === row['name']).length === 1
      const suffix = plain.includes(variant) || isOnly ? '' : `-${variant.replace('merchant advice', 'advice')}`
      expectSides(`${nameOf(row)}-card${suffix}`, row, 'card')
      cards += 1
    }
    expect(cards).toBeGreaterThan(20)
  })

  it('are as exact as the same size written out', () => {
    const [length, width] = valueOf(parseSize('5 3/4 x 4 3/8 in', 'mm', 2))
    expect(sides('us-a2-envelope')).toEqual([length?.mm, width?.mm])
  })
})

describe('built-in sizes', () => {
  it('have names an author may write, and their longer side first', () => {
    for (const name of builtInSizeNames()) {
      expect(name).toMatch(/^[a-z][a-z0-9]*(-[a-z0-9]+)*$/)
      const [length, width] = sides(name)
      expect(length).toBeGreaterThanOrEqual(width)
    }
    expect(new Set(builtInSizeNames()).size).toBe(builtInSizeNames().length)
  })

  it('are none for other names, whatever objects may hold', () => {
    for (const name of ['', 'iso-a11', 'a6', 'constructor', '__proto__', 'toString'])
      expect(builtInSize(name)).toBeNull()
  })

  it.each([
    ['a6', ['iso-a6', 'us-a6-card']],
    ['a2', ['iso-a2', 'us-a2-card']],
    ['c6', ['iso-c6']],
    ['dl', ['iso-dl']],
    ['a7-envelope', ['us-a7-envelope']],
  ])('%s alone stands for %j', (name, offers) => {
    expect(ambiguousSize(name)).toEqual(offers)
    for (const offer of offers) expect(builtInSize(offer)).not.toBeNull()
  })

  it('offer nothing for a name that is no size', () => {
    for (const name of ['note', '', 'a99']) expect(ambiguousSize(name)).toBeNull()
  })
})

describe('sheets', () => {
  it.each([
    ['a3', 420, 297],
    ['a4', 297, 210],
    ['letter', 279.4, 215.9],
    ['legal', 355.6, 215.9],
    ['tabloid', 431.8, 279.4],
    ['12x12in', 304.8, 304.8],
  ])('%s is %d x %d mm', (name, length, width) => {
    expect(sheetByName(name)).toEqual({ length, width })
  })

  it('are all found by their names, and no others', () => {
    for (const name of sheetNames) expect(sheetByName(name)).not.toBeNull()
    for (const name of ['a7', 'A4', 'leter', 'constructor', '']) expect(sheetByName(name)).toBeNull()
  })
})
