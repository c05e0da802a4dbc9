import type { SourceShape } from '../uncertainty/dimension.ts'
import type { Place, RuleLevel } from '../template/template-model.ts'

/** A computed quantity in millimetres: nominal, worst-case ends, standard deviation, and each source's signed effect (coefficient × half-width). */
export interface Quantity {
  readonly nominal: number
  readonly min: number
  readonly max: number
  readonly sigma: number
  readonly sources: readonly { readonly name: string; readonly effect: number; readonly shape: SourceShape }[]
}

export type Status = 'pass' | 'info' | 'warn' | 'fail' | 'waived' | 'unchecked' | 'crashed'

export type AxisName = 'length' | 'width' | 'depth' | 'headspace' | 'overlap'

export interface RequiredBand {
  readonly min: number | null
  readonly max: number | null
}

export interface AxisReport {
  readonly axis: AxisName
  readonly clearance: Quantity
  /** Half the nominal clearance. */
  readonly perSide: number
  readonly required: RequiredBand
  /** Name of the clearance, `set` where the fit gives it, `default` where the model does. */
  readonly requirementFrom: string
  /** P(clearance below the band), P(above it). */
  readonly binds: number
  readonly rattles: number
  /** Each source's share of the variance, largest first. */
  readonly sources: readonly { readonly name: string; readonly share: number }[]
  readonly verdict: 'pass' | 'warn' | 'fail'
  readonly strict: boolean
}

export interface FitReport {
  readonly id: string
  readonly relation: 'in' | 'over' | 'around'
  /** What is put; a mixed stack reads `4 card, 4 envelope`. */
  readonly put: string
  readonly to: string
  readonly holding: string | null
  readonly count: number
  readonly turned: boolean
  /** Share of builds in which every axis goes together by hand. */
  readonly closes: number
  readonly dependsOnCare: boolean
  readonly verdict: 'pass' | 'warn' | 'fail'
  readonly axes: readonly AxisReport[]
  readonly give: {
    readonly axis: AxisName
    readonly name: 'snug' | 'push-on'
    readonly goesTo: number
    readonly bow: number | null
  } | null
  /** Height at which a lid rests, and how much of the base shows below it. */
  readonly seat: { readonly z: number; readonly exposed: number } | null
  /** Print scales within 0.9..1.1 at which the fit holds; `null` where not asked for or none. */
  readonly scale: { readonly min: number; readonly max: number } | null
  /** The same fit judged with other papers. */
  readonly papers: readonly {
    readonly stock: string
    readonly verdict: 'pass' | 'warn' | 'fail'
    readonly closes: number
  }[]
  /** How many each verdict's pack height is: minimum, nominal, maximum; `null` where nothing is stacked. */
  readonly pack: { readonly min: number; readonly nominal: number; readonly max: number } | null
  readonly workmanship: string
}

export interface Fix {
  readonly path: readonly (string | number)[]
  readonly from: string
  readonly to: string
  /** A sentence for the author. */
  readonly note: string
}

export interface Verdict {
  readonly rule: string
  readonly subject: string
  /** `rule#subject`; the identity of a verdict everywhere. */
  readonly fingerprint: string
  readonly status: Status
  readonly level: RuleLevel
  readonly measure: {
    readonly actual: number
    readonly limit: number
    readonly sense: 'at-least' | 'at-most' | 'equal'
    readonly unit: 'share' | 'mm' | 'mm2' | 'count' | 'g' | 'gsm' | 'g/cm3' | 'ratio' | 'days' | 's'
  } | null
  readonly message: string
  readonly at: Place
  readonly waiver: { readonly reason: string; readonly until: string } | null
  readonly fix: Fix | null
}

/** One piece as reported; `kind` and sizes always, the rest by kind (see the JSON Schema). */
export interface PieceReport {
  readonly kind: string
  readonly stock: string | null
  readonly caliper: number | null
  readonly blank: { readonly length: number; readonly width: number } | null
  readonly inside: { readonly length: Quantity; readonly width: Quantity; readonly depth?: Quantity } | null
  readonly outside: { readonly length: Quantity; readonly width: Quantity; readonly height: Quantity } | null
  readonly make: number
  readonly made: 'measured' | 'printed'
  readonly [detail: string]: unknown
}

export interface ReportProblem {
  readonly code: string
  readonly message: string
  readonly hint: string
  readonly at: Place
}

export interface Summary {
  readonly pass: number
  readonly info: number
  readonly warn: number
  readonly fail: number
  readonly waived: number
  readonly unchecked: number
  readonly crashed: number
  /** Share of builds in which every fit of the set closes. */
  readonly works: number
  readonly verdict: 'pass' | 'warn' | 'fail' | 'invalid'
}

/** Everything the engine has to say about one set. Numbers are millimetres, unrounded. */
export interface Report {
  readonly format: 'foldgauge-report/1'
  readonly engine: string
  /** Edition of the rules, `YYYY-MM`. */
  readonly rules: string
  readonly asOf: string
  readonly file: string
  readonly set: string
  readonly title: string
  readonly family: string | null
  readonly units: 'mm' | 'in'
  /** SHA-256 of what was judged: set, used tokens, options. */
  readonly digest: string
  readonly workmanship: string
  readonly paper: string | null
  readonly scale: number
  readonly target: number
  readonly floor: number
  readonly ruler: { readonly cut: number; readonly score: number }
  readonly inputs: {
    readonly stocks: Readonly<
      Record<
        string,
        {
          readonly caliper: number
          readonly halfWidth: number
          readonly grammage: number | null
          readonly estimated: boolean
        }
      >
    >
    readonly sizes: Readonly<Record<string, { readonly length: number; readonly width: number }>>
    readonly clearances: Readonly<Record<string, unknown>>
    readonly makers: Readonly<Record<string, { readonly cut: number; readonly score: number; readonly fence: number }>>
  }
  readonly errors: readonly ReportProblem[]
  readonly pieces: Readonly<Record<string, PieceReport>>
  readonly fits: readonly FitReport[]
  readonly verdicts: readonly Verdict[]
  readonly summary: Summary
}
