import type { Route } from '../http/route.ts'
import type { Throttles } from '../http/throttles.ts'
import { accountRoutes } from './accounts/accounts.routes.ts'
import { teamRoutes } from './teams/teams.routes.ts'
import { tokenRoutes } from './tokens/tokens.routes.ts'
import { auditRoutes } from './upkeep/audit.routes.ts'
import { healthRoutes } from './upkeep/health.routes.ts'
import { paperRoutes } from './upkeep/papers.routes.ts'

/** Every route; a test holds it against the contracts, so that none is forgotten. */
export const routesOf = (throttles: Throttles): readonly Route[] => [
  ...healthRoutes,
  ...accountRoutes(throttles),
  ...teamRoutes,
  ...tokenRoutes,
  ...auditRoutes,
  ...paperRoutes,
]
