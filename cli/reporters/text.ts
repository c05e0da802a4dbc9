import type { Report, Verdict } from '../../shared/report/report.ts'
import { paintFor, printable, type Paint } from './paint.ts'
import type { Presentation, Reporter } from './reporter.ts'
import { fitLines } from './text-fits.ts'
import { layoutOf, type Layout } from './text-layout.ts'
import { wrapText } from './wrap-text.ts'

const placeOf = (at: Verdict['at']): string => `${printable(at.file)}:${String(at.line)}:${String(at.column)}:`

const words: Readonly<Record<Verdict['status'], string>> = {
  pass: 'ok',
  info: 'note',
  warn: 'warn',
  fail: 'FAIL',
  waived: 'waived',
  unchecked: 'not checked',
  crashed: 'DEFECT',
}

function verdictLines(verdict: Verdict, width: number, paint: Paint): readonly string[] {
  const colour =
    verdict.status === 'fail' || verdict.status === 'crashed'
      ? paint.bad
      : verdict.status === 'warn'
        ? paint.wary
        : paint.quiet
  const lines = [
    `${placeOf(verdict.at)} ${colour(words[verdict.status])} ${paint.quiet(printable(`${verdict.rule} · ${verdict.subject}`))}`,
    ...wrapText(printable(verdict.message), width, '  '),
  ]
  if (verdict.waiver !== null)
    lines.push(
      ...wrapText(`waived until ${verdict.waiver.until}: ${printable(verdict.waiver.reason)}`, width, '  ').map(
        paint.quiet,
      ),
    )
  if (verdict.fix !== null)
    lines.push(
      ...wrapText(
        `Smallest change that passes: ${printable(verdict.fix.note)} (${printable(`${verdict.fix.path.join('.')}: ${verdict.fix.from.trim()} → ${verdict.fix.to}`)})`,
        width,
        '  ',
      ),
    )
  return lines
}

const inOrder: readonly Verdict['status'][] = ['info', 'waived', 'warn', 'fail', 'crashed']

const plural = (count: number, one: string): string => `${String(count)} ${one}`

/** The share of sets that go together, and last of all the verdict. */
function summaryLines(report: Report, width: number, paint: Paint): readonly string[] {
  const { summary } = report
  const counts = [
    ...(summary.crashed > 0 ? [plural(summary.crashed, 'could not be finished')] : []),
    ...(summary.fail > 0 ? [plural(summary.fail, summary.fail === 1 ? 'fails' : 'fail')] : []),
    ...(summary.warn > 0 ? [plural(summary.warn, summary.warn === 1 ? 'warns' : 'warn')] : []),
    ...(summary.waived > 0 ? [plural(summary.waived, 'waived')] : []),
    ...(summary.info > 0 ? [plural(summary.info, summary.info === 1 ? 'note' : 'notes')] : []),
    plural(summary.pass, summary.pass === 1 ? 'passes' : 'pass'),
  ].join(', ')
  const { word, colour } =
    summary.verdict === 'fail' || summary.crashed > 0
      ? { word: 'FAILS', colour: paint.bad }
      : summary.verdict === 'warn'
        ? { word: 'PASSES WITH WARNINGS', colour: paint.wary }
        : { word: 'PASSES', colour: paint.good }
  return [
    ...wrapText(worksSentence(report), width, ''),
    `${colour(paint.bold(word))} ${paint.bold(printable(report.set))}: ${counts}.`,
  ]
}

/** Half-widths are guesses, so the share is told in twentieths. */
export function worksSentence(report: Report): string {
  const { works } = report.summary
  const makers = `${report.workmanship}-made`
  if (works > 0.995) return `Nearly every ${makers} set goes together.`
  if (works < 0.025) return `Hardly any ${makers} set goes together.`
  const twentieths = Math.min(19, Math.max(1, Math.round(works * 20)))
  return `About ${String(twentieths)} in 20 ${makers} sets go together.`
}

