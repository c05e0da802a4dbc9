import { randomUUID } from 'node:crypto'
import type { EntityManager } from 'typeorm'
import type { NoticeEvent, NoticeMode } from '../../../shared/api/notice-endpoints.ts'
import type { Role } from '../../../shared/api/permissions.ts'
import type { Context } from '../../context.ts'
import { Team } from '../teams/team.entity.ts'
import { Delivery } from './delivery.entity.ts'
import { Notice } from './notice.entity.ts'
import { usualMode } from './usual-mode.ts'

/** Something that happened and that people may want to know. */
export interface News {
  readonly teamId: string
  readonly event: NoticeEvent
  readonly subject: string
  /** One sentence with name and version. */
  readonly sentence: string
  /** Path on the page. */
  readonly page: string | null
  /** Whoever did it need not be told. */
  readonly by: string | null
  /** Only these; else everybody who chose to know. */
  readonly only?: readonly string[]
  /** For programs. */
  readonly data?: Readonly<Record<string, string | number | null>>
}

interface Listener {
  readonly id: string
  readonly email: string
  readonly role: Role
  readonly mode: NoticeMode | null
}

const listenersOf = (manager: EntityManager, { teamId, event }: News): Promise<Listener[]> =>
  manager.query(
    `select person.id, person.email, m.role, c.mode from membership m join person on person.id = m.person_id
     left join notice_choice c on c.team_id = m.team_id and c.person_id = m.person_id and c.event = $2
     where m.team_id = $1 order by person.id`,
    [teamId, event],
  )

function mailText(publicUrl: string, team: Team, news: News): string {
  const link = news.page === null ? '' : `\n${publicUrl}${news.page}\n`
  return `${news.sentence}\n${link}\nTeam ${team.name}. Choose what you are told:\n${publicUrl}/teams/${team.slug}/notices\n`
}

async function tellPrograms(context: Context, manager: EntityManager, team: Team, news: News): Promise<void> {
  const hooks: { id: string }[] = await manager.query(
    'select id from webhook where team_id = $1 and is_on and stopped_why is null and $2 = any(events)',
    [news.teamId, news.event],
  )
  for (const { id } of hooks) {
    const deliveryId = randomUUID()
    await manager.insert(Delivery, {
      id: deliveryId,
      webhookId: id,
      event: news.event,
      createdAt: context.now(),
      payload: {
        id: deliveryId,
        event: news.event,
        team: team.slug,
        sentence: news.sentence,
        page: news.page === null ? null : `${context.config.PUBLIC_URL}${news.page}`,
        at: context.now().toISOString(),
        ...news.data,
      },
    })
    await context.jobs.add(
      manager,
      'deliver-webhook',
      { deliveryId },
      { teamId: team.id, about: `webhook ${news.event}` },
    )
  }
}

/** Tells everybody who wants to know, in the transaction of what they are told. */
export async function announce(context: Context, manager: EntityManager, news: News): Promise<void> {
  const team = await manager.findOneBy(Team, { id: news.teamId })
  if (team === null) return
  const listeners = (await listenersOf(manager, news))
    .map((listener) => ({ ...listener, mode: listener.mode ?? usualMode(listener.role, news.event) }))
    .filter(({ id, mode }) => mode !== 'off' && id !== news.by && (news.only === undefined || news.only.includes(id)))
  if (listeners.length > 0)
    await manager.insert(
      Notice,
      listeners.map(({ id, mode }) => ({
        id: randomUUID(),
        teamId: team.id,
        personId: id,
        event: news.event,
        subject: news.subject,
        sentence: news.sentence,
        page: news.page,
        isWaiting: mode === 'digest',
        createdAt: context.now(),
      })),
    )
  for (const { email } of listeners.filter(({ mode }) => mode === 'now'))
    await context.jobs.add(
      manager,
      'send-mail',
      { to: email, subject: news.subject, text: mailText(context.config.PUBLIC_URL, team, news) },
      { teamId: team.id, about: `mail “${news.subject}”` },
    )
  await tellPrograms(context, manager, team, news)
}

export const setPage = (team: Pick<Team, 'slug'>, set: string, number?: number): string =>
  `/teams/${team.slug}/sets/${encodeURIComponent(set)}${number === undefined ? '' : `/versions/${String(number)}`}`
