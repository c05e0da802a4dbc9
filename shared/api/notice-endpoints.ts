import { z } from 'zod'
import { defineEndpoint, teamMay } from './define-endpoint.ts'
import { pageOf, pagingShape } from './paging.ts'
import { words } from './shapes/words.ts'

const inTeam = z.strictObject({ team: words.slug })

/** What is worth telling somebody; never “still failing”, never “all passed”. */
export const noticeEvents = [
  'newly-failing',
  'recovered',
  'review-asked',
  'approved',
  'changes-asked',
  'approval-stale',
  'build-reported',
  'waiver-expiring',
  'token-expiring',
  'published',
  'erratum',
  'recalled',
  'webhook-stopped',
] as const
export type NoticeEvent = (typeof noticeEvents)[number]

export const noticeModes = ['now', 'digest', 'off'] as const
export type NoticeMode = (typeof noticeModes)[number]

const mode = z.enum(noticeModes)
const choicesShape = z
  .strictObject(Object.fromEntries(noticeEvents.map((event) => [event, mode])) as Record<NoticeEvent, typeof mode>)
  .meta({ id: 'NoticeChoices' })

const noticeShape = z
  .strictObject({
    id: words.id,
    event: z.enum(noticeEvents),
    sentence: z.string(),
    page: z.string().nullable(),
    at: words.moment,
  })
  .meta({ id: 'Notice' })

const webhookShape = z
  .strictObject({
    id: words.id,
    url: z.string(),
    events: z.array(z.enum(noticeEvents)),
    state: z.enum(['active', 'stopped', 'off']),
    why: z.string().nullable().describe('why it was stopped'),
    createdAt: words.moment,
    lastDelivery: z.strictObject({ at: words.moment, status: z.int().nullable() }).nullable(),
  })
  .meta({ id: 'Webhook' })

const deliveryShape = z
  .strictObject({
    id: words.id,
    event: z.string(),
    attempts: z.int(),
    status: z.int().nullable(),
    state: z.enum(['waiting', 'delivered', 'failed']),
    error: z.string().nullable(),
    createdAt: words.moment,
    deliveredAt: words.moment.nullable(),
  })
  .meta({ id: 'Delivery' })

const hookPath = inTeam.extend({ webhook: words.id })
const events = z.array(z.enum(noticeEvents)).min(1)

/** Notices to people and to other programs. */
export const noticeEndpoints = {
  notices: defineEndpoint('notices', 'get', '/api/teams/{team}/notices', {
    group: 'Notices',
    summary: 'The own notices, newest first',
    access: teamMay('notices:choose'),
    params: inTeam,
    query: z.strictObject(pagingShape),
    answer: pageOf(noticeShape),
  }),
  noticeChoices: defineEndpoint('noticeChoices', 'get', '/api/teams/{team}/notice-choices', {
    group: 'Notices',
    summary: 'What the signed-in person is told, at once or once a day',
    access: teamMay('notices:choose'),
    params: inTeam,
    answer: choicesShape,
  }),
  chooseNotices: defineEndpoint('chooseNotices', 'put', '/api/teams/{team}/notice-choices', {
    group: 'Notices',
    summary: 'Choose it',
    access: teamMay('notices:choose'),
    params: inTeam,
    body: choicesShape,
    answer: choicesShape,
  }),
  webhooks: defineEndpoint('webhooks', 'get', '/api/teams/{team}/webhooks', {
    group: 'Webhooks',
    summary: 'Addresses that are told',
    access: teamMay('webhooks:manage'),
    params: inTeam,
    answer: z.strictObject({ items: z.array(webhookShape) }),
  }),
  addWebhook: defineEndpoint('addWebhook', 'post', '/api/teams/{team}/webhooks', {
    group: 'Webhooks',
    summary: 'Add an address; the secret it is signed with is in this answer and nowhere else',
    access: teamMay('webhooks:manage'),
    params: inTeam,
    body: z.strictObject({ url: words.link, events }),
    answer: z.strictObject({ webhook: webhookShape, secret: z.string() }),
  }),
  changeWebhook: defineEndpoint('changeWebhook', 'patch', '/api/teams/{team}/webhooks/{webhook}', {
    group: 'Webhooks',
    summary: 'Change what it is told, switch it off, or start it again',
    access: teamMay('webhooks:manage'),
    params: hookPath,
    body: z.strictObject({ events: events.optional(), isOn: z.boolean().optional() }),
    answer: webhookShape,
  }),
  removeWebhook: defineEndpoint('removeWebhook', 'delete', '/api/teams/{team}/webhooks/{webhook}', {
    group: 'Webhooks',
    summary: 'Remove it with its log',
    access: teamMay('webhooks:manage'),
    params: hookPath,
  }),
  deliveries: defineEndpoint('deliveries', 'get', '/api/teams/{team}/webhooks/{webhook}/deliveries', {
    group: 'Webhooks',
    summary: 'What was sent, and what was answered, newest first',
    access: teamMay('webhooks:manage'),
    params: hookPath,
    query: z.strictObject(pagingShape),
    answer: pageOf(deliveryShape),
  }),
} as const
