import { resolve } from 'node:path'
import { deflateSync } from 'node:zlib'
import { judgeSet } from '../../shared/assembly/judge-set.ts'
import type { CheckOptions } from '../../shared/check-options.ts'
import { checkSet, checkTemplate } from '../../shared/check-template.ts'
import { readPageSize, type PageSize } from '../../shared/drawing/page-size.ts'
import type { BookSet } from '../../shared/exporters/book.ts'
import { editionIn } from '../../shared/exporters/edition.ts'
import { exportSet, type ExportSet } from '../../shared/exporters/export-set.ts'
import { exportSteps } from '../../shared/exporters/export-steps.ts'
import type { ExportedFile } from '../../shared/exporters/exported-file.ts'
import type { DocumentFont } from '../../shared/exporters/pdf/write-pdf.ts'
import { planSteps } from '../../shared/exporters/steps/plan-steps.ts'
import { templateDocument, type DocumentOptions } from '../../shared/exporters/template-document.ts'
import type { Report } from '../../shared/report/report.ts'
import { readSet } from '../../shared/template/read-set.ts'
import type { TemplateSet, Workspace } from '../../shared/template/template-model.ts'
import { nearestName } from '../../shared/units/did-you-mean.ts'
import { parseLength } from '../../shared/units/parse-length.ts'
import type { RulerUnit } from '../../shared/units/units.ts'
import { progressOf } from '../context/progress.ts'
import { exitCode, worstExit, type ExitCode } from '../exit-code.ts'
import { readDocumentFonts } from '../inputs/document-fonts.ts'
import { findSets, type SetInput } from '../inputs/find-sets.ts'
import { writeAll } from '../inputs/write-files.ts'
import { UsageError, type Io } from '../io.ts'
import { addJudgingOptions, judgingOptions, oneOf, type JudgingOptions } from './check.ts'
import type { CommandModule } from './command-module.ts'

const formats = ['pdf', 'svg', 'dxf', 'steps'] as const
type Format = (typeof formats)[number]

interface Options extends JudgingOptions {
  readonly to: string
  readonly format: string
  readonly sheet: string
  readonly margin: string
  readonly piece: readonly string[]
  readonly units?: string
  readonly tile?: boolean
  readonly largePrint?: boolean
  readonly separate?: boolean
  readonly drawDashes?: boolean
  readonly book?: string
  readonly bleed: string
  readonly setVersion: string
  readonly force?: boolean
  readonly evenIfFailing?: boolean
}

interface Ready {
  readonly input: SetInput
  readonly set: ExportSet
  readonly workspace: Workspace
}

/** Quick packing: a page's lines shrink little more at the slower levels. */
const deflate = (data: Uint8Array): Uint8Array => deflateSync(data, { level: 3 })

const collect = (value: string, before: readonly string[]): readonly string[] => [...before, value]

function pageSizeOf(text: string): PageSize {
  const size = readPageSize(text)
  if (!size.ok) throw new UsageError(size.fact, `--sheet: ${size.remedy}.`)
  return size.value
}

function lengthOf(option: string, text: string, most: number): number {
  const length = parseLength(text, 'mm', { allowZero: true })
  if (!length.ok) throw new UsageError(`${option} ${text}: ${length.fact}`, length.remedy)
  if (length.value.mm > most) throw new UsageError(`${option} ${text} is more than ${String(most)} mm`)
  return length.value.mm
}

const formatsOf = (text: string): readonly Format[] => [
  ...new Set(text.split(',').map((word) => oneOf('--format', word.trim(), formats))),
]

function explainProblems(io: Io, report: Report): ExitCode {
  for (const { at, message, hint } of report.errors)
    io.err(`${at.file}:${String(at.line)}:${String(at.column)}: ${message}\n  ${hint}\n`)
  return exitCode.unusable
}

function explainFailures(io: Io, file: string, report: Report): ExitCode {
  const failing = report.verdicts.filter((verdict) => verdict.status === 'fail')
  for (const { at, message } of failing.slice(0, 9))
    io.err(`${at.file}:${String(at.line)}:${String(at.column)}: ${message}\n`)
  if (failing.length > 9) io.err(`and ${String(failing.length - 9)} more\n`)
  io.err(
    `${file} fails its check, so it was not exported. Mend it, or use --even-if-failing, which stamps every page DRAFT.\n`,
  )
  return exitCode.failed
}

