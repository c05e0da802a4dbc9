import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { noticeEvents, type NoticeEvent, type NoticeMode } from '../../../shared/api/notice-endpoints.ts'
import type { Role } from '../../../shared/api/permissions.ts'
import type { Context } from '../../context.ts'
import { pageOfRows, readCursor } from '../../http/cursor.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import { NoticeChoice } from './notice-choice.entity.ts'
import { Notice } from './notice.entity.ts'
import { usualMode } from './usual-mode.ts'

async function choicesOf(context: Context, access: TeamAccess): Promise<Record<NoticeEvent, NoticeMode>> {
  const personId = access.actor.personId ?? ''
  const chosen = await context.database.manager.findBy(NoticeChoice, { teamId: access.team.id, personId })
  const modes = new Map(chosen.map(({ event, mode }) => [event, mode]))
  const role: Role = access.role ?? 'viewer'
  return Object.fromEntries(noticeEvents.map((event) => [event, modes.get(event) ?? usualMode(role, event)])) as Record<
    NoticeEvent,
    NoticeMode
  >
}

export const noticeRoutes: readonly Route[] = [
  teamRoute(endpoints.notices, async ({ query, access, context }) => {
    const cursor = readCursor<[string, string]>(query.cursor, ['string', 'string'])
    const find = context.database.manager
      .createQueryBuilder(Notice, 'n')
      .where('n.personId = :person and n.teamId = :team', { person: access.actor.personId, team: access.team.id })
      .orderBy('n.createdAt', 'DESC')
      .addOrderBy('n.id', 'DESC')
      .limit(query.limit + 1)
    if (cursor !== null)
      find.andWhere('(n.createdAt, n.id) < (:at::timestamptz, :id::uuid)', { at: cursor[0], id: cursor[1] })
    return pageOfRows(
      await find.getMany(),
      query.limit,
      ({ id, event, sentence, page, createdAt }) => ({ id, event, sentence, page, at: createdAt.toISOString() }),
      (row) => [row.createdAt.toISOString(), row.id],
    )
  }),
  teamRoute(endpoints.noticeChoices, ({ access, context }) => choicesOf(context, access)),
  teamRoute(endpoints.chooseNotices, async ({ body, access, context }) => {
    const personId = access.actor.personId ?? ''
    const rows = noticeEvents.map((event) => ({ teamId: access.team.id, personId, event, mode: body[event] }))
    await context.database.manager.upsert(NoticeChoice, rows, ['teamId', 'personId', 'event'])
    return choicesOf(context, access)
  }),
]
