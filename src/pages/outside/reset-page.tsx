import { useMutation } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { Link } from 'react-router-dom'
import { accountEndpoints } from '../../../shared/api/account-endpoints.ts'
import { limits } from '../../../shared/api/limits.ts'
import { paths } from '../../app/paths.ts'
import { call } from '../../lib/api.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { commonWords } from '../../words/common-words.ts'
import { outsideWords } from '../../words/outside-words.ts'

export default function ResetPage(): JSX.Element {
  useTitle(outsideWords.resetTitle)
  const secret = usePart('secret')
  const [password, setPassword] = useState('')
  const reset = useMutation({
    mutationFn: () => call(accountEndpoints.reset, { params: { secret }, body: { password } }),
  })
  return (
    <>
      <TitleBlock title={outsideWords.resetTitle} />
      {reset.isSuccess ? (
        <div role="status" className="sheet max-w-md p-5">
          <p>{outsideWords.passwordSet}</p>
          <Link className="button mt-3" data-kind="main" to={paths.signIn}>
            {outsideWords.signIn}
          </Link>
        </div>
      ) : (
        <form
          className="sheet max-w-md space-y-4 p-5"
          onSubmit={(event) => {
            event.preventDefault()
            reset.mutate()
          }}
        >
          <Field label={outsideWords.newPassword} hint={outsideWords.passwordHint}>
            {(parts) => (
              <input
                {...parts}
                type="password"
                required
                minLength={limits.password.min}
                autoComplete="new-password"
                className="field"
                value={password}
                onChange={({ target }) => setPassword(target.value)}
              />
            )}
          </Field>
          <RefusalNote error={reset.error} />
          <button type="submit" className="button" data-kind="main" disabled={reset.isPending}>
            {reset.isPending ? commonWords.sending : outsideWords.setPassword}
          </button>
        </form>
      )}
    </>
  )
}
