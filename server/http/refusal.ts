export interface RefusalProblem {
  readonly path: string
  readonly message: string
  readonly line: number | null
}

/** A request that is refused, with what its sender can do about it. */
export class Refusal extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    message: string,
    readonly hint: string | null = null,
    readonly problems: readonly RefusalProblem[] = [],
    readonly headers: Readonly<Record<string, string>> = {},
  ) {
    super(message)
  }
}

export const notFound = (what = 'There is nothing at this address.'): Refusal =>
  new Refusal(404, 'not-found', what, 'It may have been removed, or you may not belong to its team.')

export const forbidden = (what: string, hint: string | null = null): Refusal =>
  new Refusal(403, 'forbidden', what, hint)

export const conflict = (code: string, what: string, hint: string | null = null): Refusal =>
  new Refusal(409, code, what, hint)

export const unacceptable = (
  code: string,
  what: string,
  hint: string | null = null,
  problems: readonly RefusalProblem[] = [],
): Refusal => new Refusal(422, code, what, hint, problems)

/** The value, or 404. */
export function found<T>(value: T | null | undefined, what?: string): T {
  if (value === null || value === undefined) throw notFound(what)
  return value
}
