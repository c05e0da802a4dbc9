import { describe, expect, it } from 'vitest'
import { basisWeightToGrammage, type PaperGrade } from '../../../shared/stock/basis-weight.ts'
import { parseWeight } from '../../../shared/stock/parse-weight.ts'
import { readCsv } from '../../support/csv.ts'
import { refusalOf, valueOf } from '../units/reading-of.ts'

const withinThousandth = (actual: number, expected: number): void => {
  expect(Math.abs(actual / expected - 1)).toBeLessThan(0.001)
}

describe('basis weights', () => {
  // Computed from the definition, pounds of 500 sheets of the basic size, apart from this engine.
  it.each([
    [20, 'bond', 75.19],
    [80, 'text', 118.41],
    [65, 'cover', 175.77],
    [80, 'cover', 216.33],
    [100, 'cover', 270.41],
    [110, 'index', 198.88],
    [67, 'bristol', 146.92],
    [150, 'tag', 244.12],
  ] as const)('%d lb %s is %d g/m²', (pounds, grade, grammage) => {
    withinThousandth(basisWeightToGrammage(pounds, grade), grammage)
    withinThousandth(valueOf(parseWeight(`${String(pounds)} lb ${grade}`)), grammage)
  })

  // Published: a mill, an equipment maker and a trade table.
  it.each([
    [28, 'bond', 105.3],
    [90, 'offset', 133.2],
    [100, 'cover', 270.4],
    [20, 'bond', 75.2],
  ] as const)('%d lb %s is %d g/m², as published', (pounds, grade, grammage) => {
    withinThousandth(basisWeightToGrammage(pounds, grade), grammage)
  })

  it('agree with the grammage that government specifications print beside them, within its rounding to 5 g/m²', () => {
    const grades: readonly string[] = ['bond', 'book', 'cover', 'index', 'bristol', 'tag']
    const rows = readCsv(new URL('../../reference/paper-weights.csv', import.meta.url)).filter(
      (row) =>
        row['kind'] === 'government specification' &&
        row['grammage_published_gsm'] !== '' &&
        grades.includes(row['grade'] ?? ''),
    )
    expect(rows.length).toBeGreaterThan(20)
    for (const row of rows) {
      const computed = basisWeightToGrammage(Number(row['basis_weight_lb']), row['grade'] as PaperGrade)
      expect(Math.abs(computed - Number(row['grammage_published_gsm']))).toBeLessThanOrEqual(2.5)
    }
  })

  it('agree with every row of the table of papers, merchants’ guides among them, by the basic size it names', () => {
    const gradeBySize: Readonly<Record<string, PaperGrade>> = {
      '17x22': 'bond',
      '25x38': 'text',
      '20x26': 'cover',
      '25.5x30.5': 'index',
      '22.5x28.5': 'bristol',
      '24x36': 'tag',
    }
    const rows = readCsv(new URL('../../reference/paper-weights.csv', import.meta.url)).filter(
      (row) => row['basis_weight_lb'] !== '' && row['grammage_computed_gsm'] !== '',
    )
    expect(rows.length).toBeGreaterThan(30)
    for (const row of rows) {
      const grade = gradeBySize[row['basis_size_in'] ?? '']
      if (grade === undefined) throw new Error(`no grade of basic size ${row['basis_size_in'] ?? ''}`)
      const computed = basisWeightToGrammage(Number(row['basis_weight_lb']), grade)
      // The table is rounded to a tenth.
      expect(Math.abs(computed - Number(row['grammage_computed_gsm']))).toBeLessThanOrEqual(0.051)
    }
  })
})

describe('weights as people write them', () => {
  it.each([
    ['270 gsm', 270],
    ['270gsm', 270],
    ['270 GSM', 270],
    ['270 g/m2', 270],
    ['270 g/m²', 270],
    ['67.5 g/m^2', 67.5],
  ])('%s', (text, grammage) => {
    expect(valueOf(parseWeight(text))).toBe(grammage)
  })

  it.each(['80 lb cover', '80lb cover', '80 lbs cover', '80# cover', ' 80 LB Cover '])('%s', (text) => {
    expect(valueOf(parseWeight(text))).toBeCloseTo(216.329, 2)
  })

  it('the same number of pounds is another paper in another grade', () => {
    expect(valueOf(parseWeight('80 lb cover')) / valueOf(parseWeight('80 lb text'))).toBeCloseTo(950 / 520, 9)
  })

  it.each([
    ['80 lb', 'weight-no-grade', 'write the grade too, such as 80 lb cover or 80 lb text: they are different papers'],
    ['80 lb covr', 'weight-unknown-grade', 'did you mean cover?'],
    [
      '80 lb velvet',
      'weight-unknown-grade',
      'grades are bond, ledger, writing, text, book, offset, cover, index, bristol, tag, newsprint',
    ],
    ['270', 'weight-no-unit', 'write 270 gsm, or a basis weight such as 80 lb cover'],
    ['67,5 gsm', 'weight-decimal-comma', 'write a dot: 67.5 gsm'],
    ['', 'weight-not-understood', 'write it such as 270 gsm or 80 lb cover'],
    ['heavy', 'weight-not-understood', 'write it such as 270 gsm or 80 lb cover'],
    ['-270 gsm', 'weight-not-understood', 'write it such as 270 gsm or 80 lb cover'],
    ['0 gsm', 'weight-implausible', 'check the number and its unit'],
    ['27000 gsm', 'weight-implausible', 'check the number and its unit'],
  ])('%j is refused', (text, code, remedy) => {
    expect(refusalOf(parseWeight(text))).toEqual({ code, remedy })
  })
})
