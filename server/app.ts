import express, { type Express } from 'express'
import helmet from 'helmet'
import type { Context } from './context.ts'
import { routesOf } from './features/route-registry.ts'
import { errorHandler } from './http/error-handler.ts'
import type { Metrics } from './http/metrics.ts'
import { mountRoutes } from './http/mount-routes.ts'
import { originCheck } from './http/origin-check.ts'
import { mountPage } from './http/page.ts'
import { requestLog } from './http/request-log.ts'
import { mountSignIn } from './http/sign-in-middleware.ts'
import { countAttempt, createThrottles } from './http/throttles.ts'

/** The whole server as an Express application, without a port. */
export function createApp(context: Context, metrics: Metrics | null = null): Express {
  const { config } = context
  const throttles = createThrottles(context.database, config)
  const app = express()
  app.disable('x-powered-by')
  app.set('trust proxy', config.TRUST_PROXY)
  app.set('query parser', 'simple')
  app.use(requestLog(context, metrics))
  app.use(
    helmet({
      contentSecurityPolicy: {
        useDefaults: false,
        directives: {
          defaultSrc: ["'none'"],
          scriptSrc: ["'self'"],
          styleSrc: ["'self'"],
          fontSrc: ["'self'"],
          imgSrc: ["'self'", 'blob:', 'data:'],
          connectSrc: ["'self'"],
          workerSrc: ["'self'"],
          manifestSrc: ["'self'"],
          baseUri: ["'none'"],
          formAction: ["'self'"],
          frameAncestors: ["'none'"],
        },
      },
      strictTransportSecurity: config.PUBLIC_URL.startsWith('https:'),
      // Links with secrets must not travel in a Referer.
      referrerPolicy: { policy: 'no-referrer' },
    }),
  )
  app.use('/api', async (request, _response, next) => {
    if (!request.path.startsWith('/health/')) await countAttempt(throttles.requests, request.ip ?? 'unknown')
    next()
  })
  app.use('/api', originCheck(config.PUBLIC_URL))
  mountSignIn(app, context)
  mountRoutes(app, routesOf(throttles), context)
  mountPage(app, config.PAGE_FOLDER)
  app.use(errorHandler(context))
  return app
}
