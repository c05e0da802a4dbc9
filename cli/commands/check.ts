import type { Command } from 'commander'
import { resolve } from 'node:path'
import type { CheckOptions } from '../../shared/check-options.ts'
import { checkTemplate } from '../../shared/check-template.ts'
import type { Report } from '../../shared/report/report.ts'
import type { RulerUnit } from '../../shared/units/units.ts'
import { readPlainWords, type OptionUsage } from '../context/plain-words.ts'
import { progressOf } from '../context/progress.ts'
import { exitCode, worstExit, type ExitCode } from '../exit-code.ts'
import { findSets, type SetInput } from '../inputs/find-sets.ts'
import { writeWhole } from '../inputs/write-file.ts'
import { UsageError, type Io } from '../io.ts'
import { parseReporter, reporterNames, type ReporterRequest } from '../reporters/reporter-registry.ts'
import type { Presentation } from '../reporters/reporter.ts'
import type { CommandModule } from './command-module.ts'

export interface JudgingOptions {
  readonly workmanship?: string
  readonly paper?: string
  readonly scale?: string
  readonly asOf?: string
}

interface Options extends JudgingOptions {
  readonly report: readonly string[]
  readonly single?: boolean
  readonly failOn: string
  readonly units?: string
  readonly fixes?: boolean
  readonly scales?: boolean
  readonly against?: string
  readonly fix?: boolean
  readonly watch?: boolean
}

const usualColumns = 80

const collect = (value: string, before: readonly string[]): readonly string[] => [...before, value]

/** `97%`, `97 %` or `0.97`: a print scale between a half and double. */
export function parseScale(text: string): number {
  const match = /^(\d+(?:\.\d+)?)\s*(%)?$/.exec(text.trim())
  const value = match === null ? Number.NaN : Number(match[1]) / (match[2] === undefined ? 1 : 100)
  if (!(value >= 0.5 && value <= 2))
    throw new UsageError(`“${text}” is not a print scale`, 'Write it such as --scale 97%, between 50% and 200%.')
  return value
}

/** A real calendar day. */
export function parseDay(text: string): string {
  const match = /^(\d{4})-(\d{2})-(\d{2})$/.exec(text)
  const date = match === null ? null : new Date(`${text}T00:00:00Z`)
  if (date === null || Number.isNaN(date.getTime()) || date.toISOString().slice(0, 10) !== text) {
    throw new UsageError(`“${text}” is not a date`, 'Write it such as --as-of 2026-12-01.')
  }
  return text
}

export function oneOf<T extends string>(option: string, text: string, allowed: readonly T[]): T {
  const found = allowed.find((candidate) => candidate === text)
  if (found === undefined) throw new UsageError(`${option} cannot be “${text}”`, `It is one of ${allowed.join(', ')}.`)
  return found
}

const judgingUsages: readonly OptionUsage[] = [
  { flags: '--workmanship <name>', about: 'judge for these makers: home, studio, die, or your own' },
  { flags: '--paper <stock>', about: 'judge as if every piece were cut from this stock' },
  { flags: '--scale <percent>', about: 'judge printed pieces at this print scale, such as 97%' },
  { flags: '--as-of <date>', about: 'judge waivers as of this day (default: today)' },
]

/** Options that say how a set is judged, shared by every command that judges. */
export function addJudgingOptions(command: Command): Command {
  return judgingUsages.reduce((sum, { flags, about }) => sum.option(flags, about), command)
}

/** The engine's options for a file, from the words on the command line. */
export function judgingOptions(io: Io, options: JudgingOptions): Omit<CheckOptions, 'file'> {
  return {
    asOf: options.asOf === undefined ? io.today() : parseDay(options.asOf),
    ...(options.workmanship === undefined ? {} : { workmanship: options.workmanship }),
    ...(options.paper === undefined ? {} : { paper: options.paper }),
    ...(options.scale === undefined ? {} : { scale: parseScale(options.scale) }),
  }
}

