import type { EntityManager } from 'typeorm'
import type { Context } from '../../context.ts'
import { TemplateSet } from '../sets/template-set.entity.ts'
import { Team } from '../teams/team.entity.ts'
import { BranchState } from '../versions/branch-state.entity.ts'
import type { Version } from '../versions/version.entity.ts'
import { announce, setPage } from './announce.ts'

const some = (names: readonly string[]): string =>
  names.length <= 3 ? names.join(', ') : `${names.slice(0, 3).join(', ')} and ${String(names.length - 3)} more`

const subjectOf = (fingerprint: string): string => fingerprint.replace(/^[^#]*#/, '')

/**
 * Tells of what newly fails and of recovery on the main branch: the first failure and the mending, never “still failing”.
 * @param known fingerprints of accepted failures
 */
export async function noticesOfComparison(
  context: Context,
  manager: EntityManager,
  version: Version,
  known: ReadonlySet<string>,
): Promise<void> {
  const team = await manager.findOneBy(Team, { id: version.teamId })
  const set = await manager.findOneBy(TemplateSet, { id: version.setId })
  if (team === null || set === null) return
  const state = await manager.findOne(BranchState, {
    where: { setId: set.id, branch: version.branch },
    lock: { mode: 'pessimistic_write' },
  })
  if (state?.versionId !== version.id) return
  const failing = version.failing.filter((fingerprint) => !known.has(fingerprint))
  const news = failing.filter((fingerprint) => !state.toldFailing.includes(fingerprint))
  await manager.update(BranchState, { setId: set.id, branch: version.branch }, { toldFailing: failing })
  const common = {
    teamId: team.id,
    page: setPage(team, set.name, version.number),
    by: null,
    data: { set: set.name, version: version.number, branch: version.branch },
  }
  if (version.reviewState === 'stale')
    await announce(context, manager, {
      ...common,
      event: 'approval-stale',
      subject: `${set.title}: the approval was for an earlier version`,
      sentence: `Version ${String(version.number)} of ${set.title} differs from what was approved; it needs to be approved again.`,
    })
  if (version.branch !== team.mainBranch) return
  if (news.length > 0 || (version.verdict === 'invalid' && version.changeState !== 'same'))
    await announce(context, manager, {
      ...common,
      event: 'newly-failing',
      subject: `${set.title} newly fails`,
      sentence:
        version.verdict === 'invalid'
          ? `Version ${String(version.number)} of ${set.title} can no longer be read.`
          : `Version ${String(version.number)} of ${set.title} newly fails: ${some(news.map(subjectOf))}.`,
    })
  else if (failing.length === 0 && state.toldFailing.length > 0)
    await announce(context, manager, {
      ...common,
      event: 'recovered',
      subject: `${set.title} passes again`,
      sentence: `Version ${String(version.number)} of ${set.title} passes again: ${some(state.toldFailing.map(subjectOf))}.`,
    })
}
