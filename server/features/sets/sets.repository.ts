import type { EntityManager } from 'typeorm'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { setEndpoints } from '../../../shared/api/set-endpoints.ts'
import type { ReviewState, Version } from '../versions/version.entity.ts'
import type { SetState } from './set-state.ts'

/** What a row of the list is made of. */
export interface SetListRow {
  readonly id: string
  readonly name: string
  readonly title: string
  readonly family: string | null
  readonly tags: string[]
  readonly state: SetState
  readonly stateRank: number
  readonly updatedAt: Date
  readonly photoKey: string | null
  readonly units: 'mm' | 'in'
  readonly number: number
  readonly branch: string
  readonly verdict: Version['verdict']
  readonly works: number
  readonly counts: Version['counts']
  readonly worstFit: Version['worstFit']
  readonly reviewState: ReviewState
  readonly pushedAt: Date
  readonly trend: number[] | null
  readonly published: string | null
  readonly knownFailures: number
  readonly builds: number
}

export interface SetFilter {
  readonly search?: string | undefined
  readonly family?: string | undefined
  readonly state?: SetState | undefined
  readonly branch?: string | undefined
  readonly tag?: string | undefined
}

const like = (words: string): string => `%${words.replace(/[\\%_]/g, '\\$&')}%`

/** Sets with a version, newly failing first, then by last change. With a branch, only those that have it. */
export function listSets(
  manager: EntityManager,
  teamId: string,
  filter: SetFilter,
  after: readonly [number, string, string] | null,
  limit: number,
  today: string,
  only: string | null = null,
): Promise<SetListRow[]> {
  const values: unknown[] = [teamId, today, limit]
  const value = (item: unknown): string => `$${String(values.push(item))}`
  const where = ['s.team_id = $1', 's.shown_version_id is not null']
  if (only !== null) where.push(`s.id = ${value(only)}`)
  if (filter.search !== undefined && filter.search !== '') {
    const words = value(like(filter.search))
    where.push(`(s.name ilike ${words} or s.title ilike ${words} or s.family ilike ${words})`)
  }
  if (filter.family !== undefined) where.push(`s.family = ${value(filter.family)}`)
  if (filter.state !== undefined) where.push(`s.state = ${value(filter.state)}`)
  if (filter.tag !== undefined) where.push(`${value(filter.tag)} = any(s.tags)`)
  if (filter.branch !== undefined)
    where.push(`exists (select 1 from branch_state b where b.set_id = s.id and b.branch = ${value(filter.branch)})`)
  if (after !== null) {
    const [rank, at, id] = after
    const [r, a, i] = [value(rank), value(at), value(id)]
    where.push(
      `(s.state_rank > ${r} or (s.state_rank = ${r} and (s.updated_at < ${a}::timestamptz or (s.updated_at = ${a}::timestamptz and s.id > ${i}::uuid))))`,
    )
  }
  return manager.query(
    `with page as (
       select s.* from template_set s where ${where.join(' and ')}
       order by s.state_rank, s.updated_at desc, s.id limit $3)
     select s.id, s.name, s.title, s.family, s.tags, s.state, s.state_rank as "stateRank", s.updated_at as "updatedAt",
       s.photo_key as "photoKey", v.units, v.number, v.branch, v.verdict, v.works, v.counts, v.worst_fit as "worstFit",
       v.review_state as "reviewState", v.created_at as "pushedAt",
       (select array_agg(t.works order by t.number) from
         (select works, number from version where set_id = s.id and branch = v.branch order by number desc limit 12) t) as trend,
       (select p.label from publication p where p.set_id = s.id and p.recalled_at is null order by p.published_at desc limit 1) as published,
       (select count(*)::int from known_failure k where k.set_id = s.id and k.ended_at is null and k.until >= $2::date) as "knownFailures",
       (select count(*)::int from build b where b.version_id = v.id and b.submitted_at is not null) as builds
     from page s join version v on v.id = s.shown_version_id
     order by s.state_rank, s.updated_at desc, s.id`,
    values,
  )
}

export interface BranchRow {
  readonly branch: string
  readonly number: number
  readonly verdict: Version['verdict']
  readonly changeState: Version['changeState']
  readonly changeSentence: string
  readonly newlyFailing: number
  readonly nowPassing: number
  readonly pushedAt: Date
}

/** Where each branch of a set stands, the last pushed first. */
export const branchesOf = (manager: EntityManager, setId: string): Promise<BranchRow[]> =>
  manager.query(
    `select b.branch, v.number, v.verdict, v.change_state as "changeState", v.change_sentence as "changeSentence",
       v.newly_failing as "newlyFailing", v.now_passing as "nowPassing", v.created_at as "pushedAt"
     from branch_state b join version v on v.id = b.version_id where b.set_id = $1 order by v.created_at desc, b.branch limit 200`,
    [setId],
  )

/** What filters can be set to. */
export async function filterWords(
  manager: EntityManager,
  teamId: string,
): Promise<AnswerOf<(typeof setEndpoints)['setWords']>> {
  const words = async (sql: string): Promise<string[]> =>
    (await manager.query<{ word: string }[]>(sql, [teamId])).map(({ word }) => word)
  return {
    families: await words(
      'select distinct family as word from template_set where team_id = $1 and family is not null order by 1 limit 500',
    ),
    tags: await words('select distinct unnest(tags) as word from template_set where team_id = $1 order by 1 limit 500'),
    branches: await words('select distinct branch as word from branch_state where team_id = $1 order by 1 limit 500'),
  }
}
