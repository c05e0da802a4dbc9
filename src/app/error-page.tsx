import type { JSX } from 'react'
import { isRouteErrorResponse, Link, useRouteError } from 'react-router-dom'
import { commonWords } from '../words/common-words.ts'
import { paths } from './paths.ts'

/** What stands where a page stopped or none is. */
export function ErrorPage(): JSX.Element {
  const error = useRouteError()
  const isMissing = isRouteErrorResponse(error) && error.status === 404
  return (
    <main className="mx-auto max-w-3xl px-4 py-16">
      <div role="alert" className="border-2 border-ink bg-sheet p-6">
        <h1 className="text-2xl">{isMissing ? commonWords.missingTitle : commonWords.defectTitle}</h1>
        <p className="mt-2">{isMissing ? commonWords.missing : commonWords.defect}</p>
        <p className="mt-4 flex flex-wrap gap-3">
          {isMissing ? null : (
            <button type="button" className="button" data-kind="main" onClick={() => location.reload()}>
              {commonWords.reload}
            </button>
          )}
          <Link className="button" to={paths.home}>
            {commonWords.backHome}
          </Link>
        </p>
      </div>
    </main>
  )
}
