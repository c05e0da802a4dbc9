import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { checkTemplate } from '../../../../shared/check-template.ts'
import { mailPack } from '../../../../shared/rules/mail/packs.ts'
import { ratioOf } from '../../../../shared/rules/mail/ratio/ratio.ts'
import { mailPackNames, type MailPackName } from '../../../../shared/template/mail-pack-names.ts'
import { emptyWorkspace } from '../../../../shared/template/read-workspace.ts'
import { dimension, source } from '../../../../shared/uncertainty/arithmetic.ts'
import type { Range } from '../../../../shared/units/units.ts'

/** Rows of the table of published limits that each pack was made from: operator and class. */
const rowOf: Readonly<Record<MailPackName, readonly [string, string]>> = {
  'usps-letter': ['USPS', 'letter, machinable'],
  'usps-flat': ['USPS', 'flat (large envelope)'],
  'usps-postcard': ['USPS', 'postcard price, single piece'],
  'usps-postcard-large': ['USPS', 'postcard price, presort or automation First-Class'],
  'royal-mail-letter': ['Royal Mail', 'letter'],
  'royal-mail-large-letter': ['Royal Mail', 'large letter'],
  'canada-post-letter': ['Canada Post', 'standard lettermail'],
  'canada-post-oversize': ['Canada Post', 'non-standard and oversize lettermail'],
  'deutsche-post-standard': ['Deutsche Post', 'Standardbrief'],
  'deutsche-post-kompakt': ['Deutsche Post', 'Kompaktbrief'],
  'deutsche-post-gross': ['Deutsche Post', 'Grossbrief'],
  'deutsche-post-maxi': ['Deutsche Post', 'Maxibrief'],
  'upu-letter': ['UPU (Korea Post text)', 'letter, rectangular'],
  'upu-standardized': ['UPU (Korea Post text)', 'standardized letter'],
  'upu-small-letter': ['UPU', 'small letter, format P'],
  'upu-large-letter': ['UPU', 'large letter, format G'],
  'bpost-standard': ['bpost (regulator text)', 'standardised item'],
}

