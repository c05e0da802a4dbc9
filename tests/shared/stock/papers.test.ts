import { describe, expect, it } from 'vitest'
import { basisWeightToGrammage } from '../../../shared/stock/basis-weight.ts'
import { ambiguousSize, builtInSize } from '../../../shared/stock/built-in-sizes.ts'
import { apparentDensity, defaultCaliperShare, estimateCaliper } from '../../../shared/stock/caliper-estimate.ts'
import { parseWeight } from '../../../shared/stock/parse-weight.ts'
import { sheetByName } from '../../../shared/stock/sheets.ts'
import { readCsv } from '../../support/csv.ts'

describe('weights of paper', () => {
  // Published conversions (mills' and equipment makers' tables), which agree to a tenth of a percent.
  it.each([
    [20, 'bond', 75.19],
    [80, 'text', 118.41],
    [65, 'cover', 175.77],
    [80, 'cover', 216.33],
    [100, 'cover', 270.41],
    [110, 'index', 198.88],
    [67, 'bristol', 146.92],
    [150, 'tag', 244.12],
    [90, 'offset', 133.2],
  ] as const)('%d lb %s', (pounds, grade, grammage) => {
    expect(basisWeightToGrammage(pounds, grade) / grammage).toBeCloseTo(1, 3)
  })

  it('agrees with every row of the published table that has both', () => {
    const grades = new Set(['bond', 'text', 'cover', 'index', 'bristol', 'tag', 'book', 'offset'])
    const rows = readCsv(new URL('../../reference/paper-weights.csv', import.meta.url)).filter(
      (row) =>
        grades.has(row['grade'] ?? '') &&
        Number(row['basis_weight_lb']) > 0 &&
        Number(row['grammage_computed_gsm']) > 0,
    )
    expect(rows.length).toBeGreaterThan(30)
    const basic: Readonly<Record<string, string>> = {
      '17x22': 'bond',
      '25x38': 'text',
      '20x26': 'cover',
      '25.5x30.5': 'index',
      '22.5x28.5': 'bristol',
      '24x36': 'tag',
    }
    for (const row of rows) {
      const grade = basic[row['basis_size_in'] ?? '']
      if (grade === undefined) continue
      const computed = basisWeightToGrammage(Number(row['basis_weight_lb']), grade as 'bond')
      expect(Math.abs(computed / Number(row['grammage_computed_gsm']) - 1), JSON.stringify(row)).toBeLessThan(0.002)
    }
  })

  it.each([
    ['270 gsm', 270],
    ['270 g/m²', 270],
    ['80 lb cover', 216.33],
  ])('%s is read', (text, grammage) => {
    const reading = parseWeight(text)
    expect(reading.ok && Math.abs(reading.value / grammage - 1) < 0.001).toBe(true)
  })

  it.each([
    ['80 lb', 'weight-no-grade'],
    ['270', 'weight-no-unit'],
    ['80 lb covr', 'weight-unknown-grade'],
    ['heavy', 'weight-not-understood'],
    ['5000 gsm', 'weight-implausible'],
  ])('%s is refused as %s', (text, code) => {
    const reading = parseWeight(text)
    expect(reading.ok ? null : reading.code).toBe(code)
  })

  it('estimates a caliper only as roughly as weight allows', () => {
    expect(estimateCaliper(240)).toBeCloseTo(0.3, 9)
    expect(apparentDensity(240, 0.3)).toBeCloseTo(0.8, 9)
    // Published: a conservation board maker, ±10 % up to 300 g/m², ±5 % above.
    expect([defaultCaliperShare(300), defaultCaliperShare(301), defaultCaliperShare(null)]).toEqual([0.1, 0.05, 0.1])
  })
})

describe('sizes everyone knows', () => {
  it('halve the longer side and drop the fraction, as ISO 216 does', () => {
    for (const series of ['a', 'b', 'c']) {
      for (let n = 0; n < 10; n += 1) {
        const larger = builtInSize(`iso-${series}${String(n)}`)
        const smaller = builtInSize(`iso-${series}${String(n + 1)}`)
        expect(smaller?.length, `${series}${String(n)}`).toBe(larger?.width)
        expect(Math.abs((smaller?.width ?? 0) - (larger?.length ?? 0) / 2)).toBeLessThanOrEqual(
          series === 'a' ? 0.5 : 1,
        )
      }
    }
    expect(builtInSize('iso-a0')).toEqual({ length: 1189, width: 841 })
  })

  it('name both papers where a bare name could be either', () => {
    expect(ambiguousSize('a6')).toEqual(['iso-a6', 'us-a6-card'])
    expect(ambiguousSize('a2')).toEqual(['iso-a2', 'us-a2-card'])
    expect(ambiguousSize('note')).toBeNull()
  })

  it('hold no inherited names', () => {
    expect(builtInSize('constructor')).toBeNull()
    expect(sheetByName('toString')).toBeNull()
    expect(sheetByName('letter')).toEqual({ length: 279.4, width: 215.9 })
  })
})
