import { compareReports, hasRegression } from '../../shared/compare/compare-reports.ts'
import { resolveSide } from '../inputs/comparison-sides.ts'
import { exitCode } from '../exit-code.ts'
import { comparisonReporters } from '../reporters/comparison-reporters.ts'
import { UsageError } from '../io.ts'
import { addJudgingOptions, judgingOptions, oneOf, presentationOf, type JudgingOptions } from './check.ts'
import type { CommandModule } from './command-module.ts'

interface Options extends JudgingOptions {
  readonly report: string
  readonly failOn: string
}

export const compareCommand: CommandModule = {
  define(command) {
    command
      .argument('<before>', 'a set, a folder, a report, or a git revision such as main:sets/notes.yaml')
      .argument('<after>', 'the same, to compare it with')
      .option('--report <kind>', 'text, json, markdown', 'text')
      .option('--fail-on <what>', 'what makes the exit code 1: regression, never', 'regression')
    addJudgingOptions(command)
  },

  async execute(io, words, given) {
    const options = given as unknown as Options
    const kind = oneOf('--report', options.report, ['text', 'json', 'markdown'])
    const failOn = oneOf('--fail-on', options.failOn, ['regression', 'never'])
    const judging = judgingOptions(io, options)
    const [beforeWord = '', afterWord = ''] = words
    const before = resolveSide(io, beforeWord, judging)
    const after = resolveSide(io, afterWord, judging)
    const pairs = pairUp(before, after, beforeWord, afterWord)
    const comparisons = pairs.map(([old, now]) => compareReports(old, now))
    const alone = loneSets(before, after)
    io.out(comparisonReporters[kind](comparisons, alone, presentationOf(io, null, comparisons.length === 1)))
    const isInvalid = comparisons.some(
      (comparison) => comparison.before.verdict === 'invalid' || comparison.after.verdict === 'invalid',
    )
    if (isInvalid) return exitCode.unusable
    return failOn === 'regression' && comparisons.some(hasRegression) ? exitCode.failed : exitCode.clean
  },
}

type Reports = ReturnType<typeof resolveSide>

/** Reports of one set on both sides, by the set's name; two single reports are compared whatever they are called. */
function pairUp(
  before: Reports,
  after: Reports,
  beforeWord: string,
  afterWord: string,
): readonly (readonly [Reports[number], Reports[number]])[] {
  const [onlyBefore, onlyAfter] = [before[0], after[0]]
  if (before.length === 1 && after.length === 1 && onlyBefore !== undefined && onlyAfter !== undefined)
    return [[onlyBefore, onlyAfter]]
  const pairs = before.flatMap((old) => {
    const now = after.find((candidate) => candidate.set === old.set)
    return now === undefined ? [] : [[old, now] as const]
  })
  if (pairs.length === 0)
    throw new UsageError(
      `no set is in both ${beforeWord} and ${afterWord}`,
      'Sets are matched by the name behind `set:`.',
    )
  return pairs
}

/** Sets that stand on one side only. */
function loneSets(
  before: Reports,
  after: Reports,
): { readonly added: readonly string[]; readonly removed: readonly string[] } {
  if (before.length === 1 && after.length === 1) return { added: [], removed: [] }
  const names = (reports: Reports): ReadonlySet<string> => new Set(reports.map((report) => report.set))
  const [was, is] = [names(before), names(after)]
  return { added: [...is].filter((name) => !was.has(name)), removed: [...was].filter((name) => !is.has(name)) }
}
