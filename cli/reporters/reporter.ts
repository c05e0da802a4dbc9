import type { Report } from '../../shared/report/report.ts'
import type { RulerUnit } from '../../shared/units/units.ts'

/** How a report is shown, apart from what it says. */
export interface Presentation {
  /** Units to show lengths in; `null` takes each set's own. */
  readonly units: RulerUnit | null
  readonly isSingle: boolean
  readonly columns: number
  readonly hasColour: boolean
}

/** A pure function from reports to text. */
export type Reporter = (reports: readonly Report[], presentation: Presentation) => string
