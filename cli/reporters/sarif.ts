import type { Report, ReportProblem, Verdict } from '../../shared/report/report.ts'
import { rules } from '../../shared/rules/rule-registry.ts'
import type { Reporter } from './reporter.ts'

const levels = {
  fail: 'error',
  crashed: 'error',
  warn: 'warning',
  waived: 'warning',
  info: 'note',
  unchecked: 'none',
  pass: 'none',
} as const

/** Half a character cannot be encoded; it becomes the mark for what is unreadable. */
const wellFormed = (text: string): string =>
  text.replaceAll(/[\ud800-\udbff](?![\udc00-\udfff])|(?<![\ud800-\udbff])[\udc00-\udfff]/g, '\ufffd')

/** A path as a relative URI: what lies outside stays absolute. */
export const uriOf = (file: string): string =>
  (file.startsWith('/') ? 'file://' : '') + wellFormed(file).split('/').map(encodeURIComponent).join('/')

const locationOf = (at: Verdict['at']) => ({
  physicalLocation: {
    artifactLocation: { uri: uriOf(at.file), ...(at.file.startsWith('/') ? {} : { uriBaseId: '%SRCROOT%' }) },
    region: {
      startLine: at.line,
      startColumn: at.column,
      endLine: Math.max(at.line, at.endLine),
      endColumn: Math.max(1, at.endColumn),
    },
  },
})

function resultOf(report: Report, verdict: Verdict) {
  return {
    ruleId: verdict.rule,
    level: levels[verdict.status],
    kind:
      verdict.status === 'pass'
        ? 'pass'
        : verdict.status === 'unchecked'
          ? 'notApplicable'
          : verdict.status === 'info'
            ? 'informational'
            : 'fail',
    message: { text: verdict.message },
    locations: [locationOf(verdict.at)],
    partialFingerprints: { 'foldgauge/v1': `${report.set}/${verdict.fingerprint}` },
    ...(verdict.waiver === null
      ? {}
      : {
          suppressions: [
            { kind: 'inSource', justification: `${verdict.waiver.reason} (until ${verdict.waiver.until})` },
          ],
        }),
  }
}

const problemResult = (report: Report, problem: ReportProblem) => ({
  ruleId: problem.code,
  level: 'error',
  kind: 'fail',
  message: { text: `${problem.message}; ${problem.hint}` },
  locations: [locationOf(problem.at)],
  partialFingerprints: { 'foldgauge/v1': `${report.set}/${problem.code}#${problem.at.path.join('.')}` },
})

/** Kind `fail` needs a level; every other kind must have `none`. */
const consistent = <T extends { kind: string; level: string }>(result: T): T =>
  result.kind === 'fail' ? result : { ...result, level: 'none' }

/** SARIF 2.1.0 for code scanning: what passes is left out, fingerprints are the identity of verdicts. */
export const sarifReporter: Reporter = (reports) => {
  const told = reports.flatMap((report) => [
    ...report.errors.map((problem) => problemResult(report, problem)),
    ...report.verdicts
      .filter((verdict) => verdict.status !== 'pass' && verdict.status !== 'unchecked')
      .map((verdict) => consistent(resultOf(report, verdict))),
  ])
  const version = reports[0]?.engine ?? '0.0.0'
  const log = {
    $schema: 'https://json.schemastore.org/sarif-2.1.0.json',
    version: '2.1.0',
    runs: [
      {
        tool: {
          driver: {
            name: 'foldgauge',
            semanticVersion: version,
            rules: rules.map((rule) => ({
              id: rule.id,
              shortDescription: { text: rule.title },
              fullDescription: { text: rule.why },
              help: { text: rule.remedy },
              defaultConfiguration: { level: levels[rule.level] },
            })),
          },
        },
        columnKind: 'utf16CodeUnits',
        originalUriBaseIds: { '%SRCROOT%': { description: { text: 'The folder foldgauge was called in.' } } },
        results: told,
      },
    ],
  }
  return `${JSON.stringify(log, null, 2)}\n`
}
