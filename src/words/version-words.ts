import { plural } from './plural.ts'

type Counts = Readonly<Record<'pass' | 'warn' | 'fail' | 'waived' | 'unchecked' | 'crashed', number>>

/** Words of one version. */
export const versionWords = {
  version: (number: number) => `Version ${String(number)}`,
  branch: 'Branch',
  verdict: 'Verdict',
  works: 'Whole set works',
  worksShare: (share: number) => `${String(Math.round(share * 100))} of 100`,
  baseline: 'Compared with',
  review: 'Review',
  published: 'Published as',
  pushed: 'Pushed',
  engine: 'Engine',
  sentence: (verdict: 'pass' | 'warn' | 'fail' | 'invalid', works: number, counts: Counts, workmanship: string) => {
    if (verdict === 'invalid') return 'The text cannot be understood; what is wrong stands below.'
    const share = `about ${String(Math.round(works * 100))} of 100 ${workmanship}-made sets go together`
    const parts = [
      counts.fail > 0 ? plural(counts.fail, 'failure', 'failures') : null,
      counts.warn > 0 ? plural(counts.warn, 'warning', 'warnings') : null,
      counts.crashed > 0 ? `${plural(counts.crashed, 'rule', 'rules')} crashed` : null,
      counts.waived > 0 ? `${String(counts.waived)} waived` : null,
      counts.unchecked > 0 ? `${String(counts.unchecked)} not checked` : null,
    ].filter((part) => part !== null)
    return parts.length === 0
      ? `Everything passes: ${share}.`
      : `${parts.join(', ')}, ${plural(counts.pass, 'pass', 'passes')}: ${share}.`
  },
  oldEngine: (then: string) =>
    `Judged by engine ${then}, an older one. Figures of two engines are not compared; judge it again to see what the present one says. What was recorded stays.`,
  recheck: 'Judge again with the present engine',
  rechecked: (engine: string, verdict: string) => `Engine ${engine} says: ${verdict}`,
  differs: 'The sender’s engine said something else',
  problems: 'What cannot be understood',
  failing: 'What to change',
  fixBusy: 'Working out the smallest change that passes…',
  fixNone: 'No single length moved by a mark makes this pass.',
  rules: 'Rules',
  rulesNotable: 'what is no plain pass',
  rulesAll: 'every verdict',
  allPass: 'Every rule passes plainly',
  rulesShow: 'Show',
  rule: 'Rule',
  subject: 'About',
  measured: 'Measured',
  limit: 'Limit',
  says: 'Says',
  noRules: 'No verdict of this kind',
  waiver: (reason: string, until: string) => `waived until ${until}: ${reason}`,
  accept: 'Accept for a time',
  acceptTitle: 'Accept a known failure',
  acceptExplain: 'It is carried openly and lapses after the day you choose; nothing is hidden.',
  source: 'Source',
  sourceOf: (file: string) => `Source of ${file}`,
  workspaceSource: 'Workspace',
  line: (line: number) => `line ${String(line)}`,
  downloads: 'Downloads',
  downloadText: 'Set text',
  downloadWorkspace: 'Workspace text',
  downloadReport: 'Report as JSON',
  downloadSvg: 'Blanks as SVG',
  downloadDxf: 'Blanks as DXF',
  downloadNote: 'Files for makers are kept with what is published; these are for the team.',
  tryIt: 'Try changes',
  compare: 'Compare',
  pipeline: 'pipeline',
  comments: (count: number) => plural(count, 'comment', 'comments'),
  comment: 'Comment',
  share: (value: number) => `${(value * 100).toFixed(value > 0.995 || value < 0.005 ? 1 : 0)} %`,
  atLeast: 'at least',
  atMost: 'at most',
  equal: 'equal to',
} as const