/** Exit code that reports call for. An invalid set is unusable, a crashed rule a defect. */
export function exitOf(reports: readonly Report[], failOn: 'fail' | 'warn'): ExitCode {
  return worstExit(
    reports.map((report) => {
      if (report.summary.crashed > 0) return exitCode.defect
      if (report.summary.verdict === 'invalid') return exitCode.unusable
      if (report.summary.fail > 0) return exitCode.failed
      return failOn === 'warn' && report.summary.warn > 0 ? exitCode.failed : exitCode.clean
    }),
  )
}

/** Judges inputs in order, with progress on a terminal where there are many. */
export function judgeInputs(
  io: Io,
  inputs: readonly SetInput[],
  options: Omit<CheckOptions, 'file'>,
): readonly Report[] {
  const progress = progressOf(io, inputs.length)
  const reports = inputs.map((input, index) => {
    progress.step(index, input.file)
    return checkTemplate(input.text, input.found.workspace, { ...options, file: input.file })
  })
  progress.done()
  return reports.map((report, index) => {
    const twin = inputs.findIndex(
      (other, at) =>
        at < index && other.found.folder === inputs[index]?.found.folder && reports[at]?.set === report.set,
    )
    return twin === -1 || report.summary.verdict === 'invalid' ? report : sameName(report, inputs[twin]?.file ?? '')
  })
}

/** Comparisons match sets by their names, so two of one name in a workspace cannot both be judged. */
function sameName(report: Report, other: string): Report {
  const at = { file: report.file, line: 1, column: 1, endLine: 1, endColumn: 1, path: ['set'] }
  const message = `The set in ${other} is called “${report.set}” too.`
  const hint = 'Give each set of a workspace a name of its own.'
  return {
    ...report,
    errors: [{ code: 'set-name-twice', message, hint, at }],
    summary: { ...report.summary, verdict: 'invalid' },
  }
}

function present(
  io: Io,
  request: ReporterRequest,
  reports: readonly Report[],
  presentation: Presentation,
): Promise<void> {
  return request.load().then((reporter) => {
    if (request.file === null) io.out(reporter(reports, presentation))
    else writeWhole(resolve(io.cwd, request.file), reporter(reports, awayFromTerminal(presentation)))
  })
}

/** The same for a file or another stream, which has no colours and no width of its own. */
const awayFromTerminal = (presentation: Presentation): Presentation => ({
  ...presentation,
  columns: usualColumns,
  hasColour: false,
})

export function presentationOf(io: Io, units: RulerUnit | null, isSingle: boolean): Presentation {
  return {
    units,
    isSingle,
    columns: io.terminal.columns ?? usualColumns,
    hasColour: io.terminal.isTerminal && !io.env['NO_COLOR'] && io.env['TERM'] !== 'dumb',
  }
}

const usages: readonly OptionUsage[] = [
  {
    flags: '--report <kind>',
    about: `${reporterNames.join(', ')}; =FILE writes it there; may be repeated`,
    isRepeated: true,
  },
  { flags: '--single', about: 'with json: one object instead of an array' },
  {
    flags: '--against <what>',
    about: 'also compare with a report, a set, a folder, a git revision, or published or branch:NAME on a server',
  },
  {
    flags: '--fail-on <what>',
    about: 'what makes the exit code 1: fail, warn, or with --against only regression',
    initial: 'fail',
  },
  { flags: '--units <unit>', about: 'figures in mm or in (default: the units of each set; sentences keep those)' },
  { flags: '--fixes', about: 'work out the smallest change that passes (text always does)' },
  { flags: '--fix', about: 'apply the smallest changes that pass to the files' },
  { flags: '--watch', about: 'judge again after every save' },
  { flags: '--scales', about: 'work out the print scales at which each fit holds' },
  ...judgingUsages,
]

