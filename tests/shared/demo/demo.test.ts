import { describe, expect, it } from 'vitest'
import { checkTemplate } from '../../../shared/check-template.ts'
import { reportShape } from '../../../shared/report/report-shape.ts'
import { readWorkspace } from '../../../shared/template/read-workspace.ts'
import { demoSets, demoWorkspace, demoWorkspaceText } from '../../support/demo.ts'
import { seededRandom } from '../../support/random.ts'

const asOf = '2026-12-01'
const workspace = demoWorkspace()
const check = (set: { file: string; text: string }) => checkTemplate(set.text, workspace, { file: set.file, asOf })
const reports = demoSets().map(check)

describe('the demo workspace', () => {
  it('has ten sets in three families, every one passing or waived on purpose', () => {
    expect(reports.length).toBe(10)
    expect(workspace.problems).toEqual([])
    expect(new Set(reports.map((report) => report.family)).size).toBeGreaterThanOrEqual(3)
    for (const report of reports) {
      expect(report.errors, report.set).toEqual([])
      expect(report.summary.verdict, report.set).toBe('pass')
    }
    expect(reports.some((report) => report.units === 'in')).toBe(true)
  })

  it('uses every kind of piece and every relation', () => {
    const kinds = new Set(reports.flatMap((report) => Object.values(report.pieces).map((piece) => piece.kind)))
    expect([...kinds].toSorted()).toEqual([
      'bag',
      'band',
      'bought',
      'box',
      'card',
      'custom',
      'divider',
      'envelope',
      'insert',
      'lid',
      'sleeve',
    ])
    expect(new Set(reports.flatMap((report) => report.fits.map((fit) => fit.relation))).size).toBe(3)
    expect(reports.some((report) => report.verdicts.some((verdict) => verdict.status === 'waived'))).toBe(true)
  })

  it('keeps beside it a copy in which a deepened score makes the lid bind', () => {
    const [failing] = demoSets('failing').map(check)
    expect(failing?.summary.verdict).toBe('fail')
    expect(
      failing?.verdicts.some((verdict) => verdict.status === 'fail' && verdict.subject.startsWith('lid-on-base')),
    ).toBe(true)
  })

  it('gives reports that keep to the published shape, whole through JSON', () => {
    for (const report of [...reports, checkTemplate('pieces: [', workspace, { file: 'x.yaml', asOf })]) {
      const through: unknown = JSON.parse(JSON.stringify(report))
      expect(reportShape.safeParse(through).error?.issues ?? []).toEqual([])
      expect(through).toEqual(report)
    }
  })

  it('gives the same report for the same text', () => {
    for (const set of demoSets()) expect(check(set)).toEqual(check(set))
  })
})

describe('ten thousand random mutations of the demo files', () => {
  const random = seededRandom(20261201)
  const pick = <T>(from: readonly T[]): T => from[Math.floor(random() * from.length)] as T
  const snippets = [
    'fit',
    ',',
    ':',
    '{',
    '}',
    '[',
    ']',
    '\n',
    '  ',
    '- ',
    '"',
    '#',
    '0',
    '-1',
    '1e9',
    '12,5',
    '1/0',
    'null',
    '*a',
    '&a',
    '<<: *a',
    '!!str',
    '%YAML 1.1\n---\n',
    '\t',
    '😀',
    '\u0000',
    '..',
    '±',
    ' x ',
    '999999999',
    'true',
    'lid',
    'base',
    '~',
  ]

  function mutate(text: string): string {
    const at = Math.floor(random() * text.length)
    const to = Math.min(text.length, at + Math.floor(random() * 12))
    switch (Math.floor(random() * 6)) {
      case 0:
        return text.slice(0, at) + text.slice(to)
      case 1:
        return text.slice(0, at) + pick(snippets) + text.slice(at)
      case 2:
        return text.slice(0, at) + pick(snippets) + text.slice(to)
      case 3: {
        const lines = text.split('\n')
        lines.splice(Math.floor(random() * lines.length), 1)
        return lines.join('\n')
      }
      case 4: {
        const lines = text.split('\n')
        lines.splice(Math.floor(random() * lines.length), 0, pick(lines))
        return lines.join('\n')
      }
      default:
        return text.replace(/\d+/g, (number) => (random() < 0.05 ? String(Math.floor(random() * 400)) : number))
    }
  }

  it('end in a report or in problems with their place and remedy, never in an exception', () => {
    const sets = demoSets()
    const tokens = demoWorkspaceText()
    const verdicts: Record<string, number> = {}
    for (let round = 0; round < 10_000; round += 1) {
      const set = pick(sets)
      let text = set.text
      for (let times = 0; times <= Math.floor(random() * 2); times += 1) text = mutate(text)
      const held = round % 20 === 0 ? readWorkspace(mutate(tokens), 'foldgauge.yaml') : workspace
      const report = checkTemplate(text, held, { file: set.file, asOf })
      verdicts[report.summary.verdict] = (verdicts[report.summary.verdict] ?? 0) + 1
      if (report.summary.crashed > 0)
        throw new Error(`${report.verdicts.find((verdict) => verdict.status === 'crashed')?.message ?? ''}\n${text}`)
      for (const problem of report.errors) {
        expect(problem.message).not.toBe('')
        expect(problem.hint).not.toBe('')
        expect(problem.at.line).toBeGreaterThanOrEqual(1)
        expect(problem.at.column).toBeGreaterThanOrEqual(1)
      }
    }
    // Both outcomes must have been met, or nothing was mutated.
    expect(verdicts['invalid'] ?? 0).toBeGreaterThan(1000)
    expect((verdicts['pass'] ?? 0) + (verdicts['warn'] ?? 0) + (verdicts['fail'] ?? 0)).toBeGreaterThan(1000)
  }, 240_000)
})
