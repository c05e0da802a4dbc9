import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { planSteps } from '../../../shared/exporters/steps/plan-steps.ts'
import type { Step } from '../../../shared/exporters/steps/step.ts'
import { exportSteps } from '../../../shared/exporters/export-steps.ts'
import { writeStepsText } from '../../../shared/exporters/steps/write-steps.ts'
import type { ExportSet } from '../../../shared/exporters/export-set.ts'
import { areaOf, perimeterOf } from '../../../shared/geometry/area.ts'
import { boundsOf } from '../../../shared/geometry/bounds.ts'
import { coveredArea, differenceOf } from '../../../shared/geometry/combine.ts'
import { distanceToSegment } from '../../../shared/geometry/contains-point.ts'
import type { Polygon, Segment } from '../../../shared/geometry/shapes.ts'
import { movePolygon, moveSegment, rotation, translation } from '../../../shared/geometry/transform.ts'
import type { Blank } from '../../../shared/pieces/blank.ts'
import type { Fit } from '../../../shared/template/template-model.ts'
import { anExportSet } from '../../support/export-sets.ts'
import { aBand, aBaronial, aBox, aCard, anInsert, aSleeve } from '../../support/given-pieces.ts'
import { carryOut, type MadeSheet } from '../../support/steps-interpreter.ts'
import { validPiece } from '../../support/valid-pieces.ts'

/** A blank laid as the sheet that was cut for it: the turn at which its bounds are that sheet. */
function laid(blank: Blank, made: MadeSheet): { readonly outline: Polygon; readonly scores: readonly Segment[] } {
  for (const turn of [0, -45]) {
    const outline = movePolygon(blank.outline, rotation(turn))
    const { left, bottom, right, top } = boundsOf(outline)
    if (Math.abs(right - left - made.size.length) > 0.06 || Math.abs(top - bottom - made.size.width) > 0.06) continue
    const move = translation(-left, -bottom)
    return {
      outline: movePolygon(outline, move),
      scores: blank.scores.map((line) => moveSegment(moveSegment(line, rotation(turn)), move)),
    }
  }
  throw new Error(
    `${blank.name} is cut ${String(made.size.length)} × ${String(made.size.width)}, which is not its size`,
  )
}

/** Area in one outline and not in the other. */
const unlike = (a: Polygon, b: Polygon): number => coveredArea(differenceOf(a, [b])) + coveredArea(differenceOf(b, [a]))

function expectSamePiece(set: ExportSet, steps: readonly Step[]): void {
  const made = carryOut(steps)
  for (const { blank, copies } of set.pieces.flatMap((piece) => piece.sheets)) {
    const sheet = made.get(blank.name)
    if (sheet === undefined) throw new Error(`${blank.name} is never cut`)
    expect(sheet.copies).toBe(copies)
    const design = laid(blank, sheet)
    // Measures are given to a tenth of a millimetre, so every edge may lie that far off.
    expect(unlike(sheet.outline, design.outline), blank.name).toBeLessThan(0.12 * perimeterOf(design.outline))
    for (const line of design.scores) {
      for (const end of [line.from, line.to, { x: (line.from.x + line.to.x) / 2, y: (line.from.y + line.to.y) / 2 }]) {
        const nearest = Math.min(...sheet.scores.map((score) => distanceToSegment(end, score)))
        expect(nearest, `${blank.name}: score at ${end.x.toFixed(2)}, ${end.y.toFixed(2)}`).toBeLessThan(0.25)
      }
    }
  }
}

const fit = (more: Partial<Fit> & Pick<Fit, 'id' | 'put' | 'relation' | 'to'>): Fit => ({
  isStack: false,
  stands: null,
  count: 1,
  holding: null,
  turn: null,
  clearance: null,
  workmanship: null,
  papers: [],
  ...more,
})

