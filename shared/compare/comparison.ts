import type { AxisName, Report, Status } from '../report/report.ts'

/** Which two reports are compared, and with what. */
export interface ComparedSide {
  readonly file: string
  readonly set: string
  readonly title: string
  readonly digest: string
  readonly engine: string
  readonly rules: string
  readonly asOf: string
  readonly verdict: Report['summary']['verdict']
  readonly works: number
}

export type Flip =
  | 'newly-failing'
  | 'newly-warning'
  | 'now-passing'
  | 'milder'
  | 'newly-waived'
  | 'no-longer-judged'
  | 'added'
  | 'removed'

/** A verdict that is another than before. `before` or `after` is `null` where the subject exists on one side only. */
export interface VerdictChange {
  readonly rule: string
  readonly subject: string
  readonly fingerprint: string
  readonly flip: Flip
  readonly before: Status | null
  readonly after: Status | null
  readonly isRegression: boolean
  readonly message: string
  /** Dimensions that moved and bear on it, largest effect first, as sentences. */
  readonly causes: readonly string[]
}

/** An axis of a fit whose clearance or share moved beyond the noise floor. */
export interface MarginChange {
  readonly fit: string
  readonly axis: AxisName
  readonly clearance: { readonly before: number; readonly after: number }
  readonly binds: { readonly before: number; readonly after: number }
  readonly rattles: { readonly before: number; readonly after: number }
  readonly required: { readonly min: number | null; readonly max: number | null }
  readonly isShrinking: boolean
}

export interface DimensionChange {
  readonly piece: string
  /** In the author's nouns: `blank length`, `wall`, `inside width`. */
  readonly what: string
  readonly before: number | null
  readonly after: number | null
  readonly delta: number | null
  /** Fits that depend on the piece. */
  readonly dependents: readonly string[]
}

export interface InputChange {
  /** `stock smooth-270 caliper`, `workmanship`, `target` and the like. */
  readonly what: string
  readonly before: string | null
  readonly after: string | null
}

/** A fit that crosses the two versions: one piece as it was, the other as it is. */
export interface Mating {
  readonly fit: string
  readonly put: string
  readonly to: string
  /** Which side the piece that is put, and the piece it meets, come from. */
  readonly putFrom: 'before' | 'after'
  readonly toFrom: 'before' | 'after'
  readonly verdict: 'pass' | 'warn' | 'fail' | 'unchecked'
  /** Share of builds whose worst axis does not bind. */
  readonly closes: number | null
  readonly worstAxis: AxisName | null
  readonly sentence: string
}

export interface Comparison {
  readonly format: 'foldgauge-comparison/1'
  readonly before: ComparedSide
  readonly after: ComparedSide
  /** False where the engines or rules editions differ: figures of two engines are not compared. */
  readonly isComparable: boolean
  readonly whyNot: string | null
  /** Differences smaller than these are not reported. */
  readonly noiseFloor: { readonly mm: number; readonly share: number }
  /** The verdict line. */
  readonly sentence: string
  readonly counts: {
    readonly newlyFailing: number
    readonly newlyWarning: number
    readonly nowPassing: number
    readonly unchanged: number
    readonly notChecked: number
    readonly added: number
    readonly removed: number
  }
  readonly changes: readonly VerdictChange[]
  readonly margins: readonly MarginChange[]
  readonly dimensions: readonly DimensionChange[]
  readonly inputs: readonly InputChange[]
  readonly matings: readonly Mating[]
  readonly oldPiecesMate: boolean
  /** Proposed step of the version number, with its reason. */
  readonly proposal: { readonly step: 'major' | 'minor' | 'patch' | 'none'; readonly why: string }
  readonly isEmpty: boolean
}
