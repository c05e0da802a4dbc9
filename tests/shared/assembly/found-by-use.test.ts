import { describe, expect, it } from 'vitest'
import { checkTemplate } from '../../../shared/check-template.ts'
import { emptyWorkspace } from '../../../shared/template/read-workspace.ts'
import { boxedNotes } from '../../support/boxed-notes.ts'
import { checkText, fitOf } from '../../support/check-text.ts'

const set = (pieces: string, fits: string): string => `foldgauge: 1
set: trial
title: Trial
stocks: { cover: { grammage: 270 gsm, caliper: 0.32 mm } }
pieces:
${pieces}
fits:
${fits}
`

describe('what an author may write without meaning harm', () => {
  it('a clearance without a lower end still asks that the thing goes in', () => {
    const text = boxedNotes({ pocket: '140 x 112' }).replace(
      '{ put: card, in: envelope }',
      '{ put: card, in: envelope, clearance: ..3 mm }',
    )
    expect(fitOf(checkText(text), 'card-in-envelope').verdict).toBe('fail')
  })

  it('a gate names both its folds, and its middle lies between them', () => {
    const report = checkText(
      set(
        '  card: { kind: card, stock: cover, folded: 148 x 91 mm, fold: long-edge, style: gate, panels: 3 }\n  envelope: { kind: bought, outside: 162 x 114 mm, thickness: 0.1 mm }',
        '  in: { put: card, in: envelope }',
      ),
    )
    const measures = report.pieces['card']?.['measures'] as readonly { what: string; nominal: number }[]
    expect(measures.filter(({ what }) => what.startsWith('fold')).map(({ nominal }) => nominal)).toEqual([45.5, 136.5])
    expect(
      report.verdicts.find((verdict) => verdict.rule === 'ruler/off-grid' && verdict.subject === 'card')?.status,
    ).toBe('warn')
  })

  it('only a lid goes over a piece', () => {
    const text = set(
      '  card: { kind: card, stock: cover, folded: 148 x 105 mm, fold: long-edge }\n  envelope: { kind: bought, outside: 162 x 114 mm, thickness: 0.1 mm }',
      '  over: { put: envelope, over: card }',
    )
    const report = checkTemplate(text, emptyWorkspace(), { file: 'set.yaml', asOf: '2026-12-01' })
    expect(report.summary.verdict).toBe('invalid')
    expect(report.errors[0]?.message).toContain('only a lid')
  })
})
