import express, { type Express, type Request, type Response } from 'express'
import { Readable } from 'node:stream'
import { pipeline } from 'node:stream/promises'
import type { Endpoint } from '../../shared/api/endpoint.ts'
import type { Context } from '../context.ts'
import { isFile, isStatus, type FileAnswer } from './answers.ts'
import type { Caller } from './caller.ts'
import { forbidden, Refusal, unacceptable } from './refusal.ts'
import type { Asked, Route } from './route.ts'
import { admit } from './team-access.ts'

const pathOf = (endpoint: Endpoint): string => endpoint.path.replace(/\{(\w+)\}/g, ':$1')

type Part = 'address' | 'query' | 'body'

function understood(endpoint: Endpoint, part: Part, value: unknown): unknown {
  const shape = part === 'address' ? endpoint.params : part === 'query' ? endpoint.query : endpoint.body
  const read = shape.safeParse(value)
  if (read.success) return read.data
  const problems = read.error.issues.map((issue) => ({
    path: issue.path.join('.'),
    message: issue.message,
    line: null,
  }))
  if (part === 'address') throw new Refusal(404, 'not-found', 'There is nothing at this address.')
  const first = problems[0]
  throw unacceptable(
    part === 'query' ? 'bad-query' : 'bad-body',
    `The ${part} is not as it must be: ${first === undefined ? 'it is missing' : `${first.path === '' ? 'it' : first.path}: ${first.message}`}`,
    'The contract is at /api/openapi.json.',
    problems,
  )
}

const isJson = (endpoint: Endpoint): boolean => endpoint.bodyTypes[0] === 'application/json'

function bodyParser(endpoint: Endpoint): express.RequestHandler {
  const { bodyLimit: limit, bodyTypes } = endpoint
  return isJson(endpoint)
    ? express.json({ limit, type: 'application/json', strict: true })
    : express.raw({ limit, type: [...bodyTypes] })
}

/** A body of another kind than the endpoint takes is refused instead of read as empty. */
function refuseOtherTypes(endpoint: Endpoint, request: Request): void {
  const length = Number(request.headers['content-length'] ?? 0)
  const hasBody = length > 0 || request.headers['transfer-encoding'] !== undefined
  if (hasBody && request.is([...endpoint.bodyTypes]) === false)
    throw new Refusal(415, 'other-type', `This takes ${endpoint.bodyTypes.join(', ')}.`)
}

async function sendFile(response: Response, file: FileAnswer): Promise<void> {
  response.status(200).type(file.type)
  response.setHeader('cache-control', file.keep === 'no-store' ? 'no-store' : `${file.keep}, max-age=3600`)
  if (file.name !== null) response.attachment(file.name)
  // `attachment` guesses a type from the name; ours is known.
  response.setHeader('content-type', file.type)
  if (file.body instanceof Readable) await pipeline(file.body, response)
  else response.send(file.body)
}

function heldToContract(endpoint: Endpoint, status: number, body: unknown): void {
  if (!endpoint.statuses.includes(status))
    throw new Error(`${endpoint.name} answered ${String(status)}, which it does not declare`)
  if (endpoint.answerKind !== 'json') return
  const read = endpoint.answer.safeParse(JSON.parse(JSON.stringify(body)))
  if (!read.success)
    throw new Error(`${endpoint.name} broke its contract: ${JSON.stringify(read.error.issues.slice(0, 5))}`)
}

async function send(context: Context, endpoint: Endpoint, response: Response, answer: unknown): Promise<void> {
  if (isFile(answer)) return sendFile(response, answer)
  const status = isStatus(answer) ? answer.status : endpoint.statuses[0]
  const body = isStatus(answer) ? answer.body : answer
  if (context.config.CHECK_ANSWERS) heldToContract(endpoint, status, body)
  response.setHeader('cache-control', 'no-store')
  if (endpoint.answerKind === 'none') response.status(status).end()
  else response.status(status).json(body)
}

async function answer(context: Context, route: Route, request: Request, response: Response): Promise<void> {
  const { endpoint, need } = route
  const caller = (request.caller ?? null) as Caller
  const params = understood(endpoint, 'address', request.params) as { readonly team?: string }
  const access = need === 'team' ? await admit(context, endpoint, params.team ?? '', caller) : null
  if ((need === 'person' || need === 'caller') && caller === null)
    throw new Refusal(401, 'signed-out', 'You are not signed in.', 'Sign in first.')
  if (need === 'person' && caller?.kind === 'robot')
    throw forbidden('A token cannot do this.', 'Only people who are signed in may.')
  refuseOtherTypes(endpoint, request)
  const asked = {
    params,
    query: understood(endpoint, 'query', request.query),
    body: isJson(endpoint) ? understood(endpoint, 'body', request.body) : undefined,
    bytes: Buffer.isBuffer(request.body) ? request.body : Buffer.alloc(0),
    caller,
    access,
    context,
    request,
  }
  await send(context, endpoint, response, await route.answer(asked as unknown as Asked<Endpoint>))
}

/** Puts every route on the application: bodies are read only after nobody can be refused without them. */
export function mountRoutes(app: Express, routes: readonly Route[], context: Context): void {
  for (const route of routes) {
    const { endpoint } = route
    app[endpoint.method](
      pathOf(endpoint),
      (request, _response, next) => {
        request.endpointName = endpoint.name
        next()
      },
      bodyParser(endpoint),
      (request, response) => answer(context, route, request, response),
    )
  }
}