/** Pieces are named as in the file; a near miss is told. */
function checkPieceNames(set: TemplateSet, names: readonly string[], file: string): void {
  for (const name of names) {
    if (set.pieces.has(name)) continue
    const near = nearestName(name, [...set.pieces.keys()])
    throw new UsageError(
      `${file} has no piece called ${name}`,
      near === null ? `It has ${[...set.pieces.keys()].join(', ')}.` : `Did you mean ${near}?`,
    )
  }
}

/** A set judged in the unit that was asked for and made ready for exporters; or the exit code it calls for. */
function prepare(io: Io, input: SetInput, options: Options, judging: Omit<CheckOptions, 'file'>): Ready | ExitCode {
  const { workspace } = input.found
  const checking: CheckOptions = { ...judging, file: input.file }
  const asWritten = checkTemplate(input.text, workspace, checking)
  if (asWritten.summary.verdict === 'invalid') return explainProblems(io, asWritten)
  const reading = readSet(input.text, input.file, workspace)
  if (reading.set === null) return exitCode.defect
  checkPieceNames(reading.set, options.piece, input.file)
  const units: RulerUnit =
    options.units === undefined ? reading.set.tokens.units : oneOf('--units', options.units, ['mm', 'in'])
  const isSecondDesign = units !== reading.set.tokens.units
  const set = isSecondDesign ? editionIn(reading.set, units, checking) : reading.set
  const report = isSecondDesign ? checkSet(set, checking) : asWritten
  if (report.summary.crashed > 0) return exitCode.defect
  if (report.summary.fail > 0 && options.evenIfFailing !== true) {
    if (isSecondDesign)
      io.err(
        `Rounded to the marks of ${units === 'mm' ? 'metric rulers' : 'inch rulers'}, this is a second design, and:\n`,
      )
    return explainFailures(io, input.file, report)
  }
  const made = exportSet(judgeSet(set, checking), report, options.setVersion)
  const family = set.family === null ? undefined : workspace.families.get(set.family)
  return {
    input,
    workspace,
    set:
      family === undefined || made.family === null
        ? made
        : { ...made, family: { name: family.name, title: family.title ?? family.name, mark: family.mark } },
  }
}

async function filesOf(
  ready: Ready,
  wanted: readonly Format[],
  options: Options,
  document: DocumentOptions,
  fonts: readonly DocumentFont[],
): Promise<readonly ExportedFile[]> {
  const { set } = ready
  const isSeparate = options.separate === true
  const steps = planSteps(set)
  const files: ExportedFile[] = []
  for (const format of wanted) {
    if (format === 'steps') files.push(...exportSteps(set, steps, document.isLargePrint))
    else if (format === 'pdf') {
      const parts = [
        set.name,
        set.draft === null ? '' : 'draft',
        set.units === 'in' ? 'in' : '',
        ...options.piece,
        document.isLargePrint ? 'large-print' : '',
      ]
      const { exportPdf } = await import('../../shared/exporters/export-pdf.ts')
      const pages = templateDocument(set, steps, document)
      files.push(
        ...(await exportPdf(pages, {
          name: parts.filter((part) => part !== '').join('-'),
          title: set.title,
          author: ready.workspace.title ?? 'Foldgauge',
          digest: set.digest,
          fonts,
          deflate,
          isSeparate,
        })),
      )
    } else {
      const { exportDrawings } = await import('../../shared/exporters/export-drawings.ts')
      files.push(
        ...exportDrawings(set, {
          format,
          isSeparate,
          areDashesDrawn: options.drawDashes === true,
          pieces: document.pieces,
        }),
      )
    }
  }
  return files
}

