import { randomUUID } from 'node:crypto'
import type { RequestHandler } from 'express'
import type { Context } from '../context.ts'
import type { Metrics } from './metrics.ts'

const idPattern = /^[\w-]{8,64}$/

/** Gives each request an id and notes its end. Neither address, headers nor body are noted: any may hold a secret. */
export const requestLog =
  (context: Context, metrics: Metrics | null): RequestHandler =>
  (request, response, next) => {
    const given = request.headers['x-request-id']
    request.requestId = typeof given === 'string' && idPattern.test(given) ? given : randomUUID()
    response.setHeader('x-request-id', request.requestId)
    const begin = process.hrtime.bigint()
    response.once('close', () => {
      const seconds = Number(process.hrtime.bigint() - begin) / 1e9
      const endpoint = request.endpointName ?? 'page'
      const isCut = !response.writableFinished
      metrics?.requests.observe({ endpoint, status: isCut ? 'cut' : String(response.statusCode) }, seconds)
      context.log[response.statusCode >= 500 ? 'error' : 'info'](
        {
          requestId: request.requestId,
          method: request.method,
          endpoint,
          status: response.statusCode,
          isCut,
          milliseconds: Math.round(seconds * 1000),
          caller: request.caller?.kind === 'person' ? request.caller.id : request.caller?.tokenId,
        },
        'request',
      )
    })
    next()
  }
