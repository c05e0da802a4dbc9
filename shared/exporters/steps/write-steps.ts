import type { ExportSet } from '../export-set.ts'
import { cautions, tools } from './cautions.ts'
import type { Step, StepTable } from './step.ts'

const unitWords = (set: ExportSet): string =>
  set.units === 'mm' ? 'All measures are in millimetres.' : 'All measures are in inches.'

const identity = (set: ExportSet): string => `${set.version}, digest ${set.digest}, checked ${set.asOf}`

const draftLine = (set: ExportSet): readonly string[] => (set.draft === null ? [] : [`DRAFT: ${set.draft}`])

const heading = (one: Step, index: number): string =>
  `${String(index + 1)}. ${one.isStop ? 'STOP. ' : ''}${one.title}`.trimEnd()

/** Steps as plain text, one sentence a line, for reading aloud or by a machine. */
export function writeStepsText(set: ExportSet, steps: readonly Step[]): string {
  const tableLines = (table: StepTable | null): readonly string[] =>
    table === null
      ? []
      : table.rows.map((row) => `   ${table.head.map((head, index) => `${head}: ${row[index] ?? ''}`).join('; ')}`)
  const lines = [
    set.title,
    identity(set),
    unitWords(set),
    ...draftLine(set),
    '',
    'Tools',
    ...tools.map((tool) => `- ${tool}`),
    '',
    'Take care',
    ...cautions.map((caution) => `- ${caution}`),
    '',
    'Steps',
    ...steps.flatMap((one, index) => [
      '',
      heading(one, index),
      ...one.sentences.map((sentence) => `   ${sentence}`),
      ...tableLines(one.table),
    ]),
  ]
  return `${lines.join('\n')}\n`
}

const escapeMarkdown = (content: string): string =>
  content.replace(/[\\`*_{}[\]<>#|]/g, (character) => `\\${character}`)

/** Steps as Markdown. */
export function writeStepsMarkdown(set: ExportSet, steps: readonly Step[]): string {
  const table = (made: StepTable): readonly string[] => [
    '',
    `| ${made.head.map(escapeMarkdown).join(' | ')} |`,
    `| ${made.head.map(() => '---:').join(' | ')} |`,
    ...made.rows.map((row) => `| ${row.map(escapeMarkdown).join(' | ')} |`),
  ]
  const lines = [
    `# ${escapeMarkdown(set.title)}`,
    '',
    escapeMarkdown(identity(set)),
    '',
    ...draftLine(set).flatMap((line) => [`**${escapeMarkdown(line)}**`, '']),
    unitWords(set),
    '',
    '## Tools',
    '',
    ...tools.map((tool) => `- ${tool}`),
    '',
    '## Take care',
    '',
    ...cautions.map((caution) => `- ${caution}`),
    '',
    '## Steps',
    ...steps.flatMap((one, index) => [
      '',
      `### ${escapeMarkdown(heading(one, index))}`,
      '',
      ...one.sentences.map((sentence) => `- ${escapeMarkdown(sentence)}`),
      ...(one.table === null ? [] : table(one.table)),
    ]),
  ]
  return `${lines.join('\n')}\n`
}

export const escapeHtml = (content: string): string =>
  content
    .replace(/&/g, '&amp;')
    .replace(/</g, '&lt;')
    .replace(/>/g, '&gt;')
    .replace(/"/g, '&quot;')
    .replace(/'/g, '&#39;')

/** Type large enough for low vision, black on white, one column. */
const styleSheet = (isLarge: boolean): string =>
  `body{font-family:sans-serif;color:#000;background:#fff;max-width:60rem;margin:2rem auto;padding:0 1rem;line-height:1.5;font-size:${isLarge ? '24px' : '17px'}}svg{max-width:100%;height:auto}li{margin:.3em 0}table{border-collapse:collapse}th,td{border:1px solid #000;padding:.2em .6em;text-align:right}.stop{border:3px solid #000;padding:.5em 1em}@media print{article{break-inside:avoid}}`

/**
 * Steps as one HTML page with nothing to fetch.
 * @param figureOf drawing of a step as SVG markup, with the words that stand for it; `null` where it has none
 */
export function writeStepsHtml(
  set: ExportSet,
  steps: readonly Step[],
  options: { readonly isLarge: boolean; readonly figureOf: (one: Step) => string | null },
): string {
  const table = (made: StepTable): string =>
    `<table><thead><tr>${made.head.map((head) => `<th scope="col">${escapeHtml(head)}</th>`).join('')}</tr></thead><tbody>${made.rows
      .map((row) => `<tr>${row.map((cell) => `<td>${escapeHtml(cell)}</td>`).join('')}</tr>`)
      .join('')}</tbody></table>`
  const list = (items: readonly string[]): string =>
    `<ul>${items.map((item) => `<li>${escapeHtml(item)}</li>`).join('')}</ul>`
  const articles = steps.map((one, index) => {
    const figure = options.figureOf(one)
    return `<article${one.isStop ? ' class="stop"' : ''}><h3>${escapeHtml(heading(one, index))}</h3>${list(one.sentences)}${one.table === null ? '' : table(one.table)}${figure === null ? '' : `<figure>${figure}</figure>`}</article>`
  })
  const draft = draftLine(set)
    .map((line) => `<p><strong>${escapeHtml(line)}</strong></p>`)
    .join('')
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1"><title>${escapeHtml(set.title)}</title><style>${styleSheet(options.isLarge)}</style></head>
<body><h1 dir="auto">${escapeHtml(set.title)}</h1><p>${escapeHtml(identity(set))}</p>${draft}<p>${escapeHtml(unitWords(set))}</p>
<h2>Tools</h2>${list(tools)}<h2>Take care</h2>${list(cautions)}<h2>Steps</h2>
${articles.join('\n')}
</body></html>
`
}
