import type { JudgedSet } from '../assembly/judge-set.ts'
import type { Status, Verdict } from '../report/report.ts'
import type { RuleLevel, Waiver } from '../template/template-model.ts'
import type { Finding, Rule } from './rule.ts'

const rank = { pass: 0, info: 1, warn: 2, fail: 3 } as const

/** What a finding counts as under a level: the level caps it. */
function statusUnder(finding: Finding, level: Exclude<RuleLevel, 'off'>): Status {
  if (finding.severity === 'unchecked') return 'unchecked'
  return rank[finding.severity] <= rank[level] ? finding.severity : level
}

/** Whether a waiver speaks of a verdict: its rule, and its subject, the fit of that axis, or the whole set. */
export function waives(waiver: Waiver, rule: string, subject: string): boolean {
  return (
    waiver.rule === rule &&
    (waiver.subject === null || waiver.subject === subject || subject.startsWith(`${waiver.subject}:`))
  )
}

/** A waiver holds through its last day. */
export const isInForce = (waiver: Waiver, asOf: string): boolean => asOf <= waiver.until

type PlaceOf = JudgedSet['set']['placeOf']

/** Places by path, each looked up once: many rules point at the same piece. */
function rememberPlaces(placeOf: PlaceOf): PlaceOf {
  const known = new Map<string, ReturnType<PlaceOf>>()
  return (path) => {
    const key = path.join('\n')
    const found = known.get(key)
    if (found !== undefined) return found
    const place = placeOf(path)
    known.set(key, place)
    return place
  }
}

function verdictOf(
  judged: JudgedSet,
  rule: Rule,
  level: Exclude<RuleLevel, 'off'>,
  finding: Finding,
  placeOf: PlaceOf,
): Verdict {
  const status = statusUnder(finding, level)
  const waiver =
    status === 'warn' || status === 'fail'
      ? judged.set.waivers.find(
          (candidate) => waives(candidate, rule.id, finding.subject) && isInForce(candidate, judged.options.asOf),
        )
      : undefined
  return {
    rule: rule.id,
    subject: finding.subject,
    fingerprint: `${rule.id}#${finding.subject}`,
    status: waiver === undefined ? status : 'waived',
    level,
    measure: finding.measure,
    message: finding.message,
    at: placeOf(finding.path),
    waiver: waiver === undefined ? null : { reason: waiver.reason, until: waiver.until },
    fix: null,
  }
}

/** One crashing rule is reported and spoils no other. */
function crashed(judged: JudgedSet, rule: Rule, level: Exclude<RuleLevel, 'off'>, error: unknown): Verdict {
  const reason = error instanceof Error ? error.message : String(error)
  return {
    rule: rule.id,
    subject: judged.set.name,
    fingerprint: `${rule.id}#${judged.set.name}`,
    status: 'crashed',
    level,
    measure: null,
    message: `this check could not be finished, which is a defect of Foldgauge: ${reason}`,
    at: judged.set.placeOf(['set']),
    waiver: null,
    fix: null,
  }
}

/** Runs rules in order over a judged set: a verdict for every subject each of them judged. */
export function applyRules(judged: JudgedSet, rules: readonly Rule[]): readonly Verdict[] {
  const verdicts: Verdict[] = []
  const placeOf = rememberPlaces(judged.set.placeOf)
  for (const rule of rules) {
    const level = judged.set.tokens.checks.get(rule.id) ?? rule.level
    if (level === 'off') continue
    try {
      for (const finding of rule.judge(judged, verdicts))
        verdicts.push(verdictOf(judged, rule, level, finding, placeOf))
    } catch (error) {
      verdicts.push(crashed(judged, rule, level, error))
    }
  }
  return verdicts
}
