import type { Dimension } from './dimension.ts'

/** A dimension that must be at least so much. */
export interface Condition {
  readonly dimension: Dimension
  readonly atLeast: number
}

/** A condition with the share of builds that fail it. */
export interface OpenCondition extends Condition {
  readonly fails: number
}
