import type { JudgedSet } from '../assembly/judge-set.ts'
import type { Origin } from '../pieces/model-defaults.ts'
import type { Status, Verdict } from '../report/report.ts'
import type { RuleLevel } from '../template/template-model.ts'

/** What a rule says of one thing it judged, passing ones too. */
export interface Finding {
  /** Name from the file: a piece, a fit, `fit:axis`, or the set. Never an index, a count or a line. */
  readonly subject: string
  /** How bad it is by itself; the rule's level caps it. `unchecked` where there was nothing to judge by. */
  readonly severity: 'pass' | 'info' | 'warn' | 'fail' | 'unchecked'
  readonly measure: Verdict['measure']
  /** The fact, the need and, where it is plain, the nearest remedy, in the author's nouns. */
  readonly message: string
  /** Keys that lead to the thing in the file. */
  readonly path: readonly (string | number)[]
}

/** A rule as data. It judges every subject it applies to and gives a finding for each. */
export interface Rule {
  readonly id: string
  /** The most that a failing finding counts, unless the workspace sets another level. */
  readonly level: Exclude<RuleLevel, 'off'>
  readonly title: string
  /** Why it exists, for the author who is told off by it. */
  readonly why: string
  readonly origin: { readonly kind: Origin; readonly source: string }
  /** What usually helps. */
  readonly remedy: string
  /** @param before verdicts of the rules that came before; only rules about waivers need them */
  judge(judged: JudgedSet, before: readonly Verdict[]): readonly Finding[]
}

/** A whole set as an example, with what the rule must say of it. */
export interface RuleExample {
  readonly title: string
  /** `foldgauge.yaml` and set in one text: a set that stands alone, unless `workspace` is given. */
  readonly set: string
  /** Text of `foldgauge.yaml`, where the rule speaks of what only a workspace can say. */
  readonly workspace?: string
  readonly expect: {
    readonly subject: string
    readonly status: Status
    /** Place of the verdict, 1-based. */
    readonly line: number
    readonly column: number
  }
}

/** Examples of a rule that pass and that do not. */
export interface RuleExamples {
  readonly rule: string
  readonly passing: readonly RuleExample[]
  readonly failing: readonly RuleExample[]
}

/** How every example is judged: on one day, with the windows of print scales that some rules ask for. */
export const exampleOptions = { asOf: '2026-12-01', scales: true } as const
