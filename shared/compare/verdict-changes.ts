import type { Report, Status, Verdict } from '../report/report.ts'
import type { DimensionChange, Flip, VerdictChange } from './comparison.ts'

/** How bad a status is to someone who already lives with the other one. A waiver is a known failure, not a new one. */
const rank: Readonly<Record<Status, number>> = {
  pass: 0,
  info: 0,
  unchecked: 0,
  waived: 1,
  warn: 2,
  fail: 3,
  crashed: 4,
}

function flipOf(before: Status | null, after: Status | null): Flip {
  if (before === null) return 'added'
  if (after === null) return 'removed'
  if (after === 'fail' || after === 'crashed') return 'newly-failing'
  if (after === 'waived') return 'newly-waived'
  if (after === 'unchecked') return 'no-longer-judged'
  if (after === 'warn') return rank[after] > rank[before] ? 'newly-warning' : 'milder'
  return 'now-passing'
}

/** Got worse: a higher rank than before, or a new subject that does not pass. */
function isRegression(before: Status | null, after: Status | null): boolean {
  if (after === null) return false
  const was = before === null ? 0 : rank[before]
  return rank[after] > was && rank[after] >= rank.warn
}

/** Pieces a fit brings together, with what is held. */
export function piecesOfFit(report: Report, fitId: string): readonly string[] {
  const fit = report.fits.find((candidate) => candidate.id === fitId)
  if (fit === undefined) return []
  const put = fit.put.split(', ').map((entry) => entry.replace(/^\d+ /, ''))
  return [...put, fit.to, ...(fit.holding === null ? [] : [fit.holding])]
}

const isConsequence = ({ what }: DimensionChange): boolean => /^(inside|outside|thickness)\b/.test(what)

function causesOf(report: Report, subject: string, dimensions: readonly DimensionChange[]): readonly string[] {
  const [name = ''] = subject.split(':')
  const pieces = new Set([name, ...piecesOfFit(report, name)])
  return (
    dimensions
      .filter((change) => pieces.has(change.piece) && change.delta !== null)
      // What a maker sets is the cause; inside and outside only follow from it.
      .toSorted(
        (a, b) =>
          Number(isConsequence(a)) - Number(isConsequence(b)) || Math.abs(b.delta ?? 0) - Math.abs(a.delta ?? 0),
      )
      .filter((change, _index, all) => !isConsequence(change) || all.every(isConsequence))
      .slice(0, 3)
      .map((change) => `${change.what} of ${change.piece} ${signed(change.delta ?? 0)}`)
  )
}

export const signed = (mm: number): string => `${mm < 0 ? '−' : '+'}${String(Number(Math.abs(mm).toFixed(3)))} mm`

const byFingerprint = (report: Report): ReadonlyMap<string, Verdict> =>
  new Map(report.verdicts.map((verdict) => [verdict.fingerprint, verdict]))

const order: readonly Flip[] = [
  'newly-failing',
  'newly-warning',
  'added',
  'newly-waived',
  'no-longer-judged',
  'removed',
  'now-passing',
  'milder',
]

/** Verdicts matched by identity whose status differs, worst first, fits before everything else. */
export function compareVerdicts(
  before: Report,
  after: Report,
  dimensions: readonly DimensionChange[],
): readonly VerdictChange[] {
  const was = byFingerprint(before)
  const is = byFingerprint(after)
  const changes: VerdictChange[] = []
  for (const fingerprint of new Set([...was.keys(), ...is.keys()])) {
    const old = was.get(fingerprint)
    const now = is.get(fingerprint)
    const known = now ?? old
    if (known === undefined || old?.status === now?.status) continue
    const [from, to] = [old?.status ?? null, now?.status ?? null]
    changes.push({
      rule: known.rule,
      subject: known.subject,
      fingerprint,
      flip: flipOf(from, to),
      before: from,
      after: to,
      isRegression: isRegression(from, to),
      message: known.message,
      causes: causesOf(now === undefined ? before : after, known.subject, dimensions),
    })
  }
  const isFit = (change: VerdictChange): number => (change.rule.startsWith('fit/') ? 0 : 1)
  return changes.toSorted(
    (a, b) =>
      Number(b.isRegression) - Number(a.isRegression) ||
      isFit(a) - isFit(b) ||
      order.indexOf(a.flip) - order.indexOf(b.flip) ||
      (a.fingerprint < b.fingerprint ? -1 : 1),
  )
}
