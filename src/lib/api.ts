import { createClient, RefusedError } from '../../shared/api/create-client.ts'
import type { AnswerOf, Endpoint } from '../../shared/api/endpoint.ts'
import { addressOf, type Call } from '../../shared/api/request-parts.ts'

const client = createClient((address, sent) => fetch(address, sent as RequestInit))

type Watcher = (error: RefusedError) => void
const watchers = new Set<Watcher>()

/** Tells somebody of every refusal, whoever asked: to notice a lost session or a server that is away. */
export function watchRefusals(watcher: Watcher): () => void {
  watchers.add(watcher)
  return () => void watchers.delete(watcher)
}

/** Calls an endpoint of the server. @throws RefusedError */
export async function call<E extends Endpoint>(
  endpoint: E,
  parts: Call<E> & { readonly signal?: AbortSignal } = {},
): Promise<AnswerOf<E>> {
  try {
    return await client.call(endpoint, parts)
  } catch (error) {
    if (error instanceof RefusedError && parts.signal?.aborted !== true) for (const watcher of watchers) watcher(error)
    throw error
  }
}

/** Sends a file as it is. @throws RefusedError */
export async function sendFile<E extends Endpoint>(
  endpoint: E,
  parts: Pick<Call<E>, 'params' | 'query'>,
  file: Blob,
): Promise<AnswerOf<E>> {
  const sender = createClient((address, sent) =>
    fetch(address, { method: sent.method, headers: { ...sent.headers, 'content-type': file.type }, body: file }),
  )
  return sender.call(endpoint, { ...parts, body: '' } as Call<E>)
}

/** The address of a file or sheet that the browser fetches itself. */
export const fileAddress = <E extends Endpoint>(endpoint: E, parts: Call<E>): string => addressOf(endpoint, parts)
