import { useMutation } from '@tanstack/react-query'
import type { JSX } from 'react'
import { Link } from 'react-router-dom'
import { accountEndpoints } from '../../../shared/api/account-endpoints.ts'
import { paths } from '../../app/paths.ts'
import { call } from '../../lib/api.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { commonWords } from '../../words/common-words.ts'
import { outsideWords } from '../../words/outside-words.ts'

/** Confirmed by a press, never by opening: mail programs open links by themselves. */
export default function ConfirmEmailPage(): JSX.Element {
  useTitle(outsideWords.emailTitle)
  const secret = usePart('secret')
  const confirm = useMutation({ mutationFn: () => call(accountEndpoints.confirmEmailChange, { params: { secret } }) })
  return (
    <>
      <TitleBlock title={outsideWords.emailTitle} />
      <div className="sheet max-w-md space-y-4 p-5">
        {confirm.data === undefined ? (
          <>
            <p>{outsideWords.emailExplain}</p>
            <RefusalNote error={confirm.error} />
            <button
              type="button"
              className="button"
              data-kind="main"
              disabled={confirm.isPending}
              onClick={() => confirm.mutate()}
            >
              {confirm.isPending ? commonWords.sending : outsideWords.confirm}
            </button>
          </>
        ) : (
          <p role="status">
            {confirm.data.isComplete || confirm.data.waitsFor === null
              ? outsideWords.emailComplete
              : outsideWords.emailWaits(confirm.data.waitsFor)}
          </p>
        )}
        <p>
          <Link to={paths.home}>{commonWords.backHome}</Link>
        </p>
      </div>
    </>
  )
}
