import type { Readable } from 'node:stream'

/** A body with another status than the endpoint's usual one. */
export interface StatusAnswer {
  readonly kind: 'status'
  readonly status: number
  readonly body: unknown
}

/** Bytes with their media type; `name` makes browsers save it. */
export interface FileAnswer {
  readonly kind: 'file'
  readonly type: string
  readonly name: string | null
  readonly body: Buffer | string | Readable
  /** `private` files may be kept by the browser for an hour, `no-store` never. */
  readonly keep: 'private' | 'public' | 'no-store'
}

export const withStatus = <T>(status: number, body: T): T =>
  ({ kind: 'status', status, body }) satisfies StatusAnswer as unknown as T

export const fileAnswer = (
  type: string,
  body: FileAnswer['body'],
  name: string | null = null,
  keep: FileAnswer['keep'] = 'private',
): FileAnswer => ({ kind: 'file', type, name, body, keep })

export const csvAnswer = (name: string, text: string): FileAnswer =>
  fileAnswer('text/csv; charset=utf-8', text, name, 'no-store')

export const isFile = (answer: unknown): answer is FileAnswer =>
  typeof answer === 'object' && answer !== null && 'kind' in answer && answer.kind === 'file' && 'keep' in answer

export const isStatus = (answer: unknown): answer is StatusAnswer =>
  typeof answer === 'object' && answer !== null && 'kind' in answer && answer.kind === 'status' && 'status' in answer
