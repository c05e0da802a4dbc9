import { readdirSync, readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'
import { checkTemplate } from '../../../shared/check-template.ts'
import type { Report } from '../../../shared/report/report.ts'
import { readSet } from '../../../shared/template/read-set.ts'
import { readWorkspace } from '../../../shared/template/read-workspace.ts'
import type { TemplateSet } from '../../../shared/template/template-model.ts'

const folder = fileURLToPath(new URL('../../../shared/demo/', import.meta.url))
const read = (path: string): string => readFileSync(`${folder}${path}`, 'utf8')
const workspace = readWorkspace(read('foldgauge.yaml'), 'foldgauge.yaml')
const names = readdirSync(`${folder}sets`).filter((name) => name.endsWith('.yaml'))

const check = (path: string): Report =>
  checkTemplate(read(path), workspace, { file: path, asOf: '2026-12-01', scales: true })

const reports = new Map(names.map((name) => [name, check(`sets/${name}`)]))
const sets = names.flatMap((name): readonly TemplateSet[] => {
  const { set } = readSet(read(`sets/${name}`), name, workspace)
  return set === null ? [] : [set]
})
const pieces = sets.flatMap((set) => [...set.pieces.values()])
const fits = sets.flatMap((set) => set.fits)

describe('the demo workspace', () => {
  it('reads without a problem', () => {
    expect(workspace.problems).toEqual([])
    expect(names).toHaveLength(10)
  })

  it.each([...reports])('passes or is waived on purpose: %s', (_, report) => {
    expect(report.errors).toEqual([])
    expect(report.verdicts.filter(({ status }) => status === 'warn' || status === 'fail')).toEqual([])
    expect(report.summary.crashed).toBe(0)
    expect(report.summary.verdict).toBe('pass')
  })

  it('waives with a reason and only what does not pass by itself', () => {
    const verdicts = [...reports.values()].flatMap((report) => report.verdicts)
    const waivers = sets.flatMap((set) => set.waivers)
    expect(waivers.length).toBeGreaterThanOrEqual(2)
    expect(verdicts.filter(({ status }) => status === 'waived')).toHaveLength(waivers.length)
    expect(verdicts.filter(({ rule, status }) => rule.startsWith('waiver/') && status !== 'pass')).toEqual([])
  })

  it('keeps the usual target and floor, and every requirement at least as strict as it is named', () => {
    expect(workspace.tokens.target).toBe(0.95)
    expect(workspace.tokens.floor).toBe(0.85)
    expect(workspace.tokens.checks.size).toBe(0)
  })

  it('has three families: one metric, one in inches, one for bought envelopes', () => {
    expect([...workspace.families.keys()]).toEqual(['fernbrook', 'larkspur', 'harbour'])
    const unitsOf = (family: string): ReadonlySet<string> =>
      new Set(sets.filter((set) => set.family === family).map((set) => set.tokens.units))
    expect([...unitsOf('fernbrook')]).toEqual(['mm'])
    expect([...unitsOf('larkspur')]).toEqual(['in'])
    const harbour = sets.filter((set) => set.family === 'harbour')
    expect(harbour.some((set) => [...set.pieces.values()].some((piece) => piece.kind === 'bought'))).toBe(true)
  })

  it('shows every kind of piece and every way of making one', () => {
    expect(new Set(pieces.map((piece) => piece.kind))).toEqual(
      new Set(['card', 'envelope', 'box', 'lid', 'sleeve', 'band', 'bag', 'insert', 'divider', 'bought', 'custom']),
    )
    expect(new Set(pieces.map((piece) => piece.made))).toEqual(new Set(['measured', 'printed']))
    const cards = pieces.flatMap((piece) => (piece.kind === 'card' ? [piece] : []))
    expect(new Set(cards.map((card) => card.style))).toEqual(new Set(['single', 'roll', 'accordion', 'gate']))
    expect(new Set(cards.map((card) => card.fold))).toEqual(new Set(['long-edge', 'short-edge', 'none']))
    expect(cards.some((card) => card.layers.length > 0 && card.raised !== null)).toBe(true)
    expect(cards.some((card) => card.layers.some((layer) => layer.banner !== null))).toBe(true)
    expect(cards.some((card) => card.pocket !== null)).toBe(true)
    expect(cards.some((card) => card.insert !== null)).toBe(true)
    const envelopes = pieces.flatMap((piece) => (piece.kind === 'envelope' ? [piece] : []))
    expect(envelopes.some((each) => each.style === 'baronial' && each.by === 'pocket')).toBe(true)
    expect(envelopes.some((each) => each.style === 'baronial' && each.by === 'corners')).toBe(true)
    expect(envelopes.some((each) => each.style === 'square-flap' && each.liner !== null)).toBe(true)
    const trays = pieces.flatMap((piece) => (piece.kind === 'box' || piece.kind === 'lid' ? [piece] : []))
    expect(trays.some((tray) => tray.walls === 'doubled')).toBe(true)
    expect(trays.some((tray) => tray.covered !== null)).toBe(true)
    expect(pieces.some((piece) => piece.kind === 'band' && piece.ribbon)).toBe(true)
  })

  it('shows every relation, a mixed stack, things that stand, named clearances and makers of its own', () => {
    expect(new Set(fits.map((fit) => fit.relation))).toEqual(new Set(['in', 'over', 'around']))
    expect(fits.some((fit) => fit.isStack && fit.put.length > 1)).toBe(true)
    expect(fits.some((fit) => fit.stands === 'upright')).toBe(true)
    expect(fits.some((fit) => fit.papers.length > 0)).toBe(true)
    expect(new Set(fits.flatMap((fit) => fit.clearance?.name ?? []))).toEqual(
      new Set(workspace.tokens.clearances.keys()),
    )
    expect(pieces.some((piece) => piece.workmanship === 'workshop')).toBe(true)
    expect(sets.some((set) => set.steps !== 'auto')).toBe(true)
    expect(sets.filter((set) => set.mail !== null).length).toBeGreaterThanOrEqual(3)
  })

  it('uses every stock it names', () => {
    const used = [...reports.values()].flatMap((report) => Object.keys(report.inputs.stocks))
    expect(new Set(used)).toEqual(new Set(workspace.tokens.stocks.keys()))
  })
})

describe('the failing copy', () => {
  const sound = read('sets/fern-notes.yaml')
  const spoilt = read('failing/fern-notes.yaml')
  const report = check('failing/fern-notes.yaml')

  it('is the sound set but for one score and the comment at its head', () => {
    const lines = (text: string): readonly string[] => text.split('\n').filter((line) => !line.startsWith('#'))
    const changed = lines(spoilt).flatMap((line, index) => (line === lines(sound)[index] ? [] : [line.trim()]))
    expect(changed).toEqual(['lid:  { kind: lid, stock: meadow-270, blank: 192 x 149, wall: 17 }'])
  })

  it('fails because its lid binds, at the line of that fit', () => {
    const failed = report.verdicts.filter(({ status }) => status === 'fail')
    expect(failed.map(({ fingerprint }) => fingerprint)).toContain('fit/clearance#lid-on-base:width')
    expect(failed.every(({ rule }) => rule === 'fit/clearance')).toBe(true)
    const place = failed[0]?.at
    expect(spoilt.split('\n')[(place?.line ?? 0) - 1]?.slice((place?.column ?? 0) - 1)).toMatch(/^lid-on-base:/)
  })
})
