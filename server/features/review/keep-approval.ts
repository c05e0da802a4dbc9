import { randomUUID } from 'node:crypto'
import type { EntityManager } from 'typeorm'
import type { Context } from '../../context.ts'
import { Team } from '../teams/team.entity.ts'
import { compareVersions } from '../versions/compare-versions.service.ts'
import { Version } from '../versions/version.entity.ts'
import { Decision } from './decision.entity.ts'

/** Where the team wants it so, approvals outlive changes that move no dimension, margin, input or verdict. */
export async function keepApproval(context: Context, manager: EntityManager, version: Version): Promise<void> {
  if (version.reviewState !== 'stale') return
  const team = await manager.findOneBy(Team, { id: version.teamId })
  if (team?.choices.wordsKeepApproval !== true) return
  const approved = await manager
    .createQueryBuilder(Version, 'v')
    .where(`v.setId = :setId and v.number < :number and v.reviewState = 'approved'`, version)
    .orderBy('v.number', 'DESC')
    .limit(1)
    .getOne()
  if (approved === null) return
  const { comparison } = await compareVersions(context, approved, version)
  if (!comparison.isEmpty) return
  const decisions = await manager.findBy(Decision, {
    setId: version.setId,
    content: approved.content,
    decision: 'approve',
  })
  await manager.insert(
    Decision,
    decisions.map((decision) => ({
      ...decision,
      id: randomUUID(),
      versionId: version.id,
      number: version.number,
      content: version.content,
      note: `kept from version ${String(approved.number)}: only words changed`,
      createdAt: context.now(),
    })),
  )
  await manager.update(Version, { id: version.id }, { reviewState: 'approved' })
  version.reviewState = 'approved'
}
