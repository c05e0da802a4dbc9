import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { useNavigate } from 'react-router-dom'
import { accountEndpoints } from '../../../shared/api/account-endpoints.ts'
import { limits } from '../../../shared/api/limits.ts'
import { paths } from '../../app/paths.ts'
import { meQuery } from '../../features/session/session-queries.ts'
import { call } from '../../lib/api.ts'
import { dayText } from '../../lib/dates.ts'
import { announceSession } from '../../lib/session-channel.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Field } from '../../ui/field.tsx'
import { Loaded } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { commonWords } from '../../words/common-words.ts'
import { outsideWords } from '../../words/outside-words.ts'

function Accept({ secret, hasAccount }: { readonly secret: string; readonly hasAccount: boolean }): JSX.Element {
  const client = useQueryClient()
  const navigate = useNavigate()
  const [name, setName] = useState('')
  const [password, setPassword] = useState('')
  const accept = useMutation({
    mutationFn: () =>
      call(accountEndpoints.acceptInvitation, {
        params: { secret },
        body: hasAccount ? { password } : { name, password },
      }),
    onSuccess: (me) => {
      client.setQueryData(meQuery.queryKey, me)
      announceSession()
      void navigate(paths.home, { replace: true })
    },
  })
  return (
    <form
      className="space-y-4"
      onSubmit={(event) => {
        event.preventDefault()
        accept.mutate()
      }}
    >
      <p>{hasAccount ? outsideWords.knownHere : outsideWords.newHere}</p>
      {hasAccount ? null : (
        <Field label={outsideWords.yourName}>
          {(parts) => (
            <input
              {...parts}
              required
              maxLength={limits.name}
              autoComplete="name"
              className="field"
              value={name}
              onChange={({ target }) => setName(target.value)}
            />
          )}
        </Field>
      )}
      <Field label={outsideWords.password} hint={hasAccount ? undefined : outsideWords.passwordHint}>
        {(parts) => (
          <input
            {...parts}
            type="password"
            required
            minLength={limits.password.min}
            autoComplete={hasAccount ? 'current-password' : 'new-password'}
            className="field"
            value={password}
            onChange={({ target }) => setPassword(target.value)}
          />
        )}
      </Field>
      <RefusalNote error={accept.error} />
      <button type="submit" className="button" data-kind="main" disabled={accept.isPending}>
        {accept.isPending ? commonWords.sending : outsideWords.accept}
      </button>
    </form>
  )
}

export default function InvitationPage(): JSX.Element {
  const secret = usePart('secret')
  const invitation = useQuery({
    queryKey: ['invitation', secret],
    queryFn: ({ signal }) => call(accountEndpoints.invitationByLink, { params: { secret }, signal }),
  })
  const title =
    invitation.data === undefined ? outsideWords.invitationLoading : outsideWords.invitationTitle(invitation.data.team)
  useTitle(title)
  return (
    <>
      <TitleBlock title={title} />
      <div className="sheet max-w-md p-5">
        <Loaded query={invitation}>
          {(data) => (
            <>
              <p className="font-semibold">{outsideWords.invited(data.invitedBy, data.role, data.email)}</p>
              <p className="mb-4 text-sm text-soft">{outsideWords.until(dayText(data.expiresAt))}</p>
              <Accept secret={secret} hasAccount={data.hasAccount} />
            </>
          )}
        </Loaded>
      </div>
    </>
  )
}
