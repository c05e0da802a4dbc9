import { createClient, RefusedError, type Client, type Fetch } from '../../shared/api/create-client.ts'
import { tokenEndpoints } from '../../shared/api/token-endpoints.ts'
import type { Connection } from './credentials.ts'

/** Longest wait for one answer in milliseconds: a big push is judged again by the server before it answers. */
const patience = 120_000

const send: Fetch = (address, sent) =>
  fetch(address, { ...(sent as RequestInit), signal: AbortSignal.timeout(patience) })

export const clientOf = ({ server, token }: Connection): Client =>
  createClient(send, server, { authorization: `Bearer ${token}` })

/** The team a token is for. */
export const teamOf = async (client: Client): Promise<string> => (await client.call(tokenEndpoints.tokenCaller)).team

/** A refusal in the words of the server, with what to do. */
export function explainRefusal(error: RefusedError, server: string): string {
  const what = error.status === 0 ? `${server} cannot be reached` : error.message
  const places = error.problems
    .slice(0, 9)
    .map(({ path, line, message }) => `  ${path}${line === null ? '' : `:${String(line)}:1`}: ${message}\n`)
    .join('')
  return `${what}\n${places}${error.hint === null ? '' : `${error.hint}\n`}`
}

const pause = (milliseconds: number): Promise<void> => new Promise((fulfil) => setTimeout(fulfil, milliseconds))

/** Whether trying again may help: too many requests, a passing weakness, a cut connection. */
export const isPassing = (error: unknown): boolean =>
  error instanceof RefusedError &&
  (error.status === 0 || error.status === 408 || error.status === 429 || (error.status >= 500 && error.status !== 501))

/**
 * Calls until it succeeds or trying again is of no use.
 * @param waits milliseconds before each further attempt; the server may ask for longer, up to a minute
 */
export async function withRetries<T>(
  work: () => Promise<T>,
  waits: readonly number[],
  tell: (message: string) => void,
): Promise<T> {
  for (let attempt = 0; ; attempt += 1) {
    try {
      return await work()
    } catch (error) {
      const wait = waits[attempt]
      if (wait === undefined || !isPassing(error)) throw error
      const asked = error instanceof RefusedError ? (error.retryAfter ?? 0) * 1000 : 0
      // Spread, so that pipelines that failed together do not come back together.
      const milliseconds = Math.min(60_000, Math.max(asked, wait * (0.75 + Math.random() / 2)))
      const why =
        error instanceof RefusedError && error.status > 0 ? `the server answered ${String(error.status)}` : 'no answer'
      tell(`${why}; trying again in ${(milliseconds / 1000).toFixed(1)} s\n`)
      await pause(milliseconds)
    }
  }
}

/** Half a minute of patience in all. */
export const usualWaits = [500, 1_000, 2_000, 4_000, 8_000, 12_000]

/** Tests and hurried people shorten it: FOLDGAUGE_RETRIES is the number of further attempts. */
export const waitsOf = (env: Readonly<Record<string, string | undefined>>): readonly number[] => {
  const wanted = env['FOLDGAUGE_RETRIES']
  return wanted === undefined || !/^\d$/.test(wanted) ? usualWaits : usualWaits.slice(0, Number(wanted))
}
