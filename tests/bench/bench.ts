// Speed as ratios measured in one run: medians of interleaved runs, so that a busy machine slows both sides alike.
import { spawnSync } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { parseDocument } from 'yaml'
import { checkSet, checkTemplate } from '../../shared/check-template.ts'
import { compareReports } from '../../shared/compare/compare-reports.ts'
import { sizeSet } from '../../shared/sizing/size-set.ts'
import { readSet } from '../../shared/template/read-set.ts'
import { emptyWorkspace } from '../../shared/template/read-workspace.ts'
import { boxedNotes } from '../support/boxed-notes.ts'
import { exportRows } from './export-rows.ts'

interface Row {
  readonly what: string
  readonly ratio: number
  readonly limit: number | null
  readonly detail: string
}

const rows: Row[] = []
const median = (values: readonly number[]): number =>
  values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN

/** Medians of two things run turn about. */
function interleave(rounds: number, one: () => void, other: () => void): readonly [number, number] {
  const times: [number[], number[]] = [[], []]
  for (let round = 0; round < rounds; round += 1) {
    for (const [index, run] of [one, other].entries()) {
      const from = performance.now()
      run()
      times[index as 0 | 1].push(performance.now() - from)
    }
  }
  return [median(times[0]), median(times[1])]
}

const ms = (value: number): string => (value < 10 ? value.toFixed(2) : value.toFixed(0))

function measure(
  what: string,
  limit: number | null,
  rounds: number,
  one: () => void,
  other: () => void,
  per = 1,
): void {
  const [a, b] = interleave(rounds, one, other)
  rows.push({
    what,
    ratio: a / b / per,
    limit,
    detail: `${ms(a)} ms against ${ms(b)} ms${per === 1 ? '' : `, of ${String(per)}`}`,
  })
}

const root = `${process.cwd()}/`
const text = boxedNotes()
const options = { file: 'set.yaml', asOf: '2026-12-01' }
const workspace = emptyWorkspace()
const times = (count: number, run: () => void) => (): void => {
  for (let index = 0; index < count; index += 1) run()
}

function start(words: readonly string[], input = ''): () => void {
  return () => {
    const result = spawnSync(process.execPath, [...words], { cwd: root, input, stdio: ['pipe', 'ignore', 'ignore'] })
    if (result.status === null || result.status > 1)
      throw new Error(`${words.join(' ')} ended with ${String(result.status)}`)
  }
}

measure(
  'check of one set as a whole process ÷ node -e 0',
  2.2,
  21,
  start(['dist/cli/foldgauge.js', 'check', '-', '--report', 'json'], text),
  start(['-e', '0']),
)

const { set } = readSet(text, 'set.yaml', workspace)
if (set === null) throw new Error('the measured set cannot be read')
times(200, () => checkSet(set, options))()
measure(
  'engine on a read set ÷ yaml parse of its text',
  2,
  41,
  times(20, () => checkSet(set, options)),
  times(20, () => parseDocument(text)),
)
measure(
  'whole check, text to report ÷ yaml parse of its text',
  null,
  41,
  times(20, () => checkTemplate(text, workspace, options)),
  times(20, () => parseDocument(text)),
)
measure(
  'the same with scale windows ÷ without',
  null,
  21,
  times(10, () => checkSet(set, { ...options, scales: true })),
  times(10, () => checkSet(set, options)),
)

const failing = boxedNotes({ lidWall: 15 })
measure(
  'a failing set with fixes ÷ without',
  null,
  9,
  () => checkTemplate(failing, workspace, { ...options, fixes: true }),
  () => checkTemplate(failing, workspace, options),
)
measure(
  'a thousand sets in one process ÷ one',
  1,
  5,
  times(1000, () => checkTemplate(text, workspace, options)),
  times(10, () => checkTemplate(text, workspace, options)),
  100,
)

const [before, after] = [checkTemplate(text, workspace, options), checkTemplate(failing, workspace, options)]
const checkBoth = (): void => {
  checkTemplate(text, workspace, options)
  checkTemplate(failing, workspace, options)
}
measure(
  'compare of two texts ÷ two checks',
  1.2,
  31,
  () => {
    checkBoth()
    compareReports(before, after)
  },
  checkBoth,
)

const open = text
  .replace('pocket: 156 x 112, seam: 12', 'pocket: fit, seam: 12')
  .replace('blank: 200 x 158, wall: 20', 'blank: fit, wall: fit')
  .replace(/blank: 190 x 149, wall: 14/, 'blank: fit, wall: fit, thumb-notch: true')
if (sizeSet(open, workspace, options).report === null) throw new Error('the measured chain cannot be sized')
measure(
  'size of a five-piece chain ÷ a check',
  20,
  11,
  () => sizeSet(open, workspace, options),
  () => checkTemplate(text, workspace, options),
)

const round = (): void => {
  readFileSync('tests/support/boxed-notes.ts')
  checkTemplate(text, workspace, { ...options, fixes: true, scales: true })
}
measure(
  'a watch round ÷ a warm check',
  2,
  31,
  times(5, round),
  times(5, () => checkTemplate(text, workspace, options)),
)

const heap = (): number => {
  globalThis.gc?.()
  return process.memoryUsage().heapUsed / 1e6
}
times(1000, () => checkTemplate(text, workspace, options))()
const early = heap()
times(9000, () => checkTemplate(text, workspace, options))()
const late = heap()
rows.push({
  what: 'memory after ten thousand sets ÷ after one thousand',
  ratio: late / early,
  limit: 1.3,
  detail: `${late.toFixed(1)} MB against ${early.toFixed(1)} MB`,
})

rows.push(...(await exportRows(root, heap)))

const width = Math.max(...rows.map((row) => row.what.length))
for (const { what, ratio, limit, detail } of rows) {
  const held = limit === null ? '' : ratio <= limit ? `within ${String(limit)}` : `OVER ${String(limit)}`
  console.log(`${what.padEnd(width)}  ${ratio.toFixed(2).padStart(7)}  ${held.padEnd(12)} ${detail}`)
}
