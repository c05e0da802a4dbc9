import type { Route } from '../http/route.ts'
import type { Throttles } from '../http/throttles.ts'
import { accountRoutes } from './accounts/accounts.routes.ts'
import { buildLinkRoutes } from './builds/build-links.routes.ts'
import { buildRoutes } from './builds/builds.routes.ts'
import { noticeRoutes } from './notices/notices.routes.ts'
import { webhookRoutes } from './notices/webhooks.routes.ts'
import { numberSheetRoutes } from './numbers/number-sheet.routes.ts'
import { publicationRoutes } from './publication/publication.routes.ts'
import { pushRoutes } from './push/push.routes.ts'
import { knownFailureRoutes } from './review/known-failures.routes.ts'
import { reviewRoutes } from './review/review.routes.ts'
import { setRoutes } from './sets/sets.routes.ts'
import { teamRoutes } from './teams/teams.routes.ts'
import { tokenRoutes } from './tokens/tokens.routes.ts'
import { auditRoutes } from './upkeep/audit.routes.ts'
import { failedWorkRoutes } from './upkeep/failed-work.routes.ts'
import { healthRoutes } from './upkeep/health.routes.ts'
import { paperRoutes } from './upkeep/papers.routes.ts'
import { retentionRoutes } from './upkeep/retention.routes.ts'
import { versionRoutes } from './versions/versions.routes.ts'

/** Every route; a test holds it against the contracts, so that none is forgotten. */
export const routesOf = (throttles: Throttles): readonly Route[] => [
  ...healthRoutes,
  ...accountRoutes(throttles),
  ...teamRoutes,
  ...tokenRoutes,
  ...pushRoutes,
  ...setRoutes,
  ...versionRoutes,
  ...reviewRoutes,
  ...knownFailureRoutes,
  ...publicationRoutes,
  ...numberSheetRoutes,
  ...buildRoutes,
  ...buildLinkRoutes,
  ...noticeRoutes,
  ...webhookRoutes,
  ...auditRoutes,
  ...failedWorkRoutes,
  ...paperRoutes,
  ...retentionRoutes,
]
