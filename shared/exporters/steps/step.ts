import type { Point } from '../../geometry/shapes.ts'
import type { Millimetres } from '../../units/units.ts'

export type EdgeName = 'left' | 'right' | 'bottom' | 'top'
export type CornerName = 'lower left' | 'lower right' | 'upper left' | 'upper right'

/**
 * What a step does to a sheet, in the measures its sentences give: coordinates across from the left edge and up from the
 * bottom edge of the sheet as cut, the side that is up being the inside.
 */
export type StepAction =
  | {
      readonly do: 'cut-sheet'
      readonly sheet: string
      readonly length: Millimetres
      readonly width: Millimetres
      readonly copies: number
    }
  | {
      readonly do: 'score'
      readonly sheet: string
      readonly edge: EdgeName
      readonly distance: Millimetres
      /** Where along the edge it starts and ends; `null` where it runs right across. */
      readonly part: { readonly from: Millimetres; readonly to: Millimetres } | null
      readonly fold: 'valley' | 'mountain'
    }
  | {
      readonly do: 'score-corner'
      readonly sheet: string
      readonly corner: CornerName
      /** From the corner along the edge that lies level, and along the one that stands up. */
      readonly along: Millimetres
      readonly up: Millimetres
      readonly fold: 'valley' | 'mountain'
    }
  | {
      readonly do: 'score-between'
      readonly sheet: string
      readonly from: Point
      readonly to: Point
      readonly fold: 'valley' | 'mountain'
    }
  | { readonly do: 'cut-away'; readonly sheet: string; readonly points: readonly Point[] }
  | {
      /** The tabs of a tray: along which walls they stay, how much comes off their floor edge, how far both edges lean in. */
      readonly do: 'trim-tabs'
      readonly sheet: string
      readonly at: 'ends' | 'sides'
      readonly trim: Millimetres
      readonly taper: number
    }
  /** Half-round bites in the middle of the rims that have no tabs. */
  | { readonly do: 'thumb-notches'; readonly sheet: string; readonly at: 'ends' | 'sides'; readonly wide: Millimetres }
  /** Notches between neighbouring corner scores, from the edge to where they cross. */
  | { readonly do: 'cut-notches'; readonly sheet: string }
  | { readonly do: 'slit'; readonly sheet: string; readonly from: Point; readonly to: Point }
  | { readonly do: 'fold'; readonly sheet: string }

/** A small picture beside a step. */
export interface StepFigure {
  readonly sheet: string
  readonly stage: 'sheet' | 'scored' | 'cut'
}

export interface StepTable {
  readonly head: readonly string[]
  readonly rows: readonly (readonly string[])[]
}

export interface Step {
  readonly title: string
  readonly sentences: readonly string[]
  readonly actions: readonly StepAction[]
  readonly figure: StepFigure | null
  /** Nothing goes on before what it says is done. */
  readonly isStop: boolean
  readonly table: StepTable | null
}

export const step = (
  title: string,
  sentences: readonly string[],
  more: Partial<Omit<Step, 'title' | 'sentences'>> = {},
): Step => ({
  title,
  sentences,
  actions: more.actions ?? [],
  figure: more.figure ?? null,
  isStop: more.isStop ?? false,
  table: more.table ?? null,
})
