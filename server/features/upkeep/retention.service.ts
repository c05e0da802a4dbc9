import type { EntityManager } from 'typeorm'
import type { Team } from '../teams/team.entity.ts'

export interface Retention {
  readonly mainDays: number | null
  readonly branchDays: number | null
  readonly branchVersions: number | null
}

/**
 * Versions that may go: too old, or too many of their branch. Never what is published, was reviewed, is or was a
 * baseline, is pinned, was built or invited to be, has comments, or is the latest of the main branch.
 * What only a version that goes was compared with is free the next night.
 */
const expendable = `
  select v.id from version v join template_set s on s.id = v.set_id
  where v.team_id = $1 and (
    (v.branch = $2 and $3::int is not null and v.created_at < $6::timestamptz - make_interval(days => $3))
    or (v.branch <> $2 and $4::int is not null and v.created_at < $6::timestamptz - make_interval(days => $4))
    or (v.branch <> $2 and $5::int is not null and v.number < (
      select min(recent.number) from (
        select number from version where set_id = v.set_id and branch = v.branch order by number desc limit $5) recent)))
  and v.review_state = 'none'
  and s.shown_version_id is distinct from v.id and s.pinned_version_id is distinct from v.id
  and not exists (select 1 from branch_state b where b.version_id = v.id and b.branch = $2)
  and not exists (select 1 from version other where other.baseline_id = v.id)
  and not exists (select 1 from publication p where p.version_id = v.id)
  and not exists (select 1 from decision d where d.version_id = v.id)
  and not exists (select 1 from review_request r where r.version_id = v.id)
  and not exists (select 1 from comment c where c.version_id = v.id)
  and not exists (select 1 from build b where b.version_id = v.id)
  and not exists (select 1 from build_invitation i where i.version_id = v.id)`

const valuesOf = (team: Team, { mainDays, branchDays, branchVersions }: Retention, now: Date): unknown[] => [
  team.id,
  team.mainBranch,
  mainDays,
  branchDays,
  branchVersions,
  now.toISOString(),
]

/** How many versions would go tonight. */
export async function countExpendable(
  manager: EntityManager,
  team: Team,
  retention: Retention,
  now: Date,
): Promise<number> {
  const [row]: { count: number }[] = await manager.query(
    `select count(*)::int as count from (${expendable}) gone`,
    valuesOf(team, retention, now),
  )
  return row?.count ?? 0
}

/** Removes what may go, a batch at a time so that nothing waits long, and texts that nothing names any more. */
export async function applyRetention(manager: EntityManager, team: Team, now: Date): Promise<number> {
  const isKeepingAll = team.mainDays === null && team.branchDays === null && team.branchVersions === null
  let removed = 0
  for (let isMore = !isKeepingAll; isMore;) {
    const [, count] = (await manager.query(
      `delete from version where id in (${expendable} limit 500)`,
      valuesOf(team, team, now),
    )) as [unknown, number]
    removed += count
    isMore = count === 500
  }
  if (removed > 0) {
    await manager.query(
      `delete from push p where team_id = $1 and not exists (select 1 from push_version pv where pv.push_id = p.id)`,
      [team.id],
    )
    await manager.query(
      `delete from source_text t where team_id = $1
         and not exists (select 1 from version_content c where c.team_id = $1 and (c.text_digest = t.digest or c.workspace_digest = t.digest))
         and not exists (select 1 from push p where p.team_id = $1 and p.workspace_digest = t.digest)
         and not exists (select 1 from branch_state b where b.team_id = $1 and b.workspace_digest = t.digest)`,
      [team.id],
    )
  }
  return removed
}
