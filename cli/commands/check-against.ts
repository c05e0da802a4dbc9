import { existsSync } from 'node:fs'
import { resolve } from 'node:path'
import { compareReports, hasRegression } from '../../shared/compare/compare-reports.ts'
import type { Comparison } from '../../shared/compare/comparison.ts'
import type { CheckOptions } from '../../shared/check-options.ts'
import type { Report } from '../../shared/report/report.ts'
import { resolveSide } from '../inputs/comparison-sides.ts'
import { type Io } from '../io.ts'
import { comparisonReporters } from '../reporters/comparison-reporters.ts'
import type { Presentation } from '../reporters/reporter.ts'

/** What a check is held against: a comparison for each set that was known before, and the sets that were not. */
export interface Against {
  readonly comparisons: readonly Comparison[]
  readonly newcomers: readonly Report[]
}

/** What a word names: files and revisions here, or what the server has published or on a branch. */
async function sideOf(
  io: Io,
  word: string,
  reports: readonly Report[],
  judging: Omit<CheckOptions, 'file'>,
): Promise<readonly Report[]> {
  const isOnServer = (word === 'published' || word.startsWith('branch:')) && !existsSync(resolve(io.cwd, word))
  if (!isOnServer) return resolveSide(io, word, judging)
  const { namedReports } = await import('../push/named-reports.ts')
  return namedReports(
    io,
    word,
    reports.map(({ set }) => set),
    judging,
  )
}

/** Compares reports with those that a word names, set by set. @throws UsageError where the word names nothing */
export async function holdAgainst(
  io: Io,
  word: string,
  reports: readonly Report[],
  judging: Omit<CheckOptions, 'file'>,
): Promise<Against> {
  const before = await sideOf(io, word, reports, judging)
  const known = (report: Report): Report | undefined =>
    before.length === 1 && reports.length === 1 ? before[0] : before.find((old) => old.set === report.set)
  return {
    comparisons: reports.flatMap((report) => {
      const old = known(report)
      return old === undefined ? [] : [compareReports(old, report)]
    }),
    newcomers: reports.filter((report) => known(report) === undefined),
  }
}

/** False where a set could not be compared: a gate must not open because nobody could tell. */
export const isTold = ({ comparisons }: Against): boolean => comparisons.every((comparison) => comparison.isComparable)

/** Something got worse, or a set nobody knew before fails. Two engines cannot be compared, which passes nothing. */
export const gotWorse = ({ comparisons, newcomers }: Against): boolean =>
  comparisons.some(
    (comparison) => hasRegression(comparison) || (!comparison.isComparable && comparison.after.verdict === 'fail'),
  ) || newcomers.some((report) => report.summary.fail > 0)

/** The comparison under a text report, the sentence that decides last. */
export function againstText(against: Against, word: string, presentation: Presentation): string {
  const { comparisons, newcomers } = against
  const text = comparisonReporters.text(
    comparisons,
    { added: newcomers.map((report) => report.set), removed: [] },
    presentation,
  )
  const verdict = gotWorse(against)
    ? `Worse than ${word}.`
    : isTold(against)
      ? `Nothing is worse than ${word}.`
      : `Nobody can tell whether this is worse than ${word}: not every set could be compared.`
  return `\n${text}\n${verdict}\n`
}
