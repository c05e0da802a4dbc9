import type { BodyInput, Endpoint, ParamsOf, QueryInput } from './endpoint.ts'

/** What is sent to an endpoint. Raw bodies are given as they are. */
export interface Call<E extends Endpoint> {
  readonly params?: ParamsOf<E>
  readonly query?: QueryInput<E>
  readonly body?: E['bodyTypes'] extends readonly ['application/json'] ? BodyInput<E> : BodyInput<E> | BodyInitLike
}

export type BodyInitLike = string | ArrayBuffer | Uint8Array

/** The address of a call: path with its parameters, and the query without what is absent. */
export function addressOf<E extends Endpoint>(endpoint: E, call: Call<E>): string {
  const params = (call.params ?? {}) as Readonly<Record<string, unknown>>
  const path = endpoint.path.replace(/\{(\w+)\}/g, (_, name: string) => encodeURIComponent(String(params[name])))
  const query = Object.entries((call.query ?? {}) as Readonly<Record<string, unknown>>)
    .filter(([, value]) => value !== undefined && value !== null && value !== '')
    .map(([name, value]) => `${encodeURIComponent(name)}=${encodeURIComponent(String(value))}`)
  return query.length === 0 ? path : `${path}?${query.join('&')}`
}
