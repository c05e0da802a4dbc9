import { useMutation } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { Link } from 'react-router-dom'
import { accountEndpoints } from '../../../shared/api/account-endpoints.ts'
import { paths } from '../../app/paths.ts'
import { call } from '../../lib/api.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { commonWords } from '../../words/common-words.ts'
import { outsideWords } from '../../words/outside-words.ts'

export default function AskResetPage(): JSX.Element {
  useTitle(outsideWords.resetTitle)
  const [email, setEmail] = useState('')
  const ask = useMutation({ mutationFn: () => call(accountEndpoints.askReset, { body: { email } }) })
  return (
    <>
      <TitleBlock title={outsideWords.resetTitle} />
      <form
        className="sheet max-w-md space-y-4 p-5"
        onSubmit={(event) => {
          event.preventDefault()
          ask.mutate()
        }}
      >
        <p>{outsideWords.resetExplain}</p>
        <Field label={outsideWords.email}>
          {(parts) => (
            <input
              {...parts}
              type="email"
              required
              autoComplete="username"
              className="field"
              value={email}
              onChange={({ target }) => setEmail(target.value)}
            />
          )}
        </Field>
        <RefusalNote error={ask.error} />
        {ask.isSuccess ? <p role="status">{outsideWords.linkSent}</p> : null}
        <div className="flex flex-wrap items-center gap-4">
          <button type="submit" className="button" data-kind="main" disabled={ask.isPending}>
            {ask.isPending ? commonWords.sending : outsideWords.sendLink}
          </button>
          <Link to={paths.signIn}>{outsideWords.signIn}</Link>
        </div>
      </form>
    </>
  )
}