export const checkCommand: CommandModule = {
  define(command) {
    command.argument('[paths...]', 'sets, folders, patterns, or - for standard input')
    for (const { flags, about, initial, isRepeated } of usages) {
      if (isRepeated === true) command.option(flags, about, collect, [])
      else command.option(flags, about, initial)
    }
  },

  readPlainly: (words) => readPlainWords(usages, words),

  async execute(io, words, given) {
    const options = given as unknown as Options
    const requests = (options.report.length === 0 ? ['text'] : options.report).map(parseReporter)
    const failOn = oneOf('--fail-on', options.failOn, ['fail', 'warn', 'regression'])
    const units = options.units === undefined ? null : oneOf('--units', options.units, ['mm', 'in'])
    if (requests.filter((request) => request.file === null).length > 1) {
      throw new UsageError(
        'two reports cannot share standard output',
        'Send all but one to files, such as --report junit=results.xml.',
      )
    }
    if (failOn === 'regression' && options.against === undefined) {
      throw new UsageError('--fail-on regression needs something to compare with', 'Add --against FILE.')
    }
    const judging = judgingOptions(io, options)
    const isText = requests.some((request) => request.name === 'text')
    const isTextShown = requests.some((request) => request.name === 'text' && request.file === null)
    const presentation = presentationOf(io, units, options.single === true)
    const round = async (): Promise<ExitCode> => {
      const found = await findSets(words, io)
      if (options.single === true && found.length !== 1) {
        throw new UsageError(`--single is for one set; ${String(found.length)} are named`)
      }
      const inputs = await fixed(io, found, judging, options.fix === true)
      const asked = { fixes: isText || options.fixes === true, scales: isText || options.scales === true }
      const reports = judgeInputs(io, inputs, { ...judging, ...asked })
      for (const request of requests) await present(io, request, reports, presentation)
      return options.against === undefined
        ? exitOf(reports, failOn === 'warn' ? 'warn' : 'fail')
        : exitAgainst(io, options.against, reports, {
            // Judged as far as what it is compared with, or windows of scales would look new.
            judging: { ...judging, scales: asked.scales },
            failOn,
            isTextShown,
            presentation,
          })
    }
    if (options.watch !== true) return round()
    const { watchSets } = await import('./check-watch.ts')
    return watchSets(io, await findSets(words, io), async () => {
      await round()
    })
  },
}

interface AgainstOptions {
  readonly judging: Omit<CheckOptions, 'file'>
  readonly failOn: 'fail' | 'warn' | 'regression'
  readonly isTextShown: boolean
  readonly presentation: Presentation
}

/** Compares with what was named; with `regression` only what got worse counts, not what was already known. */
async function exitAgainst(
  io: Io,
  word: string,
  reports: readonly Report[],
  options: AgainstOptions,
): Promise<ExitCode> {
  const { againstText, gotWorse, holdAgainst, isTold } = await import('./check-against.ts')
  const against = await holdAgainst(io, word, reports, options.judging)
  // Standard output carries the report; beside a report for programs the comparison goes to standard error.
  if (options.isTextShown) io.out(againstText(against, word, options.presentation))
  else io.err(againstText(against, word, awayFromTerminal(options.presentation)))
  if (options.failOn !== 'regression') return exitOf(reports, options.failOn)
  const unusable = exitOf(reports, 'fail')
  if (unusable === exitCode.unusable || unusable === exitCode.defect) return unusable
  if (!isTold(against)) return exitCode.unusable
  return gotWorse(against) ? exitCode.failed : exitCode.clean
}

async function fixed(
  io: Io,
  inputs: readonly SetInput[],
  judging: Omit<CheckOptions, 'file'>,
  isAsked: boolean,
): Promise<readonly SetInput[]> {
  if (!isAsked) return inputs
  const { applyFixes } = await import('./check-fix.ts')
  return inputs.map((input) => applyFixes(io, input, judging))
}