/** What the marks of the picture mean. */
const legend = (perMark: number): string =>
  `${perMark === 1 ? 'a build' : `${String(perMark)} builds`} a mark: x binds, | goes, o rattles`

function heading(report: Report, layout: Layout, paint: Paint): readonly string[] {
  const judged = [
    `${report.workmanship} makers`,
    ...(report.paper === null ? [] : [`all cut from ${report.paper}`]),
    ...(report.scale === 1 ? [] : [`printed at ${String(Number((report.scale * 100).toFixed(2)))} %`]),
    `as of ${report.asOf}`,
  ].join(', ')
  return [
    `${paint.bold(printable(report.title))}  ${paint.quiet(printable(report.file))}`,
    ...wrapText(`for ${judged}; ${legend(layout.perMark)}`, layout.width, '').map(paint.quiet),
  ]
}

function invalidLines(report: Report, width: number, paint: Paint): readonly string[] {
  const count = report.errors.length
  return [
    ...report.errors.flatMap((problem) => [
      `${placeOf(problem.at)} ${paint.bad('error')} ${printable(problem.message)}`,
      ...wrapText(printable(problem.hint), width, '  '),
    ]),
    '',
    `${paint.bad(paint.bold('CANNOT BE READ'))} ${paint.bold(printable(report.set))}: ${String(count)} ${count === 1 ? 'error' : 'errors'}, nothing was judged.`,
  ]
}

function reportLines(report: Report, presentation: Presentation, paint: Paint): readonly string[] {
  const layout = layoutOf(report, presentation)
  const { width } = layout
  if (report.summary.verdict === 'invalid') return invalidLines(report, width, paint)
  const unchecked = report.verdicts.filter((verdict) => verdict.status === 'unchecked')
  const told = report.verdicts
    .filter((verdict) => verdict.status !== 'pass' && verdict.status !== 'unchecked')
    .toSorted((a, b) => inOrder.indexOf(a.status) - inOrder.indexOf(b.status))
  return [
    ...heading(report, layout, paint),
    '',
    ...report.fits.flatMap((fit) => fitLines(fit, layout, paint)),
    '',
    ...(unchecked.length === 0
      ? []
      : wrapText(
          `not checked: ${unchecked.map((verdict) => printable(`${verdict.rule} of ${verdict.subject}`)).join(', ')}`,
          width,
          '  ',
        ).map(paint.quiet)),
    ...told.flatMap((verdict) => verdictLines(verdict, width, paint)),
    ...(told.length + unchecked.length > 0 ? [''] : []),
    ...summaryLines(report, width, paint),
  ]
}

function closing(reports: readonly Report[], paint: Paint): readonly string[] {
  if (reports.length < 2) return []
  const count = (verdict: Report['summary']['verdict']): number =>
    reports.filter((report) => report.summary.verdict === verdict).length
  const parts = [
    ...(count('invalid') > 0 ? [`${String(count('invalid'))} cannot be read`] : []),
    ...(count('fail') > 0 ? [`${String(count('fail'))} fail`] : []),
    ...(count('warn') > 0 ? [`${String(count('warn'))} pass with warnings`] : []),
    `${String(count('pass'))} pass`,
  ]
  const troubled = reports
    .filter((report) => report.summary.verdict === 'fail' || report.summary.verdict === 'invalid')
    .map((report) => report.set)
  return [
    '',
    paint.bold(`${String(reports.length)} sets: ${parts.join(', ')}.`),
    ...(troubled.length > 0 ? [`See to: ${troubled.map(printable).join(', ')}`] : []),
  ]
}

/** What an author reads: fits with their figures, then what is wrong in plain words, the verdict last. */
export const textReporter: Reporter = (reports, presentation) => {
  const paint = paintFor(presentation.hasColour)
  const rule = paint.quiet('─'.repeat(Math.min(78, presentation.columns)))
  const parts = reports.flatMap((report, index) => [
    ...(index === 0 ? [] : ['', rule, '']),
    ...reportLines(report, presentation, paint),
  ])
  return `${[...parts, ...closing(reports, paint)].join('\n')}\n`
}
