import { randomUUID } from 'node:crypto'
import type { EntityManager } from 'typeorm'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { pageOfRows, readCursor } from '../../http/cursor.ts'
import { found, unacceptable } from '../../http/refusal.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import { Delivery } from './delivery.entity.ts'
import { PrivateAddressError, refusePrivateHost } from './webhook-address.ts'
import { webhookSecret } from './webhook-secret.ts'
import { Webhook } from './webhook.entity.ts'

async function presentWebhook(manager: EntityManager, hook: Webhook) {
  const last = await manager.findOne(Delivery, {
    where: { webhookId: hook.id },
    order: { createdAt: 'DESC', id: 'DESC' },
  })
  return {
    id: hook.id,
    url: hook.url,
    events: hook.events,
    state: hook.stoppedWhy !== null ? ('stopped' as const) : hook.isOn ? ('active' as const) : ('off' as const),
    why: hook.stoppedWhy,
    createdAt: hook.createdAt.toISOString(),
    lastDelivery:
      last === null ? null : { at: (last.deliveredAt ?? last.createdAt).toISOString(), status: last.status },
  }
}

const getHook = async (manager: EntityManager, teamId: string, id: string): Promise<Webhook> =>
  found(await manager.findOneBy(Webhook, { id, teamId }))

function checkUrl(url: string, isPrivateAllowed: boolean): void {
  try {
    if (!isPrivateAllowed) refusePrivateHost(new URL(url))
  } catch (error) {
    if (error instanceof PrivateAddressError)
      throw unacceptable('private-address', `${error.message}.`, 'Webhooks go to public addresses only.')
    throw error
  }
}

export const webhookRoutes: readonly Route[] = [
  teamRoute(endpoints.webhooks, async ({ access, context: { database } }) => {
    const hooks = await database.manager.find(Webhook, {
      where: { teamId: access.team.id },
      order: { createdAt: 'ASC' },
    })
    return { items: await Promise.all(hooks.map((hook) => presentWebhook(database.manager, hook))) }
  }),
  teamRoute(endpoints.addWebhook, async ({ body, access, context }) => {
    checkUrl(body.url, context.config.ALLOW_PRIVATE_WEBHOOKS)
    const id = randomUUID()
    return context.database.transaction(async (manager) => {
      const events = [...new Set(body.events)]
      await manager.insert(Webhook, { id, teamId: access.team.id, url: body.url, events, createdAt: context.now() })
      await recordAudit(manager, access.team.id, access.actor, {
        verb: 'added',
        kind: 'webhook',
        name: new URL(body.url).host,
        sentence: `added a webhook to ${new URL(body.url).host}`,
      })
      const webhook = await presentWebhook(manager, await getHook(manager, access.team.id, id))
      return { webhook, secret: webhookSecret(context.config, id) }
    })
  }),
  teamRoute(endpoints.changeWebhook, async ({ params, body, access, context: { database } }) => {
    const { manager } = database
    const hook = await getHook(manager, access.team.id, params.webhook)
    const change = {
      ...(body.events === undefined ? {} : { events: [...new Set(body.events)] }),
      ...(body.isOn === undefined ? {} : { isOn: body.isOn, failures: 0, stoppedWhy: null }),
    }
    if (Object.keys(change).length > 0) await manager.update(Webhook, { id: hook.id }, change)
    return presentWebhook(manager, await getHook(manager, access.team.id, hook.id))
  }),
  teamRoute(endpoints.removeWebhook, async ({ params, access, context: { database } }) => {
    await database.transaction(async (manager) => {
      const hook = await getHook(manager, access.team.id, params.webhook)
      await manager.delete(Webhook, { id: hook.id })
      await recordAudit(manager, access.team.id, access.actor, {
        verb: 'removed',
        kind: 'webhook',
        name: new URL(hook.url).host,
        sentence: `removed the webhook to ${new URL(hook.url).host}`,
      })
    })
  }),
  teamRoute(endpoints.deliveries, async ({ params, query, access, context: { database } }) => {
    const hook = await getHook(database.manager, access.team.id, params.webhook)
    const cursor = readCursor<[string, string]>(query.cursor, ['string', 'string'])
    const find = database.manager
      .createQueryBuilder(Delivery, 'd')
      .where('d.webhookId = :id', { id: hook.id })
      .orderBy('d.createdAt', 'DESC')
      .addOrderBy('d.id', 'DESC')
      .limit(query.limit + 1)
    if (cursor !== null)
      find.andWhere('(d.createdAt, d.id) < (:at::timestamptz, :last::uuid)', { at: cursor[0], last: cursor[1] })
    return pageOfRows(
      await find.getMany(),
      query.limit,
      (row) => ({
        id: row.id,
        event: row.event,
        attempts: row.attempts,
        status: row.status,
        state: row.state,
        error: row.error,
        createdAt: row.createdAt.toISOString(),
        deliveredAt: row.deliveredAt?.toISOString() ?? null,
      }),
      (row) => [row.createdAt.toISOString(), row.id],
    )
  }),
]
