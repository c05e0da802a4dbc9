import { resolve } from 'node:path'
import { sizeSet } from '../../shared/sizing/size-set.ts'
import type { Sizing } from '../../shared/sizing/sizing.ts'
import { formatLength } from '../../shared/units/format-length.ts'
import type { RulerUnit } from '../../shared/units/units.ts'
import { exitCode } from '../exit-code.ts'
import { findSets } from '../inputs/find-sets.ts'
import { writeWhole } from '../inputs/write-file.ts'
import { UsageError } from '../io.ts'
import { paintFor, printable } from '../reporters/paint.ts'
import { worksSentence } from '../reporters/text.ts'
import { addJudgingOptions, judgingOptions, oneOf, presentationOf, type JudgingOptions } from './check.ts'
import type { CommandModule } from './command-module.ts'

interface Options extends JudgingOptions {
  readonly write?: boolean
  readonly report: string
}

const area = (mm2: number): string => `${(mm2 / 100).toFixed(1)} cm²`
const inUnits = (mm: number, units: RulerUnit): string => formatLength(mm, units, { decimals: 3 })

/** What was chosen and why, the alternatives, the verdict last. */
function describe(sizing: Sizing, name: string, units: RulerUnit, hasColour: boolean): string {
  const paint = paintFor(hasColour)
  const lines = [paint.bold(`Sizes of ${printable(name)}`)]
  for (const { piece, what, value, unrounded, limitedBy } of sizing.chosen) {
    const rounded = Math.abs(value - unrounded) < 0.005 ? '' : ` (${inUnits(unrounded, units)} before rounding)`
    lines.push(
      `  ${`${piece} ${what}`.padEnd(28)} ${inUnits(value, units).padStart(11)}${rounded}`,
      paint.quiet(`      limited by ${limitedBy}`),
    )
  }
  lines.push('', `Paper in the blanks sized: ${area(sizing.area)}`, '', paint.quiet('Otherwise'))
  for (const alternative of sizing.alternatives) {
    lines.push(
      alternative.area === null
        ? `  ${alternative.title}: does not work out`
        : `  ${alternative.title}: ${area(alternative.area)}; ${alternative.sizes.map((size) => `${size.piece} ${size.what} ${inUnits(size.value, alternative.title.startsWith('inches') ? 'in' : units)}`).join(', ')}`,
    )
  }
  return lines.join('\n')
}

export const sizeCommand: CommandModule = {
  define(command) {
    command
      .argument('<set>', 'a set with sizes left open: pocket: fit, blank: fit, wall: fit, inside: fit, size: fit')
      .option('--write', 'write the sizes into the file, comments and layout kept')
      .option('--report <kind>', 'text, json', 'text')
    addJudgingOptions(command)
  },

  async execute(io, words, given) {
    const options = given as unknown as Options
    const kind = oneOf('--report', options.report, ['text', 'json'])
    const [input] = await findSets(words, io)
    if (input === undefined) throw new UsageError('no set was named')
    const sizing = sizeSet(input.text, input.found.workspace, { ...judgingOptions(io, options), file: input.file })
    if (kind === 'json') io.out(`${JSON.stringify(sizing, null, 2)}\n`)
    if (sizing.problems.length > 0) {
      for (const problem of sizing.problems)
        io.err(
          `${problem.at.file}:${String(problem.at.line)}:${String(problem.at.column)}: ${problem.message}\n  ${problem.hint}\n`,
        )
      return exitCode.unusable
    }
    const { infeasible, report } = sizing
    if (kind === 'text' && sizing.chosen.length > 0)
      io.out(`${describe(sizing, input.file, report?.units ?? 'mm', presentationOf(io, null, true).hasColour)}\n\n`)
    if (infeasible !== null) {
      io.err(
        `${input.file}: cannot be sized: ${infeasible.message}\n${infeasible.nearest === null ? '' : `  Nearest that would work: ${infeasible.nearest}.\n`}`,
      )
      return exitCode.failed
    }
    if (report === null || sizing.text === null) return exitCode.failed
    if (kind === 'text')
      io.out(
        sizing.chosen.length === 0 && sizing.text === input.text
          ? 'Nothing is left open; the set was checked as it is.\n'
          : '',
      )
    if (options.write === true) {
      if (input.path === null) io.out(sizing.text)
      else writeWhole(resolve(io.cwd, input.path), sizing.text)
      io.err(`${input.file} ${input.path === null ? 'printed' : 'written'} with its sizes.\n`)
    }
    if (kind === 'text')
      io.out(
        `The set with these sizes ${report.summary.fail > 0 ? 'fails' : 'passes'}: ${String(report.summary.warn)} warnings. ${worksSentence(report)}\n${options.write === true ? '' : 'Run again with --write to put them into the file.\n'}`,
      )
    return report.summary.fail > 0 ? exitCode.failed : exitCode.clean
  },
}
