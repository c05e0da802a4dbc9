import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { AxisReport, FitReport, Report } from '../../../shared/report/report.ts'
import { boxedNotes } from '../../support/boxed-notes.ts'
import { checkText, fitOf } from '../../support/check-text.ts'
import { seededRandom } from '../../support/random.ts'

const axisOf = (fit: FitReport, name: AxisReport['axis']): AxisReport => {
  const axis = fit.axes.find((candidate) => candidate.axis === name)
  if (axis === undefined) throw new Error(`${fit.id} has no ${name}`)
  return axis
}

const set = (pieces: string, fits: string, more = ''): string => `foldgauge: 1
set: trial
title: Trial
sheet: 900 x 600 mm
${more}
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm ± 6 % }
  board: { grammage: 350 gsm, caliper: 0.42 mm ± 5 % }
  text: { grammage: 120 gsm, caliper: 0.15 mm ± 10 % }
pieces:
${pieces}
fits:
${fits}
`

const tray = (name: string, kind: 'box' | 'lid', size: string, wall: number, more = ''): string =>
  `  ${name}: { kind: ${kind}, stock: cover, blank: ${size}, wall: ${String(wall)}${more} }`

describe('the model, from text to verdict', () => {
  const report = checkText(boxedNotes())

  it('holds a lid at the taller of base and lid depth, and tells how much of the base shows', () => {
    // Derived: base height d + t/2, lid depth d − t/2.
    const { seat } = fitOf(report, 'lid-on-base')
    expect(seat?.z).toBeCloseTo(20.16, 9)
    expect(seat?.exposed).toBeCloseTo(20.16 - 13.84, 9)
  })

  it('counts the layers a baronial envelope has, at the least, on average and at most', () => {
    expect(report.pieces['envelope']?.['layers']).toEqual({ min: 2, mean: expect.closeTo(2.3157, 4) as number, max: 4 })
    expect(report.pieces['envelope']?.['square']).toBeCloseTo(201.5046, 4)
  })

  it('lets the hinge and the fence cancel between lid and base of one paper and one pair of hands', () => {
    const sources = axisOf(fitOf(report, 'lid-on-base'), 'length').sources.map((source) => source.name)
    expect(sources.some((name) => name.startsWith('hinge90') || name.startsWith('fence'))).toBe(false)
    expect(sources).toContain('caliper(cover)')
  })

  it('raises what a pocket needs by what is stuck on the card, less where a rim stays flat', () => {
    const width = (more: string): number =>
      axisOf(
        fitOf(
          checkText(
            set(
              `  card: { kind: card, stock: cover, folded: 148 x 105, fold: long-edge${more} }\n  envelope: { kind: envelope, style: square-flap, stock: text, pocket: 160 x 115 }`,
              '  in: { put: card, in: envelope }',
            ),
          ),
          'in',
        ),
        'width',
      ).clearance.nominal
    const flat = width('')
    // √(3² + 10²) − 10 inside a rim of ten millimetres; the whole height at the edge.
    expect(flat - width(', raised: 3 mm')).toBeCloseTo(Math.hypot(3, 10) - 10, 9)
    expect(flat - width(', raised: 3 mm, raised-to-edge: true')).toBeCloseTo(3, 9)
  })

  it('adds the errors of a pack, which are one chance for all its envelopes', () => {
    const sigma = (count: number): number => {
      const text = boxedNotes({ count, baseWall: 40, base: '240 x 198' })
      const headspace = axisOf(fitOf(checkText(text), 'lid-on-base'), 'headspace').clearance
      const loft = headspace.sources.find((source) => source.name === 'loft(pack-in-base)')
      return Math.abs(loft?.effect ?? 0)
    }
    expect(sigma(12)).toBeCloseTo(2 * sigma(6), 9)
  })

  it('binds a lid that its contents hold up', () => {
    const high = checkText(boxedNotes({ count: 12 }))
    const fit = fitOf(high, 'lid-on-base')
    expect(axisOf(fit, 'headspace').clearance.nominal).toBeLessThan(0)
    expect(fit.verdict).toBe('fail')
    // The band goes round the lid where it really rests.
    expect(axisOf(fitOf(high, 'band-on-box'), 'overlap').clearance.nominal).toBeGreaterThan(9)
  })

  it('judges the depth of a box that has no lid', () => {
    const text = set(
      `  card: { kind: insert, stock: cover, size: 148 x 105 }\n${tray('base', 'box', '174 x 131', 10)}`,
      '  pack: { put: card, count: 20, in: base }',
    )
    expect(axisOf(fitOf(checkText(text), 'pack'), 'depth').clearance.nominal).toBeCloseTo(
      10 - 0.16 - 20 * 0.32 * 1.03,
      9,
    )
  })

  it('turns a thing where that binds less, and says so', () => {
    const text = (turn: string): string =>
      set(
        `  photo: { kind: bought, outside: 150 x 100 mm ± 0.2 mm, thickness: 0.3 mm }\n  sleeve: { kind: bought, inside: 152.5 x 152.5 mm ± 0.2 mm, thickness: 0.1 mm }\n  frame: { kind: bought, inside: 103 x 153 mm ± 0.2 mm, thickness: 0.1 mm }`,
        `  in-square: { put: photo, in: sleeve${turn} }\n  in-frame: { put: photo, in: frame${turn} }`,
      )
    const free = checkText(text(''))
    expect(fitOf(free, 'in-square').turned).toBe(false)
    expect(fitOf(free, 'in-frame').verdict).toBe('pass')
    expect(fitOf(checkText(text(', turn: quarter')), 'in-frame').verdict).toBe('fail')
    expect(fitOf(checkText(text(', turn: quarter')), 'in-frame').turned).toBe(true)
  })

  it('calls a pack a little too long snug where it can bow, and not where it cannot', () => {
    // A quarter of a millimetre longer between scores than its box: common practice calls it snug.
    const pack = (wall: number, width: number): FitReport =>
      fitOf(
        checkText(
          set(
            `  envelope: { kind: envelope, style: square-flap, stock: text, pocket: 150 x 105 }\n${tray('base', 'box', `${String(149.75 + 2 * wall)} x ${String(width + 2 * wall)}`, wall)}`,
            '  pack: { put: envelope, count: 8, in: base }',
          ),
        ),
        'pack',
      )
    const snug = pack(30, 112)
    expect(snug.verdict).toBe('warn')
    expect(snug.give?.name).toBe('snug')
    expect(snug.give?.bow).toBeGreaterThan(1)
    expect(pack(30, 104).verdict, 'bound both ways it cannot bow').toBe('fail')
    const high = pack(6, 112)
    expect(high.give, 'without headroom it cannot bow').toBeNull()
  })

  it('lets a lid be pushed on a little too tight, and no more', () => {
    const lid = (larger: number): FitReport =>
      fitOf(
        checkText(
          set(
            `${tray('base', 'box', '200 x 160', 20)}\n${tray('lid', 'lid', `${String(180 + larger)} x ${String(140 + larger)}`, 10, ', thumb-notch: true')}`,
            '  over: { put: lid, over: base }',
          ),
        ),
        'over',
      )
    expect([lid(3), lid(1.5), lid(0.5)].map((fit) => fit.verdict)).toEqual(['pass', 'warn', 'fail'])
    expect(lid(1.5).give?.name).toBe('push-on')
    expect(lid(1.5).give?.goesTo).toBe(-0.6)
  })

  it('lets rattling fail only where the clearance is strict', () => {
    const loose = (strict: string): string =>
      fitOf(
        checkText(
          set(
            `${tray('base', 'box', '200 x 160', 20)}\n${tray('lid', 'lid', '190 x 150', 10)}`,
            `  over: { put: lid, over: base, clearance: { sides: 0..1 mm${strict} } }`,
          ),
        ),
        'over',
      ).verdict
    expect(loose('')).toBe('warn')
    expect(loose(', strict: true')).toBe('fail')
  })

  it('spans a divider across the side it was cut for', () => {
    const text = set(
      `  wall: { kind: divider, stock: cover, size: 118 x 18 }\n${tray('base', 'box', '200 x 160', 20)}`,
      '  in: { put: wall, in: base }',
    )
    expect(fitOf(checkText(text), 'in').axes.map((axis) => axis.axis)).toEqual(['width', 'depth'])
  })

  it('judges a sleeve on both axes it wraps, its lap counted in the height', () => {
    const text = set(
      `${tray('base', 'box', '200 x 160', 20)}\n  sleeve: { kind: sleeve, stock: cover, around: base, width: 80, overlap: 15 }`,
      '  round: { put: sleeve, around: base }',
    )
    const fit = fitOf(checkText(text), 'round')
    expect(fit.axes.map((axis) => axis.axis)).toEqual(['width', 'depth'])
    const panels = checkText(text).pieces['sleeve']?.['panels'] as readonly number[]
    // Height: panel − t at its folds, − t for the lap, less the box's outside height.
    expect(axisOf(fit, 'depth').clearance.nominal).toBeCloseTo((panels[1] ?? 0) - 0.32 - 0.32 - 20.16, 9)
  })

  it('carries a closed box into a bag', () => {
    const text = set(
      `${tray('base', 'box', '200 x 160', 20)}\n${tray('lid', 'lid', '190 x 150', 14)}\n  bag: { kind: bag, stock: text, inside: 175 x 30 x 160 mm }`,
      '  over: { put: lid, over: base }\n  carried: { put: lid, in: bag }',
    )
    const fit = fitOf(checkText(text), 'carried')
    expect(fit.axes.map((axis) => axis.axis)).toEqual(['width', 'depth'])
    expect(axisOf(fit, 'depth').clearance.nominal).toBeCloseTo(30 - (20.16 + 0.32), 6)
  })

  it('leaves a ribbon enough for its bow', () => {
    const text = (length: number): string =>
      set(
        `${tray('base', 'box', '200 x 160', 20)}\n  ribbon: { kind: band, ribbon: true, around: base, width: 10, length: ${String(length)} }`,
        '  tied: { put: ribbon, around: base }',
      )
    const girth = 2 * (120.64 + 20.16)
    expect(axisOf(fitOf(checkText(text(800)), 'tied'), 'overlap').clearance.nominal).toBeCloseTo(800 - girth, 6)
    expect(fitOf(checkText(text(800)), 'tied').verdict).toBe('pass')
    expect(fitOf(checkText(text(700)), 'tied').verdict).toBe('warn')
  })

  it('judges a fit in further papers', () => {
    const text = boxedNotes().replace('clearance: slip-lid }', 'clearance: slip-lid, paper: [text] }')
    expect(fitOf(checkText(text), 'lid-on-base').papers.map((paper) => paper.stock)).toEqual(['text'])
  })

  it('says between which print scales pieces for the outside world hold, and that printed pairs hardly care', () => {
    const printed = checkText(boxedNotes({ made: 'printed' }), { scales: true })
    const lid = fitOf(printed, 'lid-on-base').scale
    const pack = fitOf(printed, 'pack-in-base').scale
    expect(lid?.min).toBe(0.9)
    // A pack that does not shrink with its box: the box may shrink by what the pack has to spare, and no more.
    expect(pack?.min).toBeGreaterThan(0.97)
    expect(pack?.min).toBeLessThan(1)
    const at = (scale: number): string =>
      fitOf(checkText(boxedNotes({ made: 'printed' }), { scale }), 'pack-in-base').verdict
    expect(at((pack?.min ?? 1) + 0.001)).not.toBe('fail')
    expect(at((pack?.min ?? 1) - 0.004)).toBe('fail')
  })
})

