import { hundredBuilds } from '../../shared/report/hundred-builds.ts'
import type { Report } from '../../shared/report/report.ts'
import { formatLength, formatRange } from '../../shared/units/format-length.ts'
import type { RulerUnit } from '../../shared/units/units.ts'
import type { Reporter } from './reporter.ts'
import { worksSentence } from './text.ts'

/** Text that cannot become markup, a link, a mention or a table cell of its own. */
export const escapeMarkdown = (text: string): string =>
  text
    .replace(/[\u0000-\u001f\u007f]/g, ' ')
    .replace(/[\\`*_{}[\]()#+!|~-]/g, '\\$&')
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('@', '&#64;')

const words = { pass: 'passes', warn: 'passes with warnings', fail: 'fails', invalid: 'cannot be read' } as const

function fitTable(report: Report, units: RulerUnit): readonly string[] {
  const rows = report.fits.flatMap((fit) =>
    fit.axes.map((axis) => {
      const builds = hundredBuilds(axis.binds, axis.rattles)
      return `| ${escapeMarkdown(fit.id)} | ${axis.axis} | ${formatLength(axis.clearance.nominal, units)} | ${formatRange(axis.required, units)} | ${String(builds.binds)} | ${String(builds.goes)} | ${String(builds.rattles)} | ${axis.verdict} |`
    }),
  )
  return rows.length === 0
    ? []
    : [
        '| fit | axis | clearance | wants | bind | go | rattle | verdict |',
        '| --- | --- | ---: | --- | ---: | ---: | ---: | --- |',
        ...rows,
        '',
      ]
}

function troubles(report: Report): readonly string[] {
  const errors = report.errors.map(
    (problem) =>
      `- **error** ${escapeMarkdown(`${problem.at.file}:${String(problem.at.line)}:${String(problem.at.column)}`)} ${escapeMarkdown(problem.message)}; ${escapeMarkdown(problem.hint)}`,
  )
  const verdicts = report.verdicts
    .filter((verdict) => verdict.status === 'fail' || verdict.status === 'warn' || verdict.status === 'crashed')
    .toSorted((a, b) => Number(b.status === 'fail') - Number(a.status === 'fail'))
    .map(
      (verdict) =>
        `- **${verdict.status}** ${escapeMarkdown(verdict.message)}${verdict.fix === null ? '' : ` ${escapeMarkdown(verdict.fix.note)}`}`,
    )
  return [...errors, ...verdicts, ...(errors.length + verdicts.length > 0 ? [''] : [])]
}

/** A summary for a pull request or a job page: the verdict, what is wrong, the figures. */
export const markdownReporter: Reporter = (reports, presentation) =>
  `${reports
    .flatMap((report) => [
      `## ${escapeMarkdown(report.title)} ${words[report.summary.verdict]}`,
      '',
      ...(report.summary.verdict === 'invalid' ? [] : [worksSentence(report), '']),
      ...troubles(report),
      ...fitTable(report, presentation.units ?? report.units),
    ])
    .join('\n')}\n`