function parseRow(line: string): readonly string[] {
  const cells: string[] = []
  for (const match of line.matchAll(/("([^"]*)"|[^,]*)(,|$)/g)) cells.push(match[2] ?? match[1] ?? '')
  return cells
}

const table = readFileSync(new URL('../../../reference/mail-limits.csv', import.meta.url), 'utf8')
  .trim()
  .split('\n')
const head = parseRow(table[0] ?? '')
const rows = table.slice(1).map((line) => {
  const cells = parseRow(line)
  return new Map(head.map((name, index) => [name, cells[index] ?? '']))
})
type Row = ReadonlyMap<string, string>

/** Limits of a row in millimetres; those first given in inches are taken from the inches. */
function limitsOf(row: Row, what: string): Range {
  const end = (side: 'min' | 'max'): number | null => {
    const inches = row.get(`${side}_${what}_in`) ?? ''
    const millimetres = row.get(`${side}_${what}_mm`) ?? ''
    if (row.get('native_unit') === 'in' && inches !== '') return Number(inches) * 25.4
    return millimetres === '' ? null : Number(millimetres)
  }
  return { min: end('min'), max: end('max') }
}

describe('packs of postal rules', () => {
  it.each(mailPackNames.map((name) => [name] as const))('%s says what its published row says', (name) => {
    const pack = mailPack(name)
    const [operator, itemClass] = rowOf[name]
    const row = rows.find(
      (candidate) => candidate.get('operator') === operator && candidate.get('item_class') === itemClass,
    )
    expect(row).toBeDefined()
    expect(pack).not.toBeNull()
    if (row === undefined || pack === null) return
    const length = limitsOf(row, 'length')
    const width = limitsOf(row, 'height')
    const thickness = limitsOf(row, 'thickness')
    const close = (actual: number | null, wanted: number | null): void => {
      if (wanted === null) expect(actual).toBeNull()
      else expect(actual).toBeCloseTo(wanted, 6)
    }
    close(pack.thickness.min, thickness.min)
    close(pack.thickness.max, thickness.max)
    close(pack.length.max, length.max)
    close(pack.width.max, width.max)
    if (pack.exceeds === null && row.get('confidence') !== 'secondary') {
      close(pack.length.min, length.min)
      close(pack.width.min, width.min)
    } else if (pack.exceeds !== null) {
      // The least sizes of a flat are thresholds, one of which must be exceeded.
      close(pack.exceeds.length, length.min)
      close(pack.exceeds.width, width.min)
    }
    const weight = row.get('max_weight_g') ?? ''
    if (weight !== '') close(pack.weight.max, Number(weight))
    const ratio = row.get('min_aspect_ratio') ?? ''
    if (ratio !== '') close(pack.ratio?.min ?? null, name === 'upu-standardized' ? 1.4 : Number(ratio))
    const most = row.get('max_aspect_ratio') ?? ''
    if (most !== '') close(pack.ratio?.max ?? null, Number(most))
    expect(pack.confidence).toBe(row.get('confidence'))
  })

  it('knows no other names', () => {
    expect(mailPack('usps')).toBeNull()
    expect(mailPack('toString')).toBeNull()
  })
})

const square = (half: number) => (nominal: number, name: string) => dimension(nominal, [source(name, 1, half)])

describe('the ratio of an envelope', () => {
  it('of announcement envelopes is as published', () => {
    const exact = square(0)
    const ratios = [
      [5.125, 3.625, 1.414],
      [5.75, 4.375, 1.314],
      [6.5, 4.75, 1.368],
      [7.25, 5.25, 1.381],
      [8.125, 5.5, 1.477],
      [8.75, 5.75, 1.522],
      [9.5, 6, 1.583],
      [9.5, 4.125, 2.303],
    ] as const
    for (const [length, width, ratio] of ratios)
      expect(ratioOf(exact(length, 'length'), exact(width, 'width')).nominal).toBeCloseTo(ratio, 3)
  })

  it('of an A2 envelope falls below 1.3 at a sixteenth of an inch either way, as published', () => {
    const give = square(1 / 16)
    const ratio = ratioOf(give(5.75, 'length'), give(4.375, 'width'))
    const reach = ratio.sources.reduce((sum, each) => sum + Math.abs(each.coefficient) * each.halfWidth, 0)
    expect(ratio.nominal - reach).toBeLessThan(1.3)
    // Linearised: the published 1.282 is the exact figure of that corner.
    expect(ratio.nominal - reach).toBeCloseTo(5.6875 / 4.4375, 2)
  })
})

const posted = (mail: string, folded: string, outside: string, caliper: string): string => `foldgauge: 1
set: posted
units: in
mail: ${mail}
stocks:
  cover: { weight: 80 lb cover, caliper: ${caliper} }
pieces:
  card: { kind: card, stock: cover, folded: ${folded}, fold: none }
  envelope: { kind: bought, outside: ${outside}, thickness: 1 pt }
fits:
  card-in-envelope: { put: card, in: envelope }
`

const statusOf = (text: string, rule: string): string | undefined =>
  checkTemplate(text, emptyWorkspace(), { file: 'posted.yaml', asOf: '2026-12-01' }).verdicts.find(
    (verdict) => verdict.rule === rule,
  )?.status

describe('published cases of postal rules', () => {
  it('warns of a 6 x 6 in envelope, whose ratio is 1', () => {
    expect(statusOf(posted('usps-letter', '5 3/4 x 5 3/4', '6 x 6', '11 pt'), 'mail/ratio')).toBe('warn')
    expect(statusOf(posted('usps-letter', 'us-a2-card', 'us-a2-envelope', '11 pt'), 'mail/ratio')).toBe('pass')
  })

  it('warns of an envelope shorter than five inches and passes one that is longer', () => {
    expect(statusOf(posted('usps-letter', '3 3/4 x 3 3/4', '4 x 4', '11 pt'), 'mail/size')).toBe('warn')
    expect(statusOf(posted('usps-letter', 'us-a7-card', 'us-a7-envelope', '11 pt'), 'mail/size')).toBe('pass')
  })

  const postcard = (mail: string, folded: string, caliper: string): string => `foldgauge: 1
set: postcard
units: in
mail: ${mail}
stocks:
  cover: { weight: 80 lb cover, caliper: ${caliper} +- 2 % }
pieces:
  card: { kind: card, stock: cover, folded: ${folded}, fold: none }
`

  it('takes a 4 1/4 x 6 in card of 0.0075 in at the card price, and asks 0.009 in of a 6 x 9 in one', () => {
    expect(statusOf(postcard('usps-postcard', '4 1/8 x 5 7/8', '0.0075 in'), 'mail/thickness')).toBe('pass')
    expect(statusOf(postcard('usps-postcard-large', '5 7/8 x 8 7/8', '0.0075 in'), 'mail/thickness')).toBe('warn')
    expect(statusOf(postcard('usps-postcard-large', '5 7/8 x 8 7/8', '0.0095 in'), 'mail/thickness')).toBe('pass')
  })

  it('says unchecked where a set asks for postal rules and posts nothing', () => {
    expect(statusOf(postcard('royal-mail-letter', '4 x 6', '11 pt'), 'mail/size')).toBe('unchecked')
  })
})
