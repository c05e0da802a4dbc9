import { hundredBuilds } from '../../shared/report/hundred-builds.ts'
import type { AxisReport, FitReport } from '../../shared/report/report.ts'
import { sourceInWords } from '../../shared/report/source-words.ts'
import { formatRange } from '../../shared/units/format-length.ts'
import type { RulerUnit } from '../../shared/units/units.ts'
import type { Paint } from './paint.ts'
import { axisIndent, axisNameWidth, besideFigures, clearanceText, type Layout } from './text-layout.ts'
import { wrapText } from './wrap-text.ts'

/**
 * A hundred builds as tally marks in tens: x binds, | goes, o rattles. However many builds a mark stands for, none of
 * the three is rounded away while there is room for it.
 */
export function tally(axis: Pick<AxisReport, 'binds' | 'rattles'>, perMark: number): string {
  const builds = hundredBuilds(axis.binds, axis.rattles)
  const marks = 100 / perMark
  const some = (share: number): number => (share === 0 ? 0 : Math.max(1, Math.round(share / perMark)))
  const held = builds.goes > 0 ? 1 : 0
  const rattles = Math.min(some(builds.rattles), marks - held - (builds.binds > 0 ? 1 : 0))
  const binds = Math.min(some(builds.binds), marks - held - rattles)
  const goes = builds.goes > 0 ? marks - binds - rattles : 0
  // Where nothing goes the two others share what rounding left.
  const all = 'x'.repeat(goes > 0 ? binds : marks - rattles) + '|'.repeat(goes) + 'o'.repeat(rattles)
  return (all.match(/.{1,10}/g) ?? []).join(' ')
}

const paintTally = (text: string, paint: Paint): string => text.replace(/x+/g, paint.bad).replace(/o+/g, paint.wary)

const marks = { pass: 'ok', warn: 'warn', fail: 'FAIL' } as const
const colourOf = (paint: Paint, verdict: 'pass' | 'warn' | 'fail'): ((text: string) => string) =>
  verdict === 'pass' ? paint.good : verdict === 'warn' ? paint.wary : paint.bad

const under = ' '.repeat(axisIndent)

function axisLine(axis: AxisReport, layout: Layout, paint: Paint): string {
  const { units, clearanceWidth, requiredWidth, perMark } = layout
  const name = axis.axis.padEnd(axisNameWidth)
  const has = clearanceText(axis, units).padStart(clearanceWidth)
  const wants = paint.quiet(`wants ${formatRange(axis.required, units).padEnd(requiredWidth)}`)
  return `${under}${name}${has}  ${wants}  ${paintTally(tally(axis, perMark), paint)}`
}

/** What varies most on an axis that does not pass, in words. */
function spreadLines(axis: AxisReport, layout: Layout): readonly string[] {
  const [first] = axis.sources
  if (axis.verdict === 'pass' || first === undefined) return []
  const text = `most of its spread: ${sourceInWords(first.name)} (${String(Math.round(first.share * 100))}\u00a0%)`
  return wrapText(text, layout.width, ' '.repeat(axisIndent + 4))
}

const outOfHundred = (share: number): string => {
  const rounded = Math.round(share * 100)
  return share < 1 && rounded === 100 ? 'more than 99' : share > 0 && rounded === 0 ? 'fewer than 1' : String(rounded)
}

const putInWords = (fit: FitReport): string => {
  const put = fit.count > 1 ? `${String(fit.count)} × ${fit.put}` : fit.put
  return `${put}${fit.holding === null ? '' : ` with ${fit.holding}`} ${fit.relation} ${fit.to}${fit.turned ? ', turned' : ''}`
}

function asides(fit: FitReport, units: RulerUnit): readonly string[] {
  const length = (mm: number): string => besideFigures(mm, units)
  return [
    ...(fit.pack === null || fit.pack.max - fit.pack.min < 0.5
      ? []
      : [`pack ${length(fit.pack.nominal)} high, between ${length(fit.pack.min)} and ${length(fit.pack.max)}`]),
    ...(fit.seat === null
      ? []
      : [
          fit.seat.exposed > 0
            ? `lid rests at ${length(fit.seat.z)}, ${length(fit.seat.exposed)} of the base shows`
            : 'lid reaches the table',
        ]),
    ...(fit.give === null
      ? []
      : [
          `${fit.give.name}: goes down to ${length(fit.give.goesTo)} ${fit.give.bow === null ? 'as its walls lean' : `bowed ${length(fit.give.bow)}`}`,
        ]),
    ...(fit.dependsOnCare ? ['depends on care'] : []),
    ...(fit.scale === null || (fit.scale.min <= 0.9001 && fit.scale.max >= 1.0999)
      ? []
      : [`holds when printed at ${(fit.scale.min * 100).toFixed(1)} % to ${(fit.scale.max * 100).toFixed(1)} %`]),
    ...fit.papers.map(
      (paper) => `in ${paper.stock}: ${marks[paper.verdict]}, ${outOfHundred(paper.closes)} of 100 close`,
    ),
  ]
}

/** The fit's verdict, name and parts; what does not fit into the line goes into the next. */
function headLines(fit: FitReport, layout: Layout, paint: Paint): readonly string[] {
  const mark = colourOf(paint, fit.verdict)(marks[fit.verdict].padEnd(axisIndent - 4))
  const [words, closes] = [putInWords(fit), `${outOfHundred(fit.closes)} of 100 close`]
  const head = `  ${mark}  ${paint.bold(fit.id)}`
  return axisIndent + `${fit.id}  ${words}  ${closes}`.length <= layout.width
    ? [`${head}  ${words}  ${paint.quiet(closes)}`]
    : [head, ...wrapText(`${words}, ${closes}`, layout.width, under)]
}

/** A fit with its clearances, a hundred builds of each, and what varies most where it does not pass. */
export function fitLines(fit: FitReport, layout: Layout, paint: Paint): readonly string[] {
  return [
    ...headLines(fit, layout, paint),
    ...fit.axes.flatMap((axis) => [axisLine(axis, layout, paint), ...spreadLines(axis, layout).map(paint.quiet)]),
    ...asides(fit, layout.units).flatMap((aside) => wrapText(aside, layout.width, under).map(paint.quiet)),
  ]
}