async function exportBook(
  io: Io,
  sets: readonly Ready[],
  name: string,
  options: Options,
  document: DocumentOptions,
  fonts: readonly DocumentFont[],
): Promise<readonly ExportedFile[]> {
  const members = sets.filter(({ set }) => set.family?.name === name)
  const first = members[0]
  if (first === undefined) {
    const known = [...new Set(sets.flatMap(({ set }) => set.family?.name ?? []))]
    throw new UsageError(
      `no set here is of the family ${name}`,
      known.length === 0 ? 'No set names a family.' : `There are ${known.join(', ')}.`,
    )
  }
  const title = first.set.family?.title ?? name
  const books = members.map(({ set }): BookSet => ({ set, steps: planSteps(set) }))
  const { bookPages } = await import('../../shared/exporters/book.ts')
  const { exportPdf } = await import('../../shared/exporters/export-pdf.ts')
  const pages = bookPages(books, {
    ...document,
    title,
    mark: first.set.family?.mark ?? null,
    bleed: lengthOf('--bleed', options.bleed, 20),
  })
  io.err(
    `${title}: ${String(members.length)} ${members.length === 1 ? 'set' : 'sets'}, ${String(pages.length)} pages.\n`,
  )
  return exportPdf(pages, {
    name: `${name}-book`,
    title,
    author: first.workspace.title ?? 'Foldgauge',
    digest: first.set.digest,
    fonts,
    deflate,
    isSeparate: false,
  })
}

export const exportCommand: CommandModule = {
  define(command) {
    command
      .argument('[paths...]', 'sets, folders or patterns; default: the workspace here')
      .requiredOption('--to <folder>', 'where to write')
      .option('--format <kinds>', `${formats.join(', ')}; several with commas between`, 'pdf')
      .option('--sheet <size>', 'page to print on: a4, letter, 12x12in, or a size such as 330x480mm', 'a4')
      .option('--margin <length>', 'strip along its edges on which the printer prints nothing', '5 mm')
      .option('--piece <name>', 'only this piece; may be repeated', collect, [])
      .option('--units <unit>', 'mm or in: the other edition is rounded to its own marks and checked again')
      .option('--tile', 'true-size tiles for pieces larger than the page')
      .option('--large-print', 'steps and cover in type for low vision')
      .option('--separate', 'every operation in a file of its own')
      .option('--draw-dashes', 'dashes as strokes, for machines that draw no patterns')
      .option('--book <family>', 'the sets of a family in one document')
      .option('--bleed <length>', 'paper printed beyond the trimmed page of a book', '3 mm')
      .option('--set-version <words>', 'what the pages give as their version', 'not published')
      .option('--even-if-failing', 'export a set that fails, every page stamped DRAFT')
      .option('--force', 'replace files that are there already')
    addJudgingOptions(command)
  },

  async execute(io, words, given) {
    const options = given as unknown as Options
    const wanted = formatsOf(options.format)
    const document: DocumentOptions = {
      size: pageSizeOf(options.sheet),
      margin: lengthOf('--margin', options.margin, 25),
      isTiled: options.tile === true,
      isLargePrint: options.largePrint === true,
      pieces: options.piece.length === 0 ? null : options.piece,
    }
    const judging = judgingOptions(io, options)
    const inputs = await findSets(words, io)
    const folder = resolve(io.cwd, options.to)
    const isPrinted = wanted.includes('pdf') || options.book !== undefined
    const fonts = isPrinted ? await readDocumentFonts(inputs.map((input) => input.text).join('')) : []
    const progress = progressOf(io, inputs.length)
    const codes: ExitCode[] = []
    const members: Ready[] = []
    for (const [index, input] of inputs.entries()) {
      progress.step(index, input.file)
      const ready = prepare(io, input, options, judging)
      if (typeof ready === 'number') codes.push(ready)
      else if (options.book !== undefined) members.push(ready)
      else
        for (const path of writeAll(
          folder,
          await filesOf(ready, wanted, options, document, fonts),
          options.force === true,
        ))
          io.out(`${path}\n`)
    }
    progress.done()
    if (options.book !== undefined) {
      const files = await exportBook(io, members, options.book, options, document, fonts)
      for (const path of writeAll(folder, files, options.force === true)) io.out(`${path}\n`)
    }
    return worstExit([exitCode.clean, ...codes])
  },
}
