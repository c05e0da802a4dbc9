import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { checkTemplate } from '../../../shared/check-template.ts'
import type { AxisReport, Report } from '../../../shared/report/report.ts'
import { leastSquare } from '../../../shared/sizing/size-envelope.ts'
import { sizeSet } from '../../../shared/sizing/size-set.ts'
import type { Sizing } from '../../../shared/sizing/sizing.ts'
import { replaceValueAt, valueTextAt } from '../../../shared/template/edit-text.ts'
import { emptyWorkspace } from '../../../shared/template/read-workspace.ts'
import { isOnGrid } from '../../../shared/units/grid.ts'

const options = { file: 'set.yaml', asOf: '2026-12-01' }
const size = (text: string): Sizing => sizeSet(text, emptyWorkspace(), options)

const openSet = (card: string, count: number, more = ''): string => `foldgauge: 1
set: open
title: Everything but the card is open
sheet: 900 x 600 mm
${more}
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm ± 6 % }   # measured
  text: { grammage: 120 gsm, caliper: 0.15 mm }
pieces:
  card: { kind: card, stock: cover, folded: ${card}, fold: long-edge }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: fit, seam: 12 mm }   # keep this comment
  base:
    kind: box
    stock: cover
    blank: fit
    wall: fit      # and this one
  lid: { kind: lid, stock: cover, inside: fit, thumb-notch: true }
  band: { kind: band, stock: text, around: lid, width: 40 mm, overlap: 20 mm }
fits:
  card-in-envelope: { put: card, in: envelope }
  pack-in-base: { put: envelope, holding: card, count: ${String(count)}, in: base }
  lid-on-base: { put: lid, over: base }
  band-on-box: { put: band, around: lid }
`

const done = (sizing: Sizing): { text: string; report: Report } => {
  if (sizing.text === null || sizing.report === null)
    throw new Error(sizing.infeasible?.message ?? sizing.problems[0]?.message ?? 'not sized')
  return { text: sizing.text, report: sizing.report }
}

const sized: readonly string[] = ['card-in-envelope', 'pack-in-base', 'lid-on-base']
const lowerLimits = (report: Report): readonly AxisReport[] =>
  report.fits.filter((fit) => sized.includes(fit.id)).flatMap((fit) => fit.axes)
const keepsAll = (report: Report): boolean => lowerLimits(report).every((axis) => 1 - axis.binds >= report.target)

