import type { Report } from '../../shared/report/report.ts'
import type { Reporter } from './reporter.ts'

/** A step shows ten annotations of a kind and drops the rest silently, so the tenth says how many there are. */
const most = 9

interface Annotation {
  readonly kind: 'error' | 'warning' | 'notice'
  readonly file: string
  readonly line: number
  readonly column: number
  readonly title: string
  readonly message: string
}

const escapeData = (text: string): string => text.replaceAll('%', '%25').replaceAll('\r', '%0D').replaceAll('\n', '%0A')
const escapeProperty = (text: string): string => escapeData(text).replaceAll(':', '%3A').replaceAll(',', '%2C')

function annotationsOf(report: Report): readonly Annotation[] {
  const problems = report.errors.map((problem) => ({
    kind: 'error' as const,
    file: problem.at.file,
    line: problem.at.line,
    column: problem.at.column,
    title: `${report.set}: ${problem.code}`,
    message: `${problem.message}; ${problem.hint}`,
  }))
  const verdicts = report.verdicts.flatMap((verdict) => {
    const kind =
      verdict.status === 'fail' || verdict.status === 'crashed'
        ? ('error' as const)
        : verdict.status === 'warn'
          ? ('warning' as const)
          : null
    return kind === null
      ? []
      : [
          {
            kind,
            file: verdict.at.file,
            line: verdict.at.line,
            column: verdict.at.column,
            title: `${verdict.rule} ${verdict.subject}`,
            message: verdict.fix === null ? verdict.message : `${verdict.message}. ${verdict.fix.note}`,
          },
        ]
  })
  return [...problems, ...verdicts]
}

const lineOf = (annotation: Annotation): string =>
  `::${annotation.kind} file=${escapeProperty(annotation.file)},line=${String(annotation.line)},col=${String(annotation.column)},title=${escapeProperty(annotation.title)}::${escapeData(annotation.message)}`

/** Workflow commands that mark lines of a change; at most nine of each kind and a line that says how many more. */
export const githubReporter: Reporter = (reports) => {
  const all = reports.flatMap(annotationsOf)
  const lines = (['error', 'warning'] as const).flatMap((kind) => {
    const own = all.filter((annotation) => annotation.kind === kind)
    const rest = own.length - most
    return [
      ...own.slice(0, most).map(lineOf),
      ...(rest > 0 ? [`::${kind} title=foldgauge::and ${String(rest)} more; the full report lists them all`] : []),
    ]
  })
  return lines.length === 0 ? '' : `${lines.join('\n')}\n`
}
