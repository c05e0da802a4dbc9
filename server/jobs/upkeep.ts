import { todayOf } from '../context.ts'
import { announce, setPage } from '../features/notices/announce.ts'
import { KnownFailure } from '../features/review/known-failure.entity.ts'
import { refreshSetState } from '../features/sets/set-state.ts'
import { TemplateSet } from '../features/sets/template-set.entity.ts'
import { Team } from '../features/teams/team.entity.ts'
import { ApiToken } from '../features/tokens/api-token.entity.ts'
import { recordAudit } from '../features/upkeep/record-audit.ts'
import { applyRetention } from '../features/upkeep/retention.service.ts'
import { systemActor } from '../http/caller.ts'
import type { WorkContext } from './job-handler.ts'

const week = 7

/** Warns of tokens that end within a week: their maker, or the owners where that one is gone. */
async function warnOfTokens(context: WorkContext): Promise<void> {
  const { database } = context
  const soon = new Date(context.now().getTime() + week * 86_400_000)
  const tokens = await database.manager
    .createQueryBuilder(ApiToken, 't')
    .where('t.warnedAt is null and t.revokedAt is null and t.expiresAt > :now and t.expiresAt <= :soon', {
      now: context.now(),
      soon,
    })
    .getMany()
  for (const token of tokens)
    await database.transaction(async (manager) => {
      const done = await manager.query<[unknown, number]>(
        'update api_token set warned_at = $2 where id = $1 and warned_at is null',
        [token.id, context.now()],
      )
      if (done[1] !== 1) return
      const team = await manager.findOneBy(Team, { id: token.teamId })
      await announce(context, manager, {
        teamId: token.teamId,
        event: 'token-expiring',
        subject: `The token ${token.name} ends soon`,
        sentence: `The token ${token.name} ends on ${token.expiresAt.toISOString().slice(0, 10)}; pipelines that use it will stop.`,
        page: team === null ? null : `/teams/${team.slug}/tokens`,
        by: null,
        ...(token.createdBy === null ? {} : { only: [token.createdBy] }),
      })
    })
}

/** Warns of accepted failures that lapse within a week, and writes anew the state of sets where one has lapsed. */
async function watchKnownFailures(context: WorkContext): Promise<void> {
  const { database } = context
  const today = todayOf(context)
  const failures: { id: string }[] = await database.manager.query(
    `select id from known_failure where ended_at is null and warned_at is null and until between $1::date and $1::date + $2::int`,
    [today, week],
  )
  for (const { id } of failures)
    await database.transaction(async (manager) => {
      const failure = await manager.findOne(KnownFailure, { where: { id }, lock: { mode: 'pessimistic_write' } })
      if (failure === null || failure.warnedAt !== null) return
      await manager.update(KnownFailure, { id }, { warnedAt: context.now() })
      const set = await manager.findOneBy(TemplateSet, { id: failure.setId })
      const team = await manager.findOneBy(Team, { id: failure.teamId })
      if (set === null || team === null) return
      await announce(context, manager, {
        teamId: failure.teamId,
        event: 'waiver-expiring',
        subject: `${set.title}: a known failure lapses soon`,
        sentence: `That ${failure.fingerprint} fails in ${set.title} is accepted until ${failure.until}.`,
        page: setPage(team, set.name),
        by: null,
      })
    })
  // Only these can change by the passing of a day.
  const lapsed: { setId: string }[] = await database.manager.query(
    `select id as "setId" from template_set where state = 'known-failing'`,
  )
  for (const { setId } of lapsed) await refreshSetState(database.manager, setId, today)
}

/** Warns, a week before, of waivers written in the shown version of a set. */
async function warnOfWaivers(context: WorkContext): Promise<void> {
  const { database } = context
  const inAWeek = new Date(context.now().getTime() + week * 86_400_000).toISOString().slice(0, 10)
  const rows: { teamId: string; slug: string; name: string; title: string; number: number; fingerprint: string }[] =
    await database.manager.query(
      `select s.team_id as "teamId", team.slug, s.name, s.title, v.number, judged.item ->> 'fingerprint' as fingerprint
       from template_set s join team on team.id = s.team_id join version v on v.id = s.shown_version_id
       join version_content c on c.version_id = v.id
       cross join lateral jsonb_array_elements(c.report -> 'verdicts') as judged(item)
       where (v.counts ->> 'waived')::int > 0 and judged.item -> 'waiver' ->> 'until' = $1`,
      [inAWeek],
    )
  for (const row of rows)
    await database.transaction((manager) =>
      announce(context, manager, {
        teamId: row.teamId,
        event: 'waiver-expiring',
        subject: `${row.title}: a waiver ends soon`,
        sentence: `The waiver of ${row.fingerprint} in ${row.title} ends after ${inAWeek}.`,
        page: setPage(row, row.name, row.number),
        by: null,
      }),
    )
}

/** What is done once a day: warnings, lapses, retention, and what is over. */
export async function upkeep(context: WorkContext): Promise<void> {
  const { manager } = context.database
  await warnOfTokens(context)
  await warnOfWaivers(context)
  await watchKnownFailures(context)
  for (const team of await manager.find(Team)) {
    const removed = await applyRetention(manager, team, context.now())
    if (removed > 0)
      await recordAudit(manager, team.id, systemActor, {
        verb: 'removed',
        kind: 'versions',
        name: team.name,
        sentence: `removed ${String(removed)} versions as the team’s retention has it`,
      })
  }
  await manager.query(`delete from session where expire < now() - interval '1 day'`)
  await manager.query(`delete from throttle where expire < $1`, [Date.now() - 86_400_000])
  await manager.query(`delete from account_link where expires_at < now() - interval '30 days'`)
  await manager.query(`delete from notice where created_at < now() - interval '180 days'`)
  await manager.query(`delete from delivery where created_at < now() - interval '60 days'`)
}
