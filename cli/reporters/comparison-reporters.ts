import type { Comparison, VerdictChange } from '../../shared/compare/comparison.ts'
import { formatLength, formatRange } from '../../shared/units/format-length.ts'
import { escapeMarkdown } from './markdown.ts'
import { paintFor, printable, type Paint } from './paint.ts'
import type { Presentation } from './reporter.ts'
import { wrapText } from './wrap-text.ts'

/** Sets that stand on one side only. */
export interface LoneSets {
  readonly added: readonly string[]
  readonly removed: readonly string[]
}

type ComparisonReporter = (comparisons: readonly Comparison[], lone: LoneSets, presentation: Presentation) => string

const length = (mm: number | null): string => (mm === null ? 'none' : formatLength(mm, 'mm', { decimals: 3 }))
const both = (mm: number): string =>
  `${mm < 0 ? '−' : '+'}${length(Math.abs(mm))} (${formatLength(Math.abs(mm), 'in', { decimals: 3 })})`
const share = (value: number): string => `${String(Number((value * 100).toFixed(1)))} %`

const flipWords: Readonly<Record<VerdictChange['flip'], string>> = {
  'newly-failing': 'newly fails',
  'newly-warning': 'newly warns',
  'now-passing': 'now passes',
  milder: 'is milder now',
  'newly-waived': 'is waived now',
  'no-longer-judged': 'is no longer judged',
  added: 'is new',
  removed: 'is gone',
}

const changed = (change: VerdictChange): string => `${change.before ?? 'not there'} → ${change.after ?? 'gone'}`

function textOf(comparison: Comparison, width: number, paint: Paint): readonly string[] {
  const { before, after } = comparison
  const lines = [
    `${paint.bold(printable(after.title))}  ${paint.quiet(`${printable(after.file)} compared with ${printable(before.file)}`)}`,
    paint.bold(comparison.sentence),
  ]
  if (!comparison.isComparable) return lines
  if (comparison.isEmpty) return [...lines, 'Nothing changed.']
  const section = (title: string, rows: readonly string[]): void => {
    if (rows.length > 0) lines.push('', paint.quiet(title), ...rows)
  }
  section(
    'What turned',
    comparison.changes.flatMap((change) => [
      `  ${change.isRegression ? paint.bad(flipWords[change.flip]) : flipWords[change.flip]}  ${printable(change.subject)}  ${paint.quiet(`${change.rule}, ${changed(change)}`)}`,
      ...wrapText(printable(change.message), width, '    '),
      ...(change.causes.length > 0 ? wrapText(`because: ${change.causes.join('; ')}`, width, '    ') : []),
    ]),
  )
  section(
    `Margins that moved (changes under ${length(comparison.noiseFloor.mm)} and ${share(comparison.noiseFloor.share)} are left out)`,
    comparison.margins.map(
      (margin) =>
        `  ${margin.isShrinking ? paint.wary('shrinks') : 'grows  '}  ${`${margin.fit}:${margin.axis}`.padEnd(30)} ${length(margin.clearance.before)} → ${length(margin.clearance.after)}, wants ${formatRange(margin.required, 'mm')}; binds ${share(margin.binds.before)} → ${share(margin.binds.after)}`,
    ),
  )
  section(
    'Sizes that moved',
    comparison.dimensions.map((change) => {
      const by = change.delta === null ? (change.before === null ? 'new' : 'gone') : both(change.delta)
      const on = change.dependents.length > 0 ? paint.quiet(`  used by ${change.dependents.join(', ')}`) : ''
      return `  ${`${change.piece} ${change.what}`.padEnd(32)} ${length(change.before)} → ${length(change.after)}  ${by}${on}`
    }),
  )
  section(
    'Do old and new pieces mate?',
    comparison.matings.map(
      (mating) =>
        `  ${mating.verdict === 'fail' ? paint.bad('no ') : mating.verdict === 'unchecked' ? '?  ' : 'yes'}  ${mating.sentence}`,
    ),
  )
  section(
    'Judged with something else',
    comparison.inputs.map((input) => `  ${input.what}: ${input.before ?? 'none'} → ${input.after ?? 'none'}`),
  )
  lines.push('', `Next version: ${paint.bold(comparison.proposal.step)}, because ${comparison.proposal.why}.`)
  return lines
}

const loneText = (lone: LoneSets): readonly string[] => [
  ...(lone.added.length > 0 ? [`New sets: ${lone.added.join(', ')}`] : []),
  ...(lone.removed.length > 0 ? [`Sets that are gone: ${lone.removed.join(', ')}`] : []),
]

const text: ComparisonReporter = (comparisons, lone, presentation) => {
  const paint = paintFor(presentation.hasColour)
  const width = Math.min(110, Math.max(60, presentation.columns))
  const parts = comparisons.map((comparison) => textOf(comparison, width, paint).join('\n'))
  return `${[...parts, ...loneText(lone)].join('\n\n')}\n`
}

const json: ComparisonReporter = (comparisons, lone, presentation) =>
  `${JSON.stringify(presentation.isSingle ? comparisons[0] : { comparisons, ...lone }, null, 2)}\n`

function markdownOf(comparison: Comparison): readonly string[] {
  const e = escapeMarkdown
  const lines = [
    `## ${e(comparison.after.title)}`,
    '',
    `**${e(comparison.sentence)}** — ${e(comparison.after.file)} compared with ${e(comparison.before.file)}`,
    '',
  ]
  if (!comparison.isComparable || comparison.isEmpty) return lines
  for (const change of comparison.changes) {
    lines.push(
      `- ${change.isRegression ? '**' : ''}${flipWords[change.flip]}${change.isRegression ? '**' : ''} ${e(change.subject)} (${e(changed(change))}): ${e(change.message)}${change.causes.length > 0 ? `; because ${e(change.causes.join('; '))}` : ''}`,
    )
  }
  if (comparison.margins.length > 0) {
    lines.push(
      '',
      '| fit | clearance before | after | wants | binds before | after |',
      '| --- | ---: | ---: | --- | ---: | ---: |',
    )
    for (const margin of comparison.margins)
      lines.push(
        `| ${e(`${margin.fit}:${margin.axis}`)} | ${length(margin.clearance.before)} | ${length(margin.clearance.after)} | ${formatRange(margin.required, 'mm')} | ${share(margin.binds.before)} | ${share(margin.binds.after)} |`,
      )
  }
  if (comparison.dimensions.length > 0) {
    lines.push('', '| size | before | after | change | used by |', '| --- | ---: | ---: | ---: | --- |')
    for (const change of comparison.dimensions)
      lines.push(
        `| ${e(`${change.piece} ${change.what}`)} | ${length(change.before)} | ${length(change.after)} | ${change.delta === null ? '' : both(change.delta)} | ${e(change.dependents.join(', '))} |`,
      )
  }
  for (const mating of comparison.matings) lines.push('', `- ${e(mating.sentence)}`)
  lines.push('', `Next version: **${comparison.proposal.step}**, because ${e(comparison.proposal.why)}.`, '')
  return lines
}

const markdown: ComparisonReporter = (comparisons, lone) =>
  `${[...comparisons.flatMap(markdownOf), ...loneText(lone).map(escapeMarkdown)].join('\n')}\n`

/** How a comparison is written; pure functions, as the reporters of a check are. */
export const comparisonReporters: Readonly<Record<'text' | 'json' | 'markdown', ComparisonReporter>> = {
  text,
  json,
  markdown,
}
