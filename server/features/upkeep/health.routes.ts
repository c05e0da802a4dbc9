import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { openApiDocument } from '../../../shared/api/open-api.ts'
import { engineVersion } from '../../../shared/edition.ts'
import { isUpToDate } from '../../db/migrate.ts'
import { Refusal } from '../../http/refusal.ts'
import { openRoute, type Route } from '../../http/route.ts'

let document: object | null = null

const unready = (what: string): Refusal =>
  new Refusal(503, 'not-ready', what, 'Try again shortly.', [], { 'retry-after': '2' })

export const healthRoutes: readonly Route[] = [
  openRoute(endpoints.live, () => Promise.resolve({ status: 'live' as const, engine: engineVersion })),
  openRoute(endpoints.ready, async ({ context }) => {
    const isReady = await isUpToDate(context.database).catch(() => null)
    if (isReady === null) throw unready('The database does not answer.')
    if (!isReady) throw unready('The database waits for its migrations.')
    return { status: 'ready' as const }
  }),
  openRoute(endpoints.openApi, () => {
    document ??= openApiDocument()
    return Promise.resolve(document as { openapi: string })
  }),
]
