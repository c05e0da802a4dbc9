import { hundredBuilds } from '../../shared/report/hundred-builds.ts'
import type { AxisReport, FitReport } from '../../shared/report/report.ts'
import { sourceInWords } from '../../shared/report/source-words.ts'
import { formatLength, formatRange } from '../../shared/units/format-length.ts'
import type { RulerUnit } from '../../shared/units/units.ts'
import type { Paint } from './paint.ts'

/** A hundred builds as tally marks: x binds, | goes, o rattles; in tens, a mark for two builds where it is narrow. */
export function tally(axis: Pick<AxisReport, 'binds' | 'rattles'>, columns: number): string {
  const perMark = columns >= 150 ? 1 : columns >= 96 ? 2 : 4
  const builds = hundredBuilds(axis.binds, axis.rattles)
  const marks = 100 / perMark
  const some = (share: number): number => (share === 0 ? 0 : Math.max(1, Math.round(share / perMark)))
  const binds = Math.min(marks, some(builds.binds))
  const rattles = Math.min(marks - binds, some(builds.rattles))
  const all = 'x'.repeat(binds) + '|'.repeat(marks - binds - rattles) + 'o'.repeat(rattles)
  return (all.match(/.{1,10}/g) ?? []).join(' ')
}

const paintTally = (text: string, paint: Paint): string => text.replace(/x+/g, paint.bad).replace(/o+/g, paint.wary)

const marks = { pass: 'ok', warn: 'warn', fail: 'FAIL' } as const
const colourOf = (paint: Paint, verdict: 'pass' | 'warn' | 'fail'): ((text: string) => string) =>
  verdict === 'pass' ? paint.good : verdict === 'warn' ? paint.wary : paint.bad

const lengthIn = (mm: number, units: RulerUnit): string => formatLength(mm, units, { decimals: units === 'mm' ? 2 : 3 })

function axisLine(axis: AxisReport, units: RulerUnit, columns: number, paint: Paint): string {
  const figures = `${axis.axis.padEnd(10)}${lengthIn(axis.clearance.nominal, units).padStart(10)}  ${paint.quiet(`wants ${formatRange(axis.required, units)}`.padEnd(20))}`
  return `         ${figures}  ${paintTally(tally(axis, columns), paint)}`
}

/** What varies most on an axis that does not pass, in words. */
function spreadLine(axis: AxisReport): string | null {
  const [first] = axis.sources
  if (axis.verdict === 'pass' || first === undefined) return null
  return `                   most of its spread: ${sourceInWords(first.name)} (${String(Math.round(first.share * 100))} %)`
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
  const length = (mm: number): string => lengthIn(mm, units)
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

/** A fit with its clearances, a hundred builds of each, and what varies most where it does not pass. */
export function fitLines(fit: FitReport, units: RulerUnit, columns: number, paint: Paint): readonly string[] {
  const mark = colourOf(paint, fit.verdict)(marks[fit.verdict].padEnd(5))
  const closes = `${outOfHundred(fit.closes)} of 100 close`
  return [
    `  ${mark}  ${paint.bold(fit.id)}  ${putInWords(fit)}  ${paint.quiet(closes)}`,
    ...fit.axes.flatMap((axis) => {
      const spread = spreadLine(axis)
      return spread === null
        ? [axisLine(axis, units, columns, paint)]
        : [axisLine(axis, units, columns, paint), paint.quiet(spread)]
    }),
    ...asides(fit, units).map((aside) => paint.quiet(`         ${aside}`)),
  ]
}
