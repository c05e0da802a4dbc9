import type { AnswerOf, Endpoint } from './endpoint.ts'
import { errorAnswerShape } from './error-answer.ts'
import { addressOf, type BodyInitLike, type Call } from './request-parts.ts'

/** A refusal of the server, or an answer that is none of its own (a proxy's page, a cut connection: status 0). */
export class RefusedError extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    message: string,
    readonly hint: string | null,
    readonly problems: readonly { readonly path: string; readonly message: string; readonly line: number | null }[],
    readonly retryAfter: number | null = null,
  ) {
    super(message)
  }
}

interface AnswerLike {
  readonly ok: boolean
  readonly status: number
  readonly headers: { get(name: string): string | null }
  text(): Promise<string>
}

interface SentLike {
  readonly method: string
  readonly headers: Readonly<Record<string, string>>
  readonly body?: BodyInitLike
  readonly signal?: unknown
}

/** `fetch` of the browser or of Node.js, handed in so that this file touches neither. */
export type Fetch = (address: string, sent: SentLike) => Promise<AnswerLike>

export interface Client {
  call<E extends Endpoint>(endpoint: E, call?: Call<E> & { readonly signal?: unknown }): Promise<AnswerOf<E>>
}

async function refusalOf(answer: AnswerLike): Promise<RefusedError> {
  const text = await answer.text().catch(() => '')
  const after = Number(answer.headers.get('retry-after'))
  const retryAfter = Number.isFinite(after) && after > 0 ? after : null
  try {
    const { error } = errorAnswerShape.parse(JSON.parse(text))
    return new RefusedError(answer.status, error.code, error.message, error.hint, error.problems, retryAfter)
  } catch {
    return new RefusedError(
      answer.status,
      'strange-answer',
      `the server answered ${String(answer.status)} without a reason of its own`,
      'Something between here and the server may have answered instead.',
      [],
      retryAfter,
    )
  }
}

/**
 * A client of the server's endpoints.
 * @param base address before the path, empty in the browser
 * @param headers sent with every call, such as the token of a robot
 */
export function createClient(fetch: Fetch, base = '', headers: Readonly<Record<string, string>> = {}): Client {
  return {
    async call(endpoint, call = {}) {
      const isJson = endpoint.bodyTypes[0] === 'application/json'
      const body = call.body as unknown
      const answer = await fetch(base + addressOf(endpoint, call), {
        method: endpoint.method.toUpperCase(),
        headers: {
          accept: 'application/json',
          ...(body === undefined ? {} : { 'content-type': endpoint.bodyTypes[0] ?? 'application/json' }),
          ...headers,
        },
        ...(body === undefined ? {} : { body: isJson ? JSON.stringify(body) : (body as BodyInitLike) }),
        ...(call.signal === undefined ? {} : { signal: call.signal }),
      }).catch(() => {
        throw new RefusedError(0, 'unreachable', 'the server cannot be reached', null, [], null)
      })
      if (!answer.ok) throw await refusalOf(answer)
      if (endpoint.answerKind === 'none') return undefined as never
      const text = await answer.text()
      return endpoint.answerKind === 'json' ? (JSON.parse(text) as never) : (text as never)
    },
  }
}
