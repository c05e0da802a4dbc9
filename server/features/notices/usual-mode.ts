import type { NoticeEvent, NoticeMode } from '../../../shared/api/notice-endpoints.ts'
import type { Role } from '../../../shared/api/permissions.ts'

type Modes = Readonly<Partial<Record<NoticeEvent, NoticeMode>>>

const news: Modes = { published: 'now', erratum: 'now', recalled: 'now' }

const byRole: Readonly<Record<Role, Modes>> = {
  owner: {
    ...news,
    'newly-failing': 'now',
    recovered: 'now',
    'changes-asked': 'now',
    approved: 'now',
    'approval-stale': 'digest',
    'build-reported': 'digest',
    'review-asked': 'digest',
    'waiver-expiring': 'now',
    'token-expiring': 'now',
    'webhook-stopped': 'now',
  },
  author: {
    ...news,
    'newly-failing': 'now',
    recovered: 'now',
    'changes-asked': 'now',
    approved: 'now',
    'approval-stale': 'now',
    'build-reported': 'now',
    'waiver-expiring': 'now',
    'token-expiring': 'now',
  },
  reviewer: {
    ...news,
    'review-asked': 'now',
    'approval-stale': 'digest',
    'build-reported': 'digest',
    'waiver-expiring': 'now',
    'newly-failing': 'digest',
  },
  tester: { erratum: 'now', recalled: 'now' },
  viewer: { published: 'digest', erratum: 'digest', recalled: 'now' },
}

/** How somebody is told of an event who has not chosen. */
export const usualMode = (role: Role, event: NoticeEvent): NoticeMode => byRole[role][event] ?? 'off'
