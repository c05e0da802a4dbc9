import { todayOf } from '../context.ts'
import { noticesOfComparison } from '../features/notices/version-notices.ts'
import { carryTicks } from '../features/numbers/carry-ticks.ts'
import { keepApproval } from '../features/review/keep-approval.ts'
import { knownFingerprints, refreshSetState } from '../features/sets/set-state.ts'
import { changeOf, type Change } from '../features/versions/change-of.ts'
import { compareVersions } from '../features/versions/compare-versions.service.ts'
import { Version } from '../features/versions/version.entity.ts'
import type { JobData } from './job-kinds.ts'
import type { WorkContext } from './job-handler.ts'

const alone: Change = {
  state: 'first',
  sentence: 'the first version; there is nothing to compare it with',
  newlyFailing: 0,
  nowPassing: 0,
}

/** Compares a version with its baseline, and tells whoever should know. Done once however often it is begun. */
export async function compareVersion(context: WorkContext, { versionId }: JobData['compare-version']): Promise<void> {
  const { database } = context
  const version = await database.manager.findOneBy(Version, { id: versionId })
  if (version?.changeState !== 'pending') return
  const baseline =
    version.baselineId === null ? null : await database.manager.findOneBy(Version, { id: version.baselineId })
  const compared = baseline === null ? null : await compareVersions(context, baseline, version)
  await database.transaction(async (manager) => {
    const known = await knownFingerprints(manager, version.setId, todayOf(context))
    const news = version.failing.filter((fingerprint) => !known.has(fingerprint)).length
    const change = compared === null ? { ...alone, newlyFailing: news } : changeOf(compared.comparison, known)
    const changed = await manager
      .createQueryBuilder()
      .update(Version)
      .set({
        changeState: change.state,
        changeSentence: change.sentence,
        newlyFailing: change.newlyFailing,
        nowPassing: change.nowPassing,
      })
      .where('id = :id and changeState = :pending', { id: version.id, pending: 'pending' })
      .execute()
    if (changed.affected !== 1) return
    Object.assign(version, { changeState: change.state })
    await carryTicks(manager, version)
    await keepApproval(context, manager, version)
    await refreshSetState(manager, version.setId, todayOf(context))
    await noticesOfComparison(context, manager, version, known)
  })
}