describe('sizing a whole chain from one card', () => {
  const cards = fc.tuple(
    fc.integer({ min: 60, max: 240 }),
    fc.integer({ min: 50, max: 180 }),
    fc.integer({ min: 2, max: 20 }),
  )

  it('always passes its check, for any card and count', () => {
    fc.assert(
      fc.property(cards, ([length, width, count]) => {
        const { report } = done(size(openSet(`${String(length)} x ${String(Math.min(length, width))} mm`, count)))
        expect(report.errors).toEqual([])
        expect(keepsAll(report)).toBe(true)
        expect(report.verdicts.filter((verdict) => verdict.status === 'fail')).toEqual([])
      }),
      { numRuns: 10 },
    )
  })

  it('puts every measure a maker sets on a ruler mark', () => {
    for (const [more, cut, score] of [
      ['ruler: 1 mm', 1, 1],
      ['ruler: 0.5 mm', 0.5, 0.5],
      ['units: in\nruler: { cut: 1/16, score: 1/8 }', 25.4 / 16, 25.4 / 8],
    ] as const) {
      const { report } = done(size(openSet('148 x 105 mm', 6, more)))
      for (const name of ['envelope', 'base', 'lid']) {
        for (const { what, nominal, grid } of report.pieces[name]?.['measures'] as readonly {
          what: string
          nominal: number
          grid: 'cut' | 'score'
        }[]) {
          expect(isOnGrid(nominal, grid === 'cut' ? cut : score), `${name} ${what} ${String(nominal)}`).toBe(true)
        }
      }
    }
  })

  it('leaves nothing smaller on the ruler that would do: every smaller neighbour breaks a lower limit', () => {
    const { text, report } = done(size(openSet('148 x 105 mm', 6)))
    expect(keepsAll(report)).toBe(true)
    const smaller = (path: readonly string[], change: (value: string) => string): boolean => {
      const value = valueTextAt(text, path) ?? ''
      const changed = replaceValueAt(text, path, change(value)) ?? ''
      return keepsAll(checkTemplate(changed, emptyWorkspace(), options))
    }
    const lessFirst = (value: string): string => value.replace(/^\d+/, (number) => String(Number(number) - 1))
    const lessSecond = (value: string): string =>
      value.replace(/x (\d+)/, (_all, number: string) => `x ${String(Number(number) - 1)}`)
    for (const piece of ['base', 'lid']) {
      expect(smaller(['pieces', piece, 'blank'], lessFirst), `${piece} shorter`).toBe(false)
      expect(smaller(['pieces', piece, 'blank'], lessSecond), `${piece} narrower`).toBe(false)
    }
    // A shallower base is both lower and wider; the headspace is what it breaks.
    expect(smaller(['pieces', 'base', 'wall'], lessFirst), 'base shallower').toBe(false)
    // A smaller square with the same corners makes the pocket too small.
    expect(
      smaller(['pieces', 'envelope', 'blank'], (value) =>
        value.replaceAll(/\d+/g, (number) => String(Number(number) - 1)),
      ),
    ).toBe(false)
  })

  it('writes sizes in place and keeps comments and layout', () => {
    const before = openSet('148 x 105 mm', 6)
    const { text } = done(size(before))
    expect(text).toContain('# keep this comment')
    expect(text).toContain('# and this one')
    expect(text).not.toMatch(/: fit\b/)
    const changed = text.split('\n').filter((line) => !before.split('\n').includes(line))
    expect(changed.every((line) => /envelope:|blank:|wall:|lid:/.test(line))).toBe(true)
    // Sizing what is sized changes nothing.
    expect(size(text).text).toBe(text)
  })

  it('names what limits each size', () => {
    const { chosen } = size(openSet('148 x 105 mm', 6))
    expect(chosen.find((choice) => choice.piece === 'base' && choice.what === 'wall')?.limitedBy).toContain('headspace')
    expect(chosen.find((choice) => choice.piece === 'lid' && choice.what === 'blank length')?.limitedBy).toContain(
      'lid-on-base',
    )
    for (const choice of chosen) expect(choice.limitedBy).not.toBe('')
  })

  it('offers tabs turned and other rulers', () => {
    const { alternatives } = size(openSet('148 x 105 mm', 6))
    expect(alternatives.map((alternative) => alternative.title)).toContain('tabs of lid turned')
    expect(alternatives.filter((alternative) => alternative.title.startsWith('inches')).length).toBe(3)
  })

  it('says what to give where nothing tells a size', () => {
    const lonely = `foldgauge: 1
set: lonely
title: A box for nothing
stocks: { cover: { grammage: 270 gsm, caliper: 0.3 mm } }
pieces:
  base: { kind: box, stock: cover, blank: fit, wall: fit }
`
    const { infeasible } = size(lonely)
    expect(infeasible?.piece).toBe('base')
    expect(infeasible?.nearest).toContain('give')
  })

  it('says which requirement breaks where a strict upper limit leaves no size', () => {
    const tight = openSet('148 x 105 mm', 6).replace(
      '{ put: lid, over: base }',
      '{ put: lid, over: base, clearance: { sides: 0.5..0.6 mm, strict: true } }',
    )
    const { infeasible } = size(tight)
    expect(infeasible?.requirement).toContain('lid-on-base')
    expect(infeasible?.nearest).not.toBeNull()
  })
})

describe('the least square of a baronial envelope', () => {
  it('keeps pocket and seams on any ruler, and no smaller square does', () => {
    const grids = fc.constantFrom({ cut: 1, score: 1 }, { cut: 0.5, score: 0.5 }, { cut: 25.4 / 16, score: 25.4 / 8 })
    const sizes = fc.tuple(
      fc.double({ min: 60, max: 250, noNaN: true }),
      fc.double({ min: 50, max: 180, noNaN: true }),
      fc.integer({ min: 6, max: 20 }),
      fc.integer({ min: 4, max: 20 }),
    )
    fc.assert(
      fc.property(sizes, grids, ([along, across, bottom, top], grid) => {
        const pocket = { along, across: Math.min(along, across) }
        const found = leastSquare(pocket, { bottom, top }, grid)
        expect(Math.SQRT2 * (found.square - found.sides)).toBeGreaterThanOrEqual(pocket.along - 1e-6)
        expect((2 * found.square - found.bottom - found.flap) / Math.SQRT2).toBeGreaterThanOrEqual(pocket.across - 1e-6)
        expect(found.sides + found.bottom - found.square).toBeGreaterThanOrEqual(bottom - 1e-6)
        expect(found.sides + found.flap - found.square).toBeGreaterThanOrEqual(top - 1e-6)
        // One cutting mark less: even the largest side corners leave no room for both ends.
        const square = found.square - grid.cut
        const sides = Math.floor((square - pocket.along * Math.SQRT1_2) / grid.score + 1e-9) * grid.score
        const ends =
          Math.ceil((square + bottom - sides) / grid.score - 1e-9) * grid.score +
          Math.ceil((square + top - sides) / grid.score - 1e-9) * grid.score
        expect(ends).toBeGreaterThan(2 * square - Math.SQRT2 * pocket.across - 1e-6)
      }),
    )
  })
})
