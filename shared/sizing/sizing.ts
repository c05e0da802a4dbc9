import type { Report } from '../report/report.ts'
import type { Problem } from '../template/template-model.ts'

/** One size worked out: what it became and what kept it from being smaller. */
export interface ChosenSize {
  readonly piece: string
  readonly path: readonly (string | number)[]
  /** Which length of it: `pocket length`, `wall`. */
  readonly what: string
  readonly value: number
  /** Without rounding to the ruler. */
  readonly unrounded: number
  /** The requirement that limits it, in words. */
  readonly limitedBy: string
}

/** The same task under another choice: tabs turned, another ruler. */
export interface SizingAlternative {
  readonly title: string
  /** Area of all blanks that were sized, mm²; `null` where it does not work out. */
  readonly area: number | null
  readonly sizes: readonly { readonly piece: string; readonly what: string; readonly value: number }[]
  /** Largest clearance above its least, over the axes that were sized, in millimetres. */
  readonly slack: number | null
}

/** Why a set cannot be sized: which requirements conflict, and what would work. */
export interface Infeasible {
  readonly piece: string
  readonly requirement: string
  readonly message: string
  readonly nearest: string | null
}

/** Outcome of sizing. */
export interface Sizing {
  readonly chosen: readonly ChosenSize[]
  /** The set's text with every open size written in place; `null` where sizing failed. */
  readonly text: string | null
  readonly report: Report | null
  readonly area: number
  readonly alternatives: readonly SizingAlternative[]
  readonly infeasible: Infeasible | null
  readonly problems: readonly Problem[]
}
