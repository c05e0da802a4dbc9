import type { RequestHandler } from 'express'
import { forbidden } from './refusal.ts'

const readOnly = new Set(['GET', 'HEAD', 'OPTIONS'])

/** Writes that could ride on a browser's cookie must come from our own page. Bearer requests carry no cookie. */
export const originCheck =
  (publicUrl: string): RequestHandler =>
  (request, _response, next) => {
    if (readOnly.has(request.method) || request.headers.authorization !== undefined) {
      next()
      return
    }
    const site = request.headers['sec-fetch-site']
    if (site === 'same-origin') {
      next()
      return
    }
    const origin = request.headers.origin
    const isOurs =
      site === undefined &&
      origin !== undefined &&
      (origin === new URL(publicUrl).origin || hostOf(origin) === request.headers.host)
    next(
      isOurs
        ? undefined
        : forbidden('This request does not come from the page of this server.', 'Programs send a token instead.'),
    )
  }

function hostOf(origin: string): string | null {
  try {
    return new URL(origin).host
  } catch {
    return null
  }
}