describe('invariants of judging', () => {
  const reports = [
    boxedNotes(),
    boxedNotes({ lidWall: 15 }),
    boxedNotes({ made: 'printed' }),
    boxedNotes({ caliper: 0.4, count: 9 }),
  ].map((text) => checkText(text))
  const axes = reports.flatMap((report) => report.fits.flatMap((fit) => fit.axes))

  it('the worst case contains every draw, and draws bind as often as reckoned', () => {
    const random = seededRandom(3)
    for (const axis of axes) {
      const { clearance, required } = axis
      const draws = 4000
      const values = Array.from({ length: draws }, () =>
        clearance.sources.reduce((sum, source) => sum + source.effect * (2 * random() - 1), clearance.nominal),
      )
      expect(Math.min(...values)).toBeGreaterThanOrEqual(clearance.min - 1e-9)
      expect(Math.max(...values)).toBeLessThanOrEqual(clearance.max + 1e-9)
      const binds = values.filter((value) => required.min !== null && value < required.min).length
      expect(Math.abs(binds / draws - axis.binds)).toBeLessThan(5 * Math.sqrt(0.25 / draws))
    }
  })

  it('asking for more room never makes fewer builds bind', () => {
    const asked = (low: number): Report => checkText(boxedNotes().replace('sides: 0.2..3', `sides: ${String(low)}..3`))
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true }), (a, b) => {
        const [less, more] = [Math.min(a, b), Math.max(a, b)].map(
          (low) => axisOf(fitOf(asked(Number(low.toFixed(3))), 'lid-on-base'), 'width').binds,
        )
        expect(less ?? 0).toBeLessThanOrEqual((more ?? 0) + 1e-9)
      }),
      { numRuns: 8 },
    )
  })

  it('hastier hands never make fewer builds bind below the middle', () => {
    const binds = ['studio', 'home'].map(
      (workmanship) =>
        axisOf(fitOf(checkText(boxedNotes({ lidWall: 14 }), { workmanship }), 'lid-on-base'), 'width').binds,
    )
    expect(binds[0] ?? 1).toBeLessThanOrEqual(binds[1] ?? 0)
  })

  it('every share lies between nought and one and every fit is as bad as its worst axis', () => {
    const order = ['pass', 'warn', 'fail']
    for (const report of reports) {
      expect(report.summary.works).toBeLessThanOrEqual(Math.min(...report.fits.map((fit) => fit.closes)) + 1e-3)
      for (const fit of report.fits) {
        expect(fit.verdict).toBe(order[Math.max(...fit.axes.map((axis) => order.indexOf(axis.verdict)))])
        for (const axis of fit.axes)
          for (const share of [axis.binds, axis.rattles, fit.closes]) expect(share >= 0 && share <= 1).toBe(true)
      }
    }
  })

  it('a waiver holds through its last day and says so the day after', () => {
    const text = `${boxedNotes({ lidWall: 15 })}waivers:\n  - { rule: fit/clearance, subject: lid-on-base, reason: "being redrawn", until: 2026-12-24 }\n`
    const statuses = (asOf: string): readonly string[] =>
      checkText(text, { asOf })
        .verdicts.filter((verdict) => verdict.rule === 'fit/clearance' && verdict.subject === 'lid-on-base:width')
        .map((verdict) => verdict.status)
    expect(statuses('2026-12-24')).toEqual(['waived'])
    expect(statuses('2026-12-25')).toEqual(['fail'])
    expect(
      checkText(text, { asOf: '2026-12-25' }).verdicts.some(
        (verdict) => verdict.rule === 'waiver/lapsed' && verdict.status === 'warn',
      ),
    ).toBe(true)
  })

  it('one crashing rule is reported and the others still are', async () => {
    const { applyRules } = await import('../../../shared/rules/apply-rules.ts')
    const { judgeSet } = await import('../../../shared/assembly/judge-set.ts')
    const { readSet } = await import('../../../shared/template/read-set.ts')
    const { emptyWorkspace } = await import('../../../shared/template/read-workspace.ts')
    const { rules } = await import('../../../shared/rules/rule-registry.ts')
    const { set: read } = readSet(boxedNotes(), 'set.yaml', emptyWorkspace())
    if (read === null) throw new Error('unreadable')
    const judged = judgeSet(read, { file: 'set.yaml', asOf: '2026-12-01' })
    const [first, second] = rules
    if (first === undefined || second === undefined) throw new Error('no rules')
    const broken = {
      ...first,
      judge: () => {
        throw new Error('boom')
      },
    }
    const verdicts = applyRules(judged, [broken, second])
    expect(verdicts[0]?.status).toBe('crashed')
    expect(verdicts.length).toBeGreaterThan(1)
  })
})
