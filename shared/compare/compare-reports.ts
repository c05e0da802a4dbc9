import type { AxisReport, Report } from '../report/report.ts'
import type {
  Comparison,
  ComparedSide,
  DimensionChange,
  InputChange,
  MarginChange,
  Mating,
  VerdictChange,
} from './comparison.ts'
import { compareDimensions, compareInputs } from './dimension-changes.ts'
import { matingsOf } from './matings.ts'
import { compareVerdicts } from './verdict-changes.ts'

/** Shares are exact to 1e-4; below one build in a thousand nobody can tell a difference. */
const noiseFloor = { mm: 0.005, share: 0.001 } as const

const sideOf = (report: Report): ComparedSide => ({
  file: report.file,
  set: report.set,
  title: report.title,
  digest: report.digest,
  engine: report.engine,
  rules: report.rules,
  asOf: report.asOf,
  verdict: report.summary.verdict,
  works: report.summary.works,
})

function marginOf(fit: string, before: AxisReport, after: AxisReport): MarginChange | null {
  const moved = after.clearance.nominal - before.clearance.nominal
  const bindsMore = after.binds - before.binds
  const rattlesMore = after.rattles - before.rattles
  if (
    Math.abs(moved) < noiseFloor.mm &&
    Math.abs(bindsMore) < noiseFloor.share &&
    Math.abs(rattlesMore) < noiseFloor.share
  )
    return null
  const isShrinking =
    bindsMore > noiseFloor.share ||
    rattlesMore > noiseFloor.share ||
    (Math.abs(bindsMore) <= noiseFloor.share && moved < -noiseFloor.mm)
  return {
    fit,
    axis: after.axis,
    clearance: { before: before.clearance.nominal, after: after.clearance.nominal },
    binds: { before: before.binds, after: after.binds },
    rattles: { before: before.rattles, after: after.rattles },
    required: after.required,
    isShrinking,
  }
}

function compareMargins(before: Report, after: Report): readonly MarginChange[] {
  const margins = after.fits.flatMap((fit) => {
    const old = before.fits.find((candidate) => candidate.id === fit.id)
    return fit.axes.flatMap((axis) => {
      const was = old?.axes.find((candidate) => candidate.axis === axis.axis)
      const margin = was === undefined ? null : marginOf(fit.id, was, axis)
      return margin === null ? [] : [margin]
    })
  })
  return margins.toSorted(
    (a, b) =>
      Number(b.isShrinking) - Number(a.isShrinking) ||
      b.binds.after - b.binds.before - (a.binds.after - a.binds.before) ||
      (`${a.fit}:${a.axis}` < `${b.fit}:${b.axis}` ? -1 : 1),
  )
}

const fits = (count: number): string => (count === 1 ? '1 check' : `${String(count)} checks`)

function sentenceOf(counts: Comparison['counts']): string {
  const parts = [
    counts.newlyFailing > 0 ? `${fits(counts.newlyFailing)} newly fail${counts.newlyFailing === 1 ? 's' : ''}` : '',
    counts.newlyWarning > 0 ? `${String(counts.newlyWarning)} newly warn${counts.newlyWarning === 1 ? 's' : ''}` : '',
    counts.nowPassing > 0 ? `${String(counts.nowPassing)} now pass${counts.nowPassing === 1 ? 'es' : ''}` : '',
    counts.added > 0 ? `${String(counts.added)} added` : '',
    counts.removed > 0 ? `${String(counts.removed)} removed` : '',
    `${String(counts.unchanged)} unchanged`,
    counts.notChecked > 0 ? `${String(counts.notChecked)} not checked` : '',
  ]
  return parts.filter((part) => part !== '').join(', ')
}

function countOf(before: Report, after: Report, changes: readonly VerdictChange[]): Comparison['counts'] {
  const count = (flip: VerdictChange['flip']): number => changes.filter((change) => change.flip === flip).length
  const was = new Map(before.verdicts.map((verdict) => [verdict.fingerprint, verdict.status]))
  return {
    newlyFailing:
      count('newly-failing') + changes.filter((change) => change.flip === 'added' && change.after === 'fail').length,
    newlyWarning: count('newly-warning'),
    nowPassing: count('now-passing'),
    unchanged: after.verdicts.filter(
      (verdict) => verdict.status !== 'unchecked' && was.get(verdict.fingerprint) === verdict.status,
    ).length,
    notChecked: after.verdicts.filter((verdict) => verdict.status === 'unchecked').length,
    added: count('added'),
    removed: count('removed'),
  }
}

function propose(
  before: Report,
  after: Report,
  matings: readonly Mating[],
  dimensions: readonly DimensionChange[],
  inputs: readonly InputChange[],
): Comparison['proposal'] {
  const unmated = matings.filter((mating) => mating.verdict === 'fail')
  const [first] = unmated
  if (first !== undefined) return { step: 'major', why: `old and new pieces no longer mate: ${first.sentence}` }
  const gone = Object.keys(before.pieces).filter((piece) => !(piece in after.pieces))
  if (gone.length > 0)
    return { step: 'major', why: `${gone.join(', ')} is gone, so old pieces miss what they belong to` }
  const added = Object.keys(after.pieces).filter((piece) => !(piece in before.pieces))
  if (added.length > 0) return { step: 'minor', why: `new: ${added.join(', ')}; what was there before still mates` }
  if (dimensions.length > 0) return { step: 'minor', why: 'sizes moved; old and new pieces still mate' }
  if (inputs.length > 0) return { step: 'patch', why: 'judged with other inputs; no size of any piece moved' }
  return before.digest === after.digest
    ? { step: 'none', why: 'nothing changed' }
    : { step: 'patch', why: 'only words changed' }
}

/**
 * Compares two reports of a set; the only comparison there is. Everything is matched by identity.
 * Two reports alone suffice, since they carry the sources of every dimension.
 */
export function compareReports(before: Report, after: Report): Comparison {
  const whyNot =
    before.engine !== after.engine
      ? `the reports come from two engines (${before.engine} and ${after.engine}); check the older text again with this one`
      : before.rules !== after.rules
        ? `the reports come from two editions of the rules (${before.rules} and ${after.rules}); check the older text again`
        : before.summary.verdict === 'invalid' || after.summary.verdict === 'invalid'
          ? 'one of the two sets could not be understood'
          : null
  const dimensions = compareDimensions(before, after)
  const inputs = compareInputs(before, after)
  const changes = whyNot === null ? compareVerdicts(before, after, dimensions) : []
  const margins = whyNot === null ? compareMargins(before, after) : []
  const matings = whyNot === null ? matingsOf(before, after) : []
  const counts = countOf(before, after, changes)
  return {
    format: 'foldgauge-comparison/1',
    before: sideOf(before),
    after: sideOf(after),
    isComparable: whyNot === null,
    whyNot,
    noiseFloor,
    sentence: whyNot === null ? sentenceOf(counts) : `not comparable: ${whyNot}`,
    counts,
    changes,
    margins,
    dimensions,
    inputs,
    matings,
    oldPiecesMate: matings.every((mating) => mating.verdict !== 'fail'),
    proposal: propose(before, after, matings, dimensions, inputs),
    isEmpty:
      whyNot === null && changes.length === 0 && margins.length === 0 && dimensions.length === 0 && inputs.length === 0,
  }
}

/** True where something got worse that was not already known. */
export const hasRegression = (comparison: Comparison): boolean =>
  comparison.changes.some((change) => change.isRegression)
