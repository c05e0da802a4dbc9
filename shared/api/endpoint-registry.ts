import { accountEndpoints } from './account-endpoints.ts'
import { buildEndpoints } from './build-endpoints.ts'
import type { Endpoint } from './endpoint.ts'
import { noticeEndpoints } from './notice-endpoints.ts'
import { numberSheetEndpoints } from './number-sheet-endpoints.ts'
import { publicationEndpoints } from './publication-endpoints.ts'
import { pushEndpoints } from './push-endpoints.ts'
import { reviewEndpoints } from './review-endpoints.ts'
import { setEndpoints } from './set-endpoints.ts'
import { teamEndpoints } from './team-endpoints.ts'
import { tokenEndpoints } from './token-endpoints.ts'
import { upkeepEndpoints } from './upkeep-endpoints.ts'
import { versionEndpoints } from './version-endpoints.ts'

/** Every endpoint by its name; routes, client and document are made from these. */
export const endpoints = {
  ...accountEndpoints,
  ...teamEndpoints,
  ...tokenEndpoints,
  ...pushEndpoints,
  ...setEndpoints,
  ...versionEndpoints,
  ...reviewEndpoints,
  ...publicationEndpoints,
  ...numberSheetEndpoints,
  ...buildEndpoints,
  ...noticeEndpoints,
  ...upkeepEndpoints,
} as const

export const endpointList: readonly Endpoint[] = Object.values(endpoints)
