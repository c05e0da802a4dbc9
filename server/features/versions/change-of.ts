import type { Comparison } from '../../../shared/compare/comparison.ts'
import type { ChangeState } from './version.entity.ts'

export interface Change {
  readonly state: ChangeState
  readonly sentence: string
  readonly newlyFailing: number
  readonly nowPassing: number
}

/**
 * Whether a version is worse than what it is compared with. Failures that are known and accepted are not news.
 * @param known fingerprints of accepted failures
 */
export function changeOf(comparison: Comparison, known: ReadonlySet<string>): Change {
  const { counts, sentence } = comparison
  if (!comparison.isComparable) return { state: 'incomparable', sentence, newlyFailing: 0, nowPassing: 0 }
  const regressions = comparison.changes.filter((change) => change.isRegression && !known.has(change.fingerprint))
  const { nowPassing } = counts
  const newlyFailing = regressions.filter(({ after }) => after === 'fail').length
  const state = regressions.length > 0 ? 'worse' : nowPassing > 0 ? 'better' : comparison.isEmpty ? 'same' : 'changed'
  return { state, sentence, newlyFailing, nowPassing }
}
