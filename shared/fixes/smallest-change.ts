import { judgeSet, type JudgedSet } from '../assembly/judge-set.ts'
import type { JudgedAxis } from '../assembly/judge-axis.ts'
import { applyRules } from '../rules/apply-rules.ts'
import type { Rule } from '../rules/rule.ts'
import type { Fix, Status, Verdict } from '../report/report.ts'
import type { PieceGiven } from '../pieces/given.ts'
import type { TemplateSet } from '../template/template-model.ts'
import { valueTextAt } from '../template/edit-text.ts'
import { distributionOf } from '../uncertainty/distribution.ts'
import { formatLength, formatSize } from '../units/format-length.ts'
import { roundToGrid } from '../units/grid.ts'
import { settableLengths, type SettableLength } from './settable-lengths.ts'

const severity: Readonly<Record<Status, number>> = {
  pass: 0,
  info: 0,
  unchecked: 0,
  waived: 0,
  warn: 1,
  fail: 2,
  crashed: 3,
}

/** A set with one piece replaced. */
export function withPiece(set: TemplateSet, piece: PieceGiven): TemplateSet {
  return {
    ...set,
    pieces: new Map([...set.pieces].map(([name, given]) => [name, name === piece.name ? piece : given])),
  }
}

/** How far the clearance must move up (positive) or down for the axis to reach the target. */
function neededShift(judged: JudgedSet, axis: JudgedAxis): number {
  const { band } = axis.clearance.requirement
  const { target } = judged.set.tokens
  const distribution = distributionOf(axis.clearance.clearance)
  const up = band.min === null ? 0 : band.min - distribution.quantile(1 - target)
  const down = band.max === null ? 0 : band.max - distribution.quantile(target)
  return up > 0 ? up : Math.min(0, down)
}

const findAxis = (judged: JudgedSet, fit: string, axis: string): JudgedAxis | undefined =>
  judged.fits.find((candidate) => candidate.fit.id === fit)?.axes.find((candidate) => candidate.clearance.axis === axis)

function movedText(set: TemplateSet, length: SettableLength, value: number): string {
  const listed = length.listed(value)
  const [only] = listed
  return listed.length === 1 && only !== undefined
    ? formatLength(only, set.tokens.units)
    : formatSize(listed, set.tokens.units)
}

interface Candidate {
  readonly length: SettableLength
  readonly delta: number
  readonly after: JudgedSet
}

/** One length moved on the ruler grid as far as this axis needs, if it can help at all. */
function tryLength(
  judged: JudgedSet,
  fit: string,
  axisName: string,
  axis: JudgedAxis,
  needed: number,
  length: SettableLength,
  most: number,
): Candidate | null {
  const grid = judged.set.tokens.ruler[length.grid]
  const probe = axisAfter(judged, fit, axisName, length, length.value + grid)
  if (probe === null) return null
  const perGrid = probe.axis.clearance.clearance.nominal - axis.clearance.clearance.nominal
  if (Math.abs(perGrid) < 1e-6) return null
  const steps = needed / perGrid
  const sign = Math.sign(steps)
  const onGrid = roundToGrid(length.value, grid)
  for (let count = Math.max(1, Math.floor(Math.abs(steps))); count <= Math.abs(steps) + 3; count += 1) {
    const value = onGrid + sign * count * grid
    const delta = value - length.value
    if (value <= 0 || Math.abs(delta) > most) return null
    const moved = axisAfter(judged, fit, axisName, length, value)
    if (moved !== null && moved.axis.verdict === 'pass') return { length, delta, after: moved.after }
  }
  return null
}

function axisAfter(
  judged: JudgedSet,
  fit: string,
  axisName: string,
  length: SettableLength,
  value: number,
): { axis: JudgedAxis; after: JudgedSet } | null {
  try {
    const after = judgeSet(withPiece(judged.set, length.with(value)), {
      ...judged.options,
      fixes: false,
      scales: false,
    })
    const axis = findAxis(after, fit, axisName)
    return axis === undefined ? null : { axis, after }
  } catch {
    // A length that leaves no piece is no remedy.
    return null
  }
}

