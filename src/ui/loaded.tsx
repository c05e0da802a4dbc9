import type { JSX, ReactNode } from 'react'
import type { UseQueryResult } from '@tanstack/react-query'
import { commonWords } from '../words/common-words.ts'
import { isForbidden, isMissing, reasonOf } from '../lib/refusals.ts'

/** Grey bars where lines will be. */
export function Waiting({ lines = 4 }: { readonly lines?: number }): JSX.Element {
  return (
    <div role="status" className="space-y-3 py-2">
      <span className="sr-only">{commonWords.loading}</span>
      {Array.from({ length: lines }, (_, index) => (
        <div key={index} className="waiting h-5" style={{ width: `${String(92 - ((index * 23) % 45))}%` }} />
      ))}
    </div>
  )
}

export function Empty({ title, children }: { readonly title: string; readonly children?: ReactNode }): JSX.Element {
  return (
    <div className="border border-dashed border-stroke p-6 text-center">
      <p className="font-semibold">{title}</p>
      {children === undefined ? null : <div className="mx-auto mt-1 max-w-prose text-sm text-soft">{children}</div>}
    </div>
  )
}

/** Why something could not be loaded, in the server's words, and a way on. */
export function Failed({ error, onAgain }: { readonly error: unknown; readonly onAgain?: () => void }): JSX.Element {
  const reason = reasonOf(error)
  const title = isMissing(error)
    ? commonWords.missingTitle
    : isForbidden(error)
      ? commonWords.forbiddenTitle
      : commonWords.errorTitle
  return (
    <div role="alert" className="border-l-4 border-fail bg-fail-wash p-4">
      <p className="font-semibold">{title}</p>
      <p className="mt-1">{isMissing(error) ? commonWords.missing : reason.fact}</p>
      {reason.hint === null || isMissing(error) ? null : <p className="mt-1 text-sm">{reason.hint}</p>}
      {onAgain === undefined || isMissing(error) ? null : (
        <button type="button" className="button mt-3" onClick={onAgain}>
          {commonWords.again}
        </button>
      )}
    </div>
  )
}

/** The four states of whatever a query brings: loading, error, empty, data. */
export function Loaded<T>({
  query,
  lines,
  waiting,
  isEmpty,
  empty,
  children,
}: {
  readonly query: UseQueryResult<T>
  readonly lines?: number
  readonly waiting?: ReactNode
  readonly isEmpty?: (data: T) => boolean
  readonly empty?: ReactNode
  readonly children: (data: T) => ReactNode
}): ReactNode {
  if (query.data !== undefined) return isEmpty?.(query.data) === true ? empty : children(query.data)
  if (query.isError) return <Failed error={query.error} onAgain={() => void query.refetch()} />
  return waiting ?? <Waiting lines={lines ?? 4} />
}
