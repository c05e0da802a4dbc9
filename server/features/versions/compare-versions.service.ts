import { randomUUID } from 'node:crypto'
import { compareReports } from '../../../shared/compare/compare-reports.ts'
import type { Comparison } from '../../../shared/compare/comparison.ts'
import { engineVersion, rulesEdition } from '../../../shared/edition.ts'
import type { Report } from '../../../shared/report/report.ts'
import type { Context } from '../../context.ts'
import { judge, readTokens } from './judge.ts'
import { Recheck } from './recheck.entity.ts'
import { VersionComparison } from './version-comparison.entity.ts'
import { textsOf } from './version.repository.ts'
import type { Version } from './version.entity.ts'

const present = `${engineVersion}+${rulesEdition}`

/** A version judged by the present engine: as recorded where that made it, else judged again and kept beside it. */
export async function presentReport(
  context: Context,
  version: Version,
): Promise<{ readonly report: Report; readonly isRechecked: boolean }> {
  const { manager } = context.database
  const texts = await textsOf(manager, version.id)
  if (version.engine === engineVersion && version.rules === rulesEdition)
    return { report: texts.content.report, isRechecked: false }
  const known = await manager.findOneBy(Recheck, { versionId: version.id, engine: engineVersion, rules: rulesEdition })
  if (known !== null) return { report: known.report, isRechecked: true }
  const { workmanship, paper, scale } = texts.content
  const judging = { asOf: version.asOf, workmanship, paper, scale }
  const { report } = await judge(texts.text, version.file, readTokens(texts.workspace), judging)
  await manager
    .createQueryBuilder()
    .insert()
    .into(Recheck)
    .values({
      id: randomUUID(),
      versionId: version.id,
      engine: engineVersion,
      rules: rulesEdition,
      verdict: report.summary.verdict,
      works: report.summary.works,
      report: report as never,
      checkedAt: context.now(),
    })
    .orIgnore()
    .execute()
  return { report, isRechecked: true }
}

export interface StoredComparison {
  readonly comparison: Comparison
  readonly isRechecked: boolean
}

/** The shared comparison of two versions, both judged by the present engine; made once and kept. */
export async function compareVersions(context: Context, before: Version, after: Version): Promise<StoredComparison> {
  const { manager } = context.database
  const key = { beforeId: before.id, afterId: after.id, engine: present }
  const known = await manager.findOneBy(VersionComparison, key)
  if (known !== null) return { comparison: known.comparison, isRechecked: known.isRechecked }
  const old = await presentReport(context, before)
  const now = await presentReport(context, after)
  const comparison = compareReports(old.report, now.report)
  const isRechecked = old.isRechecked || now.isRechecked
  const { sentence } = comparison
  await manager
    .createQueryBuilder()
    .insert()
    .into(VersionComparison)
    .values({ ...key, isRechecked, sentence, comparison: comparison as never, createdAt: context.now() })
    .orIgnore()
    .execute()
  return { comparison, isRechecked }
}
