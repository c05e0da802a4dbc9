import type { EntityManager } from 'typeorm'
import type { TemplateSet } from '../sets/template-set.entity.ts'
import type { BaselineFacts, Candidate } from './choose-baseline.ts'

const candidate = `v.id, v.number, v.verdict,
  exists (select 1 from publication p where p.version_id = v.id and p.recalled_at is not null) as "isRecalled"`

const first = async <T>(manager: EntityManager, sql: string, values: readonly unknown[]): Promise<T | null> => {
  const rows: T[] = await manager.query(sql, [...values])
  return rows[0] ?? null
}

const latestOf = (manager: EntityManager, setId: string, branch: string): Promise<Candidate | null> =>
  first(
    manager,
    `select ${candidate} from branch_state b join version v on v.id = b.version_id where b.set_id = $1 and b.branch = $2`,
    [setId, branch],
  )

/** The version of a set on the main branch at the first of some commits that has one. */
const atCommits = (
  manager: EntityManager,
  set: TemplateSet,
  mainBranch: string,
  commits: readonly string[],
): Promise<(Candidate & { commit: string }) | null> =>
  commits.length === 0
    ? Promise.resolve(null)
    : first(
        manager,
        `select ${candidate}, push.commit
         from unnest($4::text[]) with ordinality as wanted(commit, place)
         join push on push.team_id = $1 and push.commit = wanted.commit and push.branch = $3
         join push_version pv on pv.push_id = push.id
         join version v on v.id = pv.version_id and v.set_id = $2
         order by wanted.place, v.number desc limit 1`,
        [set.teamId, set.id, mainBranch, commits],
      )

/** Everything a baseline is chosen by. */
export async function baselineFacts(
  manager: EntityManager,
  set: TemplateSet,
  mainBranch: string,
  push: { readonly branch: string; readonly ancestors: readonly string[]; readonly mergeBase: string | null },
): Promise<BaselineFacts> {
  const pinned =
    set.pinnedVersionId === null
      ? null
      : await first<Candidate>(manager, `select ${candidate} from version v where v.id = $1`, [set.pinnedVersionId])
  return {
    branch: push.branch,
    mainBranch,
    pinned: pinned === null ? null : { ...pinned, by: set.pinnedBy },
    published: await first(
      manager,
      `select ${candidate}, publication.label from publication join version v on v.id = publication.version_id
       where publication.set_id = $1 and publication.recalled_at is null order by publication.published_at desc limit 1`,
      [set.id],
    ),
    mergeBase: await atCommits(manager, set, mainBranch, push.mergeBase === null ? [] : [push.mergeBase]),
    ancestor: await atCommits(manager, set, mainBranch, push.ancestors),
    latestOfMain: await latestOf(manager, set.id, mainBranch),
    latestOfBranch: push.branch === mainBranch ? null : await latestOf(manager, set.id, push.branch),
  }
}