const family = (): ExportSet => {
  const lid = aBox({
    name: 'lid',
    kind: 'lid',
    by: { given: 'blank', blank: { length: 191, width: 149 }, wall: { length: [14, 14], width: [14, 14] } },
  })
  return anExportSet(
    [
      aCard({ name: 'card' }),
      aBaronial({ name: 'envelope', pocket: { length: 156, width: 112 } }),
      aBox({ name: 'base' }),
      lid,
      aBand({ name: 'band' }),
    ],
    {
      lids: [{ base: 'base', lid: 'lid' }],
      fits: [
        fit({ id: 'card-in-envelope', put: [{ count: 1, piece: 'card' }], relation: 'in', to: 'envelope' }),
        fit({
          id: 'pack-in-base',
          put: [{ count: 1, piece: 'envelope' }],
          count: 6,
          holding: 'card',
          relation: 'in',
          to: 'base',
        }),
        fit({ id: 'lid-on-base', put: [{ count: 1, piece: 'lid' }], relation: 'over', to: 'base' }),
        fit({ id: 'band-on-box', put: [{ count: 1, piece: 'band' }], relation: 'around', to: 'lid' }),
      ],
    },
  )
}

describe('steps carried out with paper and ruler', () => {
  it('give back every piece of a set', () => {
    const set = family()
    expectSamePiece(set, planSteps(set))
  })

  it('give back every valid piece of every kind', () => {
    fc.assert(
      fc.property(validPiece, (given) => {
        const set = anExportSet([given])
        expectSamePiece(set, planSteps(set))
      }),
      { numRuns: 150 },
    )
  })

  it('add up exactly where a design lies on marks: walls and what is between them make the sheet', () => {
    const set = anExportSet([
      aBox({
        name: 'base',
        by: { given: 'blank', blank: { length: 200, width: 158 }, wall: { length: [22, 20], width: [18, 20] } },
      }),
    ])
    const made = carryOut(planSteps(set)).get('base')
    if (made === undefined) throw new Error('no base')
    const xs = made.scores.filter((line) => line.from.x === line.to.x).map((line) => line.from.x)
    const ys = made.scores.filter((line) => line.from.y === line.to.y).map((line) => line.from.y)
    expect([...new Set(xs)].sort((a, b) => a - b)).toEqual([22, 180])
    expect([...new Set(ys)].sort((a, b) => a - b)).toEqual([18, 138])
    expect(22 + (180 - 22) + 20).toBe(made.size.length)
    expect(areaOf(made.outline)).toBeCloseTo(areaOf(set.pieces[0]?.sheets[0]?.blank.outline ?? []), 6)
  })

  it('say in words every measure they act on', () => {
    const set = family()
    for (const one of planSteps(set)) {
      const words = one.sentences.join(' ')
      for (const action of one.actions) {
        if (action.do === 'cut-sheet') expect(words).toContain(`${String(action.length)} × ${String(action.width)} mm`)
        if (action.do === 'score') expect(words).toContain(`Fence at ${String(action.distance)} mm`)
        if (action.do === 'score-corner') expect(words).toContain(`${String(action.along)} mm`)
        if (action.do === 'trim-tabs') expect(words).toContain(`Trim ${String(action.trim)} mm`)
      }
    }
  })
})

describe('the order of steps', () => {
  const titles = (): readonly string[] => planSteps(family()).map((one) => one.title)

  it('begins with the bars and stops there', () => {
    const [first] = planSteps(family())
    expect(first?.title).toBe('Print one page and measure its bars')
    expect(first?.isStop).toBe(true)
  })

  it('saves paper: cut, score, fold, cut out, try, glue, measure, then the lid and what goes round', () => {
    const order = [
      'Choose the papers',
      'Cut base',
      'Score base',
      'Fold base',
      'Cut out base',
      'Try card in envelope before gluing',
      'Glue envelope',
      'Glue base',
      'Measure the outside of base',
      'Cut lid',
      'Score lid',
      'Glue lid',
      'Fill',
      'Close',
      'Cut band',
      'Wrap band',
    ]
    const at = order.map((title) => titles().indexOf(title))
    expect(
      at.every((place) => place >= 0),
      JSON.stringify(at),
    ).toBe(true)
    expect(at).toEqual([...at].sort((a, b) => a - b))
  })

  it('cuts the largest sheet first', () => {
    const cuts = titles().filter((title) => /^Cut (?!out)/.test(title))
    expect(cuts.slice(0, 3)).toEqual(['Cut envelope', 'Cut base', 'Cut card'])
  })

  it('says which face is up and which edge is against the fence wherever something is scored', () => {
    for (const one of planSteps(family()).filter((step) => step.title.startsWith('Score'))) {
      const words = one.sentences.join(' ')
      expect(words).toContain('inside up')
      expect(words).toMatch(/against the fence|ruler from mark to mark/)
    }
  })
})

