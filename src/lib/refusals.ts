import { RefusedError } from '../../shared/api/create-client.ts'

export const isSignedOut = (error: unknown): boolean => error instanceof RefusedError && error.status === 401
export const isMissing = (error: unknown): boolean => error instanceof RefusedError && error.status === 404
export const isForbidden = (error: unknown): boolean => error instanceof RefusedError && error.status === 403

/** True where the server is away or stumbles, so that trying again later is worth while. */
export const isPassing = (error: unknown): boolean =>
  error instanceof RefusedError && (error.status === 0 || error.status === 429 || error.status >= 500)

/** What a refusal says, in sentences: the fact, what to do, and what is wrong where. */
export interface Reason {
  readonly fact: string
  readonly hint: string | null
  readonly problems: readonly string[]
}

const sentence = (text: string): string => {
  const first = text.charAt(0).toUpperCase() + text.slice(1)
  return /[.!?]$/.test(first) ? first : `${first}.`
}

export function reasonOf(error: unknown): Reason {
  if (!(error instanceof RefusedError)) return { fact: 'Something went wrong on this page.', hint: null, problems: [] }
  return {
    fact: sentence(error.message),
    hint: error.hint === null ? null : sentence(error.hint),
    problems: error.problems.map(({ path, message, line }) =>
      [line === null ? path : `line ${String(line)}`, message].filter((part) => part !== '').join(': '),
    ),
  }
}
