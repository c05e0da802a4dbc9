import { z } from 'zod'
import type { Access, AnswerKind, Endpoint, Method, TokenScope } from './endpoint.ts'
import { bodyLimits } from './limits.ts'
import type { Action } from './permissions.ts'

export const nothing = z.strictObject({})
const noBody = z.undefined()

interface Given<P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType, A extends z.ZodType> {
  readonly summary: string
  readonly group: string
  readonly access: Access
  readonly params?: P
  readonly query?: Q
  readonly body?: B
  readonly bodyTypes?: readonly string[]
  readonly bodyLimit?: number
  readonly answer?: A
  readonly answerKind?: AnswerKind
  readonly statuses?: readonly [number, ...number[]]
}

export const anyone: Access = { kind: 'anyone' }
export const signedIn: Access = { kind: 'signed-in' }
export const byLink: Access = { kind: 'link' }
export const teamMay = (action: Action, scope: TokenScope | null = null): Access => ({ kind: 'team', action, scope })

/** Declares an endpoint; what is left out takes the usual: no parameters, no body, JSON or nothing in answer. */
export function defineEndpoint<
  P extends z.ZodType = typeof nothing,
  Q extends z.ZodType = typeof nothing,
  B extends z.ZodType = typeof noBody,
  A extends z.ZodType = typeof noBody,
>(name: string, method: Method, path: string, given: Given<P, Q, B, A>): Endpoint<P, Q, B, A> {
  const answerKind = given.answerKind ?? (given.answer === undefined ? 'none' : 'json')
  return {
    name,
    method,
    path,
    summary: given.summary,
    group: given.group,
    access: given.access,
    // The defaults of the type parameters are these very shapes; the compiler cannot see that an absent one means its default.
    params: given.params ?? (nothing as unknown as P),
    query: given.query ?? (nothing as unknown as Q),
    body: given.body ?? (noBody as unknown as B),
    bodyTypes: given.bodyTypes ?? ['application/json'],
    bodyLimit: given.bodyLimit ?? bodyLimits.usual,
    answerKind,
    answer: given.answer ?? (noBody as unknown as A),
    statuses: given.statuses ?? [answerKind === 'none' ? 204 : method === 'post' ? 201 : 200],
  }
}
