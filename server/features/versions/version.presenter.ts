import type { z } from 'zod'
import type { changeShape, versionRowShape } from '../../../shared/api/shapes/version-shapes.ts'
import { engineVersion, rulesEdition } from '../../../shared/edition.ts'
import type { VersionCompany } from './version.repository.ts'
import type { Version } from './version.entity.ts'

export type VersionRow = z.output<typeof versionRowShape>

export const presentChange = (version: Version): z.output<typeof changeShape> => ({
  state: version.changeState,
  sentence: version.changeSentence,
  newlyFailing: version.newlyFailing,
  nowPassing: version.nowPassing,
})

export const presentBaseline = (version: Version): VersionRow['baseline'] => ({
  number: version.baselineNumber,
  reason: version.baselineReason,
  sentence: version.baselineSentence,
  chosenBy: version.baselineBy === null ? null : { kind: 'person', name: version.baselineBy },
})

export function presentVersion(version: Version, company: VersionCompany): VersionRow {
  const publication = company.publications.get(version.id)
  return {
    number: version.number,
    branch: version.branch,
    commit: version.commit,
    link: version.link,
    verdict: version.verdict,
    works: version.works,
    counts: version.counts,
    engine: version.engine,
    isOldEngine: version.engine !== engineVersion || version.rules !== rulesEdition,
    digest: version.digest,
    content: version.content,
    asOf: version.asOf,
    pushedAt: version.createdAt.toISOString(),
    pushedBy: { kind: version.actorKind, name: version.actorName },
    baseline: presentBaseline(version),
    change: presentChange(version),
    review: version.reviewState,
    label: publication?.label ?? null,
    isRecalled: publication?.recalledAt != null,
    isLocked: publication !== undefined || version.reviewState !== 'none' || company.locked.has(version.id),
  }
}
