import type { JSX } from 'react'
import { commonWords } from '../words/common-words.ts'

interface Paged {
  readonly hasNextPage: boolean
  readonly isFetchingNextPage: boolean
  fetchNextPage(): Promise<unknown>
}

/** How many rows are shown, said aloud when more arrive, and the way to more. */
export function MoreRows({ query, count }: { readonly query: Paged; readonly count: number }): JSX.Element {
  return (
    <div className="mt-3 flex flex-wrap items-center gap-4">
      <p role="status" className="label">
        {commonWords.shown(count)}
      </p>
      {query.hasNextPage ? (
        <button
          type="button"
          className="button"
          disabled={query.isFetchingNextPage}
          onClick={() => void query.fetchNextPage()}
        >
          {query.isFetchingNextPage ? commonWords.loading : commonWords.more}
        </button>
      ) : null}
    </div>
  )
}