/** True where no verdict is worse than before; the one to be mended counts too. */
function worsensNothing(before: readonly Verdict[], after: readonly Verdict[]): boolean {
  const was = new Map(before.map((verdict) => [verdict.fingerprint, severity[verdict.status]]))
  return after.every((verdict) => severity[verdict.status] <= (was.get(verdict.fingerprint) ?? 0))
}

/** Thickest paper with which the axis would pass, per stock that matters; the one that has to change least. */
function paperLimit(
  judged: JudgedSet,
  axis: JudgedAxis,
  needed: number,
): { readonly stock: string; readonly caliper: number } | null {
  const limits = axis.clearance.clearance.sources.flatMap((source) => {
    const name = /^caliper\((.+)\)$/.exec(source.name)?.[1]
    if (name === undefined || source.coefficient * needed >= 0) return []
    const nominal = judged.model.stock(name).caliper
    if (nominal === null) return []
    const caliper = Math.floor((nominal + needed / source.coefficient) * 100) / 100
    return caliper > 0.05 && caliper < nominal ? [{ stock: name, caliper, share: caliper / nominal }] : []
  })
  return limits.toSorted((a, b) => b.share - a.share)[0] ?? null
}

const sentence = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1)

/**
 * The smallest change that makes a fit's verdict pass and no other worse: one length moved on the ruler grid by the
 * least millimetres; beside it the thickest paper that would do.
 * @returns `null` where nothing of the kind helps
 */
export function smallestChange(
  judged: JudgedSet,
  verdict: Verdict,
  verdicts: readonly Verdict[],
  rules: readonly Rule[],
): Fix | null {
  const [fitId = '', axisName = ''] = verdict.subject.split(':')
  const axis = findAxis(judged, fitId, axisName)
  const fit = judged.fits.find((candidate) => candidate.fit.id === fitId)
  if (axis === undefined || fit === undefined) return null
  const needed = neededShift(judged, axis)
  if (needed === 0) return null
  const paper = paperLimit(judged, axis, needed)
  const units = judged.set.tokens.units
  const paperWords = paper === null ? '' : ` or use ${paper.stock} no thicker than ${formatLength(paper.caliper, 'mm')}`
  const involved = [...judged.set.pieces.values()]
  // Moving the thing outside leaves what is published inside alone, so it is preferred where both move as far.
  const outer = fit.fit.relation === 'in' ? fit.fit.to : (fit.fit.put[0]?.piece ?? '')
  const candidates: Candidate[] = []
  for (const given of involved) {
    for (const length of settableLengths(given)) {
      const written = valueTextAt(judged.set.text, length.path)
      if (written === null || !/\d/.test(written)) continue
      const candidate = tryLength(judged, fitId, axisName, axis, needed, length, 60)
      if (candidate !== null) candidates.push(candidate)
    }
  }
  candidates.sort(
    (a, b) =>
      Math.abs(a.delta) - Math.abs(b.delta) || Number(b.length.piece === outer) - Number(a.length.piece === outer),
  )
  for (const { length, delta, after } of candidates) {
    if (!worsensNothing(verdicts, applyRules(after, rules))) continue
    const by = formatLength(Math.abs(delta), units)
    const words = `${length.words.verb} ${by} ${delta > 0 ? length.words.more : length.words.less}`
    const from = valueTextAt(judged.set.text, length.path) ?? ''
    const to = movedText(judged.set, length, length.value + delta)
    return { path: length.path, from, to, note: `${sentence(words)}${paperWords === '' ? '' : `,${paperWords}`}.` }
  }
  return paper === null
    ? null
    : {
        path: ['stocks', paper.stock, 'caliper'],
        from: formatLength(judged.model.stock(paper.stock).caliper ?? 0, 'mm'),
        to: formatLength(paper.caliper, 'mm'),
        note: `Use ${paper.stock} no thicker than ${formatLength(paper.caliper, 'mm')}.`,
      }
}
