import { randomUUID } from 'node:crypto'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { todayOf } from '../../context.ts'
import { found, unacceptable } from '../../http/refusal.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import { refreshSetState } from '../sets/set-state.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import { Version } from '../versions/version.entity.ts'
import { findSet } from '../versions/version.repository.ts'
import { KnownFailure } from './known-failure.entity.ts'

type Answer = AnswerOf<typeof endpoints.acceptFailure>

const week = 7 * 86_400_000

/** `failing` are the fingerprints that fail in the version that is shown. */
function stateOf(failure: KnownFailure, today: string, failing: readonly string[]): Answer['state'] {
  if (failure.endedAt !== null) return 'ended'
  if (failure.until < today) return 'lapsed'
  if (!failing.includes(failure.fingerprint)) return 'mended'
  return Date.parse(failure.until) - Date.parse(today) <= week ? 'lapses-soon' : 'active'
}

const present = (failure: KnownFailure, today: string, failing: readonly string[]): Answer => ({
  id: failure.id,
  fingerprint: failure.fingerprint,
  reason: failure.reason,
  until: failure.until,
  acceptedBy: failure.acceptedBy,
  acceptedAt: failure.acceptedAt.toISOString(),
  state: stateOf(failure, today, failing),
})

/** Longest time that a failure may be accepted for: what is to stay longer belongs in the set as a waiver. */
const mostDays = 366

export const knownFailureRoutes: readonly Route[] = [
  teamRoute(endpoints.knownFailures, async ({ params, access, context }) => {
    const { manager } = context.database
    const set = found(await findSet(manager, access.team.id, params.set))
    const shown = set.shownVersionId === null ? null : await manager.findOneBy(Version, { id: set.shownVersionId })
    const failures = await manager.find(KnownFailure, {
      where: { setId: set.id },
      order: { acceptedAt: 'DESC' },
      take: 500,
    })
    return { items: failures.map((failure) => present(failure, todayOf(context), shown?.failing ?? [])) }
  }),
  teamRoute(endpoints.acceptFailure, async ({ params, body, access, context }) => {
    const today = todayOf(context)
    if (body.until < today)
      throw unacceptable('day-over', `${body.until} is over already.`, 'Name a day from today on.')
    if (Date.parse(body.until) - Date.parse(today) > mostDays * 86_400_000)
      throw unacceptable(
        'too-long',
        'A failure can be accepted for a year at most.',
        'Accept it again then, or waive it in the set.',
      )
    return context.database.transaction(async (manager) => {
      const set = found(await findSet(manager, access.team.id, params.set))
      const shown = set.shownVersionId === null ? null : await manager.findOneBy(Version, { id: set.shownVersionId })
      if (!(shown?.failing ?? []).includes(body.fingerprint))
        throw unacceptable(
          'not-failing',
          `${body.fingerprint} does not fail in ${set.name}.`,
          'Only what fails can be accepted.',
        )
      const id = randomUUID()
      await manager.insert(KnownFailure, {
        id,
        teamId: access.team.id,
        setId: set.id,
        fingerprint: body.fingerprint,
        reason: body.reason,
        until: body.until,
        acceptedBy: access.actor.name,
        acceptedAt: context.now(),
      })
      await refreshSetState(manager, set.id, today)
      await recordAudit(manager, access.team.id, access.actor, {
        verb: 'accepted',
        kind: 'failure',
        name: `${set.name}: ${body.fingerprint}`,
        sentence: `accepted until ${body.until} that ${body.fingerprint} fails in ${set.name}: ${body.reason}`,
      })
      return present(found(await manager.findOneBy(KnownFailure, { id })), today, shown?.failing ?? [])
    })
  }),
  teamRoute(endpoints.endFailure, async ({ params, access, context }) => {
    await context.database.transaction(async (manager) => {
      const set = found(await findSet(manager, access.team.id, params.set))
      const failure = found(await manager.findOneBy(KnownFailure, { id: params.failure, setId: set.id }))
      await manager.update(KnownFailure, { id: failure.id }, { endedAt: context.now() })
      await refreshSetState(manager, set.id, todayOf(context))
      await recordAudit(manager, access.team.id, access.actor, {
        verb: 'ended',
        kind: 'failure',
        name: `${set.name}: ${failure.fingerprint}`,
        sentence: `no longer accepts that ${failure.fingerprint} fails in ${set.name}`,
      })
    })
  }),
]