describe('the table for the lid', () => {
  it('grows the lid by as much as the base came out larger, mark by mark', () => {
    const table = planSteps(family()).find((one) => one.title.startsWith('Measure'))?.table
    const rows = table?.rows ?? []
    expect(rows).toHaveLength(9)
    const column = (index: number): readonly number[] => rows.map((row) => Number.parseFloat(row[index] ?? ''))
    for (const [measured, cut] of [
      [column(0), column(1)],
      [column(2), column(3)],
    ] as const) {
      measured.slice(1).forEach((value, index) => {
        expect(value - (measured[index] ?? 0)).toBeCloseTo(1, 9)
        expect((cut[index + 1] ?? 0) - (cut[index] ?? 0)).toBeCloseTo(1, 9)
      })
    }
    // Base outside: 160 + 0.3 along the length (no tabs). Measured 160, it is 0.3 smaller; the next mark keeps the lid from binding.
    expect(rows[4]?.slice(0, 2)).toEqual(['160', '191 mm'])
  })
})

describe('own sentences of a set', () => {
  it('take the place of the generated steps, their measures filled in, the bars kept in front', () => {
    const set = anExportSet([aBox({ name: 'base' })], {
      steps: ['Cut the base to {base.blank}.', 'Score {base.wall} in, and leave {base.nothing}.'],
    })
    const steps = planSteps(set)
    expect(steps).toHaveLength(3)
    expect(steps[1]?.sentences).toEqual(['Cut the base to 200 × 158 mm.'])
    expect(steps[2]?.sentences).toEqual(['Score 20 mm in, and leave {base.nothing}.'])
  })
})

describe('the written forms', () => {
  it('say the same in plain text, Markdown and a page, with the cautions', () => {
    const set = family()
    const [html, markdown, text] = exportSteps(set, planSteps(set), false).map((file) => String(file.content))
    for (const form of [html, markdown, text]) {
      expect(form).toContain('Fence at 20 mm')
      expect(form).toContain('Cut on a mat')
      expect(form).toContain('Keep ribbon')
      expect(form).toContain('Measure the outside of base')
    }
    expect(html).toContain('<svg')
    expect(html).not.toContain('src=')
    expect(html).not.toMatch(/https?:\/\/(?!www\.w3\.org\/2000\/svg)/)
  })

  it('escape titles that would be markup', () => {
    const set = anExportSet([anInsert({ name: 'divider' })], {
      title: '<img src=x onerror=alert(1)> & "quotes" *stars*',
    })
    const [html, markdown] = exportSteps(set, planSteps(set), true).map((file) => String(file.content))
    expect(html).not.toContain('<img')
    expect(markdown).toContain('\\*stars\\*')
  })

  it('give inches as fractions that are the marks of a ruler', () => {
    const inch = 25.4
    const box = aBox({
      name: 'base',
      by: {
        given: 'blank',
        blank: { length: 7.875 * inch, width: 6.25 * inch },
        wall: { length: [0.75 * inch, 0.75 * inch], width: [0.75 * inch, 0.75 * inch] },
      },
    })
    const set = anExportSet([box, aSleeve({ name: 'sleeve' })], { units: 'in' })
    const text = writeStepsText(set, planSteps(set))
    expect(text).toContain('7 7/8 × 6 1/4 in')
    expect(text).toContain('Fence at 3/4 in')
  })
})
