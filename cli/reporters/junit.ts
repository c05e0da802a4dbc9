import type { Report, Verdict } from '../../shared/report/report.ts'
import type { Reporter } from './reporter.ts'

/** Text for an XML attribute or element; characters that XML 1.0 cannot hold become a question mark. */
export const escapeXml = (text: string): string =>
  text
    .replace(
      /[\u0000-\u0008\u000b\u000c\u000e-\u001f\ufffe\uffff]|[\ud800-\udbff](?![\udc00-\udfff])|(?<![\ud800-\udbff])[\udc00-\udfff]/g,
      '?',
    )
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')
    .replace(/[\n\r\t]/g, (character) => `&#${String(character.charCodeAt(0))};`)

const attributes = (values: Readonly<Record<string, string | number>>): string =>
  Object.entries(values)
    .map(([name, value]) => ` ${name}="${escapeXml(String(value))}"`)
    .join('')

const placeOf = (at: Verdict['at']): string => `${at.file}:${String(at.line)}:${String(at.column)}`

function testCase(report: Report, verdict: Verdict): string {
  const opening = `    <testcase${attributes({ name: `${verdict.rule} ${verdict.subject}`, classname: report.set, file: verdict.at.file, line: verdict.at.line })}`
  const body = `${placeOf(verdict.at)}: ${verdict.message}`
  switch (verdict.status) {
    case 'fail':
      return `${opening}>\n      <failure${attributes({ message: verdict.message, type: verdict.rule })}>${escapeXml(body)}</failure>\n    </testcase>`
    case 'crashed':
      return `${opening}>\n      <error${attributes({ message: verdict.message, type: verdict.rule })}>${escapeXml(body)}</error>\n    </testcase>`
    case 'waived':
    case 'unchecked':
      return `${opening}>\n      <skipped${attributes({ message: verdict.waiver === null ? verdict.message : `waived until ${verdict.waiver.until}: ${verdict.waiver.reason}` })}/>\n    </testcase>`
    case 'warn':
    case 'info':
      return `${opening}>\n      <system-out>${escapeXml(`${verdict.status}: ${body}`)}</system-out>\n    </testcase>`
    case 'pass':
      return `${opening}/>`
  }
}

function testSuite(report: Report): string {
  const cases = [
    ...report.errors.map(
      (problem) =>
        `    <testcase${attributes({ name: problem.code, classname: report.set, file: problem.at.file, line: problem.at.line })}>\n      <error${attributes({ message: problem.message, type: problem.code })}>${escapeXml(`${placeOf(problem.at)}: ${problem.message}; ${problem.hint}`)}</error>\n    </testcase>`,
    ),
    ...report.verdicts.map((verdict) => testCase(report, verdict)),
  ]
  const { summary } = report
  const counts = {
    name: report.set,
    tests: cases.length,
    failures: summary.fail,
    errors: summary.crashed + report.errors.length,
    skipped: summary.waived + summary.unchecked,
  }
  return `  <testsuite${attributes(counts)}>\n${cases.join('\n')}${cases.length > 0 ? '\n' : ''}  </testsuite>`
}

/** The common subset of JUnit XML that pipelines read; passing verdicts too. */
export const junitReporter: Reporter = (reports) =>
  `<?xml version="1.0" encoding="UTF-8"?>\n<testsuites name="foldgauge">\n${reports.map(testSuite).join('\n')}\n</testsuites>\n`
