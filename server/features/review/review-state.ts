import type { EntityManager } from 'typeorm'
import { usualChoices } from '../../../shared/api/permissions.ts'
import { Team } from '../teams/team.entity.ts'
import type { ReviewState } from '../versions/version.entity.ts'

interface LastWord {
  readonly decision: 'approve' | 'ask-changes'
  readonly isOwn: boolean
  readonly hasReason: boolean
}

/**
 * What reviewers have said of a content: the last word of each counts, asking for changes outweighs approval, and
 * whoever pushed it cannot approve it alone unless the team lets them or they gave a reason.
 * @returns null where nothing that counts was said
 */
export async function decidedState(
  manager: EntityManager,
  teamId: string,
  setId: string,
  content: string,
): Promise<'approved' | 'changes-asked' | null> {
  const team = await manager.findOneBy(Team, { id: teamId })
  const mayApproveAlone = { ...usualChoices, ...team?.choices }.authorMayApproveAlone
  const words: LastWord[] = await manager.query(
    `select distinct on (coalesce(person_id::text, decided_by))
       decision, is_own as "isOwn", override_reason is not null as "hasReason"
     from decision where set_id = $1 and content = $2
     order by coalesce(person_id::text, decided_by), created_at desc, id`,
    [setId, content],
  )
  if (words.some(({ decision }) => decision === 'ask-changes')) return 'changes-asked'
  return words.some(({ isOwn, hasReason }) => !isOwn || hasReason || mayApproveAlone) ? 'approved' : null
}

/** The review state a new version begins with: decisions on the same content hold, those on an earlier one are stale. */
export async function reviewStateFor(
  manager: EntityManager,
  set: { readonly id: string; readonly teamId: string },
  branch: string,
  content: string,
): Promise<ReviewState> {
  const decided = await decidedState(manager, set.teamId, set.id, content)
  if (decided !== null) return decided
  const before: { review_state: ReviewState }[] = await manager.query(
    'select review_state from version where set_id = $1 and branch = $2 order by number desc limit 1',
    [set.id, branch],
  )
  const state = before[0]?.review_state ?? 'none'
  return state === 'approved' || state === 'stale' ? 'stale' : 'none'
}
