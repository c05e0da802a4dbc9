import type { JudgedSet } from '../assembly/judge-set.ts'
import type { Verdict } from '../report/report.ts'
import type { Rule } from '../rules/rule.ts'
import { smallestChange } from './smallest-change.ts'

/** Verdicts on fits that do not pass, each with the smallest change that mends it where there is one. */
export function addFixes(judged: JudgedSet, verdicts: readonly Verdict[], rules: readonly Rule[]): readonly Verdict[] {
  return verdicts.map((verdict) =>
    verdict.rule.startsWith('fit/') &&
    verdict.subject.includes(':') &&
    (verdict.status === 'fail' || verdict.status === 'warn')
      ? { ...verdict, fix: smallestChange(judged, verdict, verdicts, rules) }
      : verdict,
  )
}
