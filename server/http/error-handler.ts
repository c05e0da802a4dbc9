import type { ErrorRequestHandler, Response } from 'express'
import type { ErrorAnswer } from '../../shared/api/error-answer.ts'
import type { Context } from '../context.ts'
import { Refusal } from './refusal.ts'

/** What body parsers throw. */
interface HttpError {
  readonly status: number
  readonly type?: string
  readonly limit?: number
}

const isHttpError = (error: unknown): error is HttpError =>
  typeof error === 'object' && error !== null && 'status' in error && typeof error.status === 'number'

const size = (bytes: number | undefined): string =>
  bytes === undefined
    ? 'the limit'
    : bytes >= 1_048_576
      ? `${String(Math.round(bytes / 1_048_576))} MB`
      : `${String(Math.round(bytes / 1024))} kB`

function refusalOf(error: unknown): Refusal | null {
  if (error instanceof Refusal) return error
  if (!isHttpError(error) || error.status >= 500) return null
  if (error.status === 413)
    return new Refusal(413, 'too-large', `The body is larger than ${size(error.limit)}.`, 'Send less at once.')
  if (error.type === 'entity.parse.failed') return new Refusal(400, 'not-json', 'The body is not JSON.')
  if (error.type === 'request.aborted') return new Refusal(400, 'cut-off', 'The request was cut off.')
  return new Refusal(error.status, 'bad-request', 'The request cannot be understood.')
}

/** True where the database is away for the moment, so that a retry is worth while. */
function isPassing(error: unknown): boolean {
  const code = (error as { code?: unknown; driverError?: { code?: unknown } } | null)?.code
  const inner = (error as { driverError?: { code?: unknown } } | null)?.driverError?.code
  const message = error instanceof Error ? error.message : ''
  return (
    [code, inner].some((word) => typeof word === 'string' && /^(ECONN|EPIPE|08|57P|53|40001|40P01)/.test(word)) ||
    /Connection terminated|timeout exceeded when trying to connect|Driver not Connected/.test(message)
  )
}

function answerWith(response: Response, refusal: Refusal, requestId: string): void {
  const body: ErrorAnswer = {
    error: {
      code: refusal.code,
      message: refusal.message,
      hint: refusal.hint,
      problems: [...refusal.problems],
      requestId,
    },
  }
  response.status(refusal.status).set(refusal.headers).set('cache-control', 'no-store').json(body)
}

/** Turns whatever was thrown into an answer; defects are logged, never shown. */
export const errorHandler =
  (context: Context): ErrorRequestHandler =>
  (error: unknown, request, response, _next) => {
    if (response.headersSent) {
      response.destroy()
      return
    }
    const refusal = refusalOf(error)
    if (refusal !== null) {
      answerWith(response, refusal, request.requestId)
      return
    }
    if (isPassing(error)) {
      context.log.warn({ requestId: request.requestId, error: String(error) }, 'the database is away')
      const later = new Refusal(
        503,
        'away',
        'The server cannot reach its database just now.',
        'Try again shortly.',
        [],
        { 'retry-after': '2' },
      )
      answerWith(response, later, request.requestId)
      return
    }
    context.log.error({ requestId: request.requestId, endpoint: request.endpointName, err: error }, 'defect')
    const defect = new Refusal(
      500,
      'defect',
      'This is a defect in Foldgauge; it has been noted.',
      `Report it with ${request.requestId}.`,
    )
    answerWith(response, defect, request.requestId)
  }
