import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { deflateSync } from 'node:zlib'
import PDFDocument from 'pdfkit'
import { judgeSet } from '../../shared/assembly/judge-set.ts'
import { checkSet } from '../../shared/check-template.ts'
import type { LineMark, Page } from '../../shared/drawing/drawing.ts'
import { exportSet } from '../../shared/exporters/export-set.ts'
import { planSteps } from '../../shared/exporters/steps/plan-steps.ts'
import { templateDocument } from '../../shared/exporters/template-document.ts'
import { writePdf } from '../../shared/exporters/pdf/write-pdf.ts'
import { readSet } from '../../shared/template/read-set.ts'
import { emptyWorkspace } from '../../shared/template/read-workspace.ts'
import { boxedNotes } from '../support/boxed-notes.ts'
import { documentOptions } from '../support/export-sets.ts'

export interface BenchRow {
  readonly what: string
  readonly ratio: number
  readonly limit: number | null
  readonly detail: string
}

const median = (values: readonly number[]): number =>
  values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN

async function timed(work: () => unknown): Promise<number> {
  const from = performance.now()
  await work()
  return performance.now() - from
}

/** Medians of two things run turn about. */
async function interleave(
  rounds: number,
  one: () => unknown,
  other: () => unknown,
): Promise<readonly [number, number]> {
  const times: [number[], number[]] = [[], []]
  for (let round = 0; round < rounds; round += 1) {
    times[0].push(await timed(one))
    times[1].push(await timed(other))
  }
  return [median(times[0]), median(times[1])]
}

function documentPages(): readonly Page[] {
  const { set } = readSet(boxedNotes(), 'set.yaml', emptyWorkspace())
  if (set === null) throw new Error('the measured set cannot be read')
  const options = { file: 'set.yaml', asOf: '2026-12-01' }
  const made = exportSet(judgeSet(set, options), checkSet(set, options), 'not published')
  return templateDocument(made, planSteps(made), documentOptions())
}

/** The same lines through a general-purpose writer, packed as it packs by default. */
function writeWithPdfkit(pages: readonly Page[]): Promise<void> {
  return new Promise((done) => {
    const document = new PDFDocument({ autoFirstPage: false })
    document.on('data', () => undefined)
    document.on('end', done)
    const points = 72 / 25.4
    for (const page of pages) {
      document.addPage({ size: [page.width * points, page.height * points], margin: 0 })
      for (const mark of page.marks) {
        if (mark.kind !== 'line') continue
        mark.points.forEach(({ x, y }, index) => {
          if (index === 0) document.moveTo(x * points, y * points)
          else document.lineTo(x * points, y * points)
        })
        if (mark.isClosed) document.closePath()
        document.lineWidth(0.7).stroke()
      }
    }
    document.end()
  })
}

/** Speed of exporting: a page against a general-purpose writer, a whole process against an empty one, memory over many sets. */
export async function exportRows(root: string, heap: () => number): Promise<readonly BenchRow[]> {
  const lines = documentPages().map((page): Page => ({
    ...page,
    marks: page.marks.filter((mark): mark is LineMark => mark.kind === 'line'),
  }))
  const common = {
    title: 'x',
    author: 'x',
    language: 'en',
    fonts: [],
    deflate: (data: Uint8Array) => deflateSync(data, { level: 3 }),
    digest: '00',
    layers: null,
  }
  const [own, general] = await interleave(
    31,
    () => writePdf(lines, common),
    () => writeWithPdfkit(lines),
  )
  const folder = mkdtempSync(join(tmpdir(), 'foldgauge-'))
  writeFileSync(join(folder, 'set.yaml'), boxedNotes())
  const start = (words: readonly string[]) => (): void => {
    const { status } = spawnSync(process.execPath, [...words], { cwd: folder, stdio: 'ignore' })
    if (status !== 0) throw new Error(`${words.join(' ')} ended with ${String(status)}`)
  }
  const words = [
    join(root, 'dist/cli/foldgauge.js'),
    'export',
    'set.yaml',
    '--to',
    'out',
    '--force',
    '--sheet',
    'tabloid',
  ]
  const [whole, empty] = await interleave(15, start(words), start(['-e', '0']))
  rmSync(folder, { recursive: true, force: true })
  const pages = documentPages()
  const exportOnce = async (): Promise<void> => {
    documentPages()
    await writePdf(lines, common)
  }
  for (let index = 0; index < 100; index += 1) await exportOnce()
  const early = heap()
  for (let index = 0; index < 900; index += 1) await exportOnce()
  const late = heap()
  const ms = (value: number): string => `${value.toFixed(value < 10 ? 2 : 0)} ms`
  return [
    {
      what: 'PDF of a set’s lines ÷ the same by pdfkit',
      ratio: own / general,
      limit: 1,
      detail: `${ms(own)} against ${ms(general)}, ${String(pages.length)} pages`,
    },
    {
      what: 'export of a set as a whole process ÷ node -e 0',
      ratio: whole / empty,
      limit: 8,
      detail: `${ms(whole)} against ${ms(empty)}`,
    },
    {
      what: 'memory after a thousand exports ÷ after a hundred',
      ratio: late / early,
      limit: 1.3,
      detail: `${late.toFixed(1)} MB against ${early.toFixed(1)} MB`,
    },
  ]
}
