import type { z } from 'zod'
import type { Action } from './permissions.ts'

/** Who may call an endpoint. Foreign teams answer 404, a role that may not answers 403, signed out 401. */
export type Access =
  | { readonly kind: 'anyone' }
  | { readonly kind: 'signed-in' }
  /** A member of the team in the path whose role may do the action; robots need the scope. */
  | { readonly kind: 'team'; readonly action: Action; readonly scope: TokenScope | null }
  /** The secret part of a link in the path is the key. */
  | { readonly kind: 'link' }

export type TokenScope = 'push' | 'read'

export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete'

/** What an endpoint answers with besides JSON. */
export type AnswerKind = 'json' | 'none' | 'csv' | 'file'

type Shape = z.ZodType

export interface Endpoint<
  Params extends Shape = Shape,
  Query extends Shape = Shape,
  Body extends Shape = Shape,
  Answer extends Shape = Shape,
> {
  /** Stable name: operation id of the document, method of the client. */
  readonly name: string
  readonly method: Method
  /** With parameters in braces, as the OpenAPI document writes them. */
  readonly path: string
  readonly summary: string
  readonly group: string
  readonly access: Access
  readonly params: Params
  readonly query: Query
  /** `json` in the given shape, or raw bytes of the named media types. */
  readonly body: Body
  readonly bodyTypes: readonly string[]
  /** Largest body in bytes; more answers 413. */
  readonly bodyLimit: number
  readonly answerKind: AnswerKind
  readonly answer: Answer
  /** Statuses of success, the usual one first. */
  readonly statuses: readonly [number, ...number[]]
}

export type ParamsOf<E extends Endpoint> = z.output<E['params']>
export type QueryOf<E extends Endpoint> = z.output<E['query']>
export type BodyOf<E extends Endpoint> = z.output<E['body']>
export type AnswerOf<E extends Endpoint> = z.output<E['answer']>
/** What a caller may leave out is optional here. */
export type QueryInput<E extends Endpoint> = z.input<E['query']>
export type BodyInput<E extends Endpoint> = z.input<E['body']>
