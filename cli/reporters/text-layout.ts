import type { AxisReport, Report } from '../../shared/report/report.ts'
import { formatLength, formatRange, millimetresPerInch } from '../../shared/units/format-length.ts'
import type { RulerUnit } from '../../shared/units/units.ts'
import type { Presentation } from './reporter.ts'

/** What stands before an axis' clearance: the column of marks and the axis' name. */
export const axisIndent = 9
export const axisNameWidth = 10

/** How many builds a mark of the picture may stand for, the finest first. */
const buildsPerMark = [1, 2, 4, 5, 10] as const

/** Widths that one report is set in, so that its figures stand under one another. */
export interface Layout {
  readonly units: RulerUnit
  /** Characters in a line of text. */
  readonly width: number
  readonly clearanceWidth: number
  readonly requiredWidth: number
  readonly perMark: number
}

/** A mark for each so many of a hundred builds, a space between tens. */
export const pictureWidth = (perMark: number): number => 100 / perMark + Math.ceil(10 / perMark) - 1

/** A clearance with decimals that line up, more of them where it would look like a bound that it is not. */
export function clearanceText(axis: Pick<AxisReport, 'clearance' | 'required'>, units: RulerUnit): string {
  const per = units === 'mm' ? 1 : millimetresPerInch
  const value = axis.clearance.nominal / per
  const bounds = [axis.required.min, axis.required.max].flatMap((bound) => (bound === null ? [] : [bound / per]))
  const usual = units === 'mm' ? 2 : 3
  // Beyond a millionth nothing that a ruler or a paper has is told apart.
  const clear = [usual, usual + 1, usual + 2, 6].find((decimals) =>
    bounds.every((bound) => Math.abs(bound - value) < 1e-9 || bound.toFixed(decimals) !== value.toFixed(decimals)),
  )
  const text = value.toFixed(clear ?? usual)
  return `${/^-0\.?0*$/.test(text) ? text.slice(1) : text} ${units}`
}

/** Widths for a report on a terminal of so many columns. */
export function layoutOf(report: Report, { units: asked, columns }: Presentation): Layout {
  const units = asked ?? report.units
  const axes = report.fits.flatMap((fit) => fit.axes)
  const longest = (texts: readonly string[]): number => Math.max(0, ...texts.map((text) => text.length))
  const clearanceWidth = longest(axes.map((axis) => clearanceText(axis, units)))
  const requiredWidth = longest(axes.map((axis) => formatRange(axis.required, units)))
  const before = axisIndent + axisNameWidth + clearanceWidth + '  wants '.length + requiredWidth + 2
  const perMark = buildsPerMark.find((builds) => pictureWidth(builds) <= columns - before) ?? 10
  return { units, width: Math.min(110, Math.max(40, columns)), clearanceWidth, requiredWidth, perMark }
}

/** A length beside the figures: `2.26 mm`. */
export const besideFigures = (mm: number, units: RulerUnit): string =>
  formatLength(mm, units, { decimals: units === 'mm' ? 2 : 3 })
