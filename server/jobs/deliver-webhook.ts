import { announce } from '../features/notices/announce.ts'
import { Delivery } from '../features/notices/delivery.entity.ts'
import { postWebhook, signatureOf } from '../features/notices/post-webhook.ts'
import { webhookSecret } from '../features/notices/webhook-secret.ts'
import { Webhook } from '../features/notices/webhook.entity.ts'
import { jobKinds, type JobData } from './job-kinds.ts'
import type { WorkContext } from './job-handler.ts'

/** Deliveries that fail for good in a row before an address is no longer told. */
const mostFailures = 5
const attempts = jobKinds['deliver-webhook'].retryLimit + 1

interface Outcome {
  readonly status: number | null
  readonly error: string | null
}

async function post(context: WorkContext, hook: Webhook, delivery: Delivery): Promise<Outcome> {
  const body = JSON.stringify(delivery.payload)
  const signature = signatureOf(webhookSecret(context.config, hook.id), body, context.now())
  try {
    const headers = { signature, event: delivery.event }
    const status = await postWebhook(hook.url, body, headers, context.config.ALLOW_PRIVATE_WEBHOOKS)
    return { status, error: status >= 200 && status < 300 ? null : `the address answered ${String(status)}` }
  } catch (error) {
    return { status: null, error: error instanceof Error ? error.message : String(error) }
  }
}

/** Sends one message to a webhook. What fails is tried again with growing pauses; an address that keeps failing is stopped. */
export async function deliverWebhook(context: WorkContext, { deliveryId }: JobData['deliver-webhook']): Promise<void> {
  const { database } = context
  const delivery = await database.manager.findOneBy(Delivery, { id: deliveryId })
  if (delivery?.state !== 'waiting') return
  const hook = await database.manager.findOneBy(Webhook, { id: delivery.webhookId })
  if (hook === null) return
  const isStopped = !hook.isOn || hook.stoppedWhy !== null
  const { status, error } = isStopped
    ? { status: null, error: 'the webhook is off' }
    : await post(context, hook, delivery)
  const count = delivery.attempts + 1
  // 410 means that nobody is there any more: no point in trying again.
  const isOver = isStopped || status === 410 || count >= attempts
  await database.transaction(async (manager) => {
    if (error === null) {
      const done = { attempts: count, status, error, state: 'delivered' as const, deliveredAt: context.now() }
      await manager.update(Delivery, { id: delivery.id }, done)
      await manager.update(Webhook, { id: hook.id }, { failures: 0 })
      return
    }
    const state = isOver ? ('failed' as const) : ('waiting' as const)
    await manager.update(Delivery, { id: delivery.id }, { attempts: count, status, error, state })
    if (!isOver || isStopped) return
    const failures = hook.failures + 1
    const stoppedWhy = status === 410 || failures >= mostFailures ? error : null
    await manager.update(Webhook, { id: hook.id }, { failures, stoppedWhy })
    if (stoppedWhy !== null)
      await announce(context, manager, {
        teamId: hook.teamId,
        event: 'webhook-stopped',
        subject: 'A webhook was stopped',
        sentence: `The webhook to ${new URL(hook.url).host} was stopped: ${error}.`,
        page: null,
        by: null,
      })
  })
  if (error !== null && !isOver) throw new Error(error)
}
