import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { useNavigate } from 'react-router-dom'
import { accountEndpoints } from '../../../shared/api/account-endpoints.ts'
import { limits } from '../../../shared/api/limits.ts'
import { teamEndpoints } from '../../../shared/api/team-endpoints.ts'
import { paths } from '../../app/paths.ts'
import { call } from '../../lib/api.ts'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { commonWords } from '../../words/common-words.ts'
import { outsideWords } from '../../words/outside-words.ts'
import { meQuery, type Me } from '../session/session-queries.ts'

/** Hours of the reader's day for each hour in UTC: digests leave by the clock of the server. */
const offset = (): number => -new Date().getTimezoneOffset() / 60
const inZone = (utc: number): number => (((utc + Math.round(offset())) % 24) + 24) % 24

export function NameForm({ me }: { readonly me: Me }): JSX.Element {
  const client = useQueryClient()
  const [name, setName] = useState<string>(me.name)
  const [hour, setHour] = useState(me.digestHour)
  const save = useMutation({
    mutationFn: () => call(accountEndpoints.changeMe, { body: { name, digestHour: hour } }),
    onSuccess: (next) => client.setQueryData(meQuery.queryKey, next),
  })
  return (
    <form
      className="space-y-3"
      onSubmit={(event) => {
        event.preventDefault()
        save.mutate()
      }}
    >
      <Field label={outsideWords.name}>
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
      <Field
        label={outsideWords.digestHour}
        hint={outsideWords.digestHint(Intl.DateTimeFormat().resolvedOptions().timeZone)}
      >
        {(parts) => (
          <select
            {...parts}
            className="field figure max-w-40"
            value={hour}
            onChange={({ target }) => setHour(Number(target.value))}
          >
            {Array.from({ length: 24 }, (_, utc) => utc)
              .toSorted((a, b) => inZone(a) - inZone(b))
              .map((utc) => (
                <option key={utc} value={utc}>
                  {String(inZone(utc)).padStart(2, '0')}:00
                </option>
              ))}
          </select>
        )}
      </Field>
      <RefusalNote error={save.error} />
      <div className="flex items-center gap-3">
        <button type="submit" className="button" disabled={save.isPending}>
          {commonWords.save}
        </button>
        <span role="status">{save.isSuccess ? commonWords.saved : ''}</span>
      </div>
    </form>
  )
}

export function PasswordForm(): JSX.Element {
  const [current, setCurrent] = useState('')
  const [next, setNext] = useState('')
  const save = useMutation({
    mutationFn: () => call(accountEndpoints.changePassword, { body: { current, next } }),
    onSuccess: () => {
      setCurrent('')
      setNext('')
    },
  })
  return (
    <form
      className="space-y-3"
      onSubmit={(event) => {
        event.preventDefault()
        save.mutate()
      }}
    >
      <Field label={outsideWords.currentPassword}>
        {(parts) => (
          <input
            {...parts}
            type="password"
            required
            autoComplete="current-password"
            className="field"
            value={current}
            onChange={({ target }) => setCurrent(target.value)}
          />
        )}
      </Field>
      <Field label={outsideWords.newPassword} hint={outsideWords.passwordHint}>
        {(parts) => (
          <input
            {...parts}
            type="password"
            required
            minLength={limits.password.min}
            autoComplete="new-password"
            className="field"
            value={next}
            onChange={({ target }) => setNext(target.value)}
          />
        )}
      </Field>
      <RefusalNote error={save.error} />
      <div className="flex items-center gap-3">
        <button type="submit" className="button" disabled={save.isPending}>
          {outsideWords.changePassword}
        </button>
        <span role="status">{save.isSuccess ? outsideWords.passwordChanged : ''}</span>
      </div>
    </form>
  )
}

export function EmailForm(): JSX.Element {
  const [email, setEmail] = useState('')
  const [password, setPassword] = useState('')
  const ask = useMutation({ mutationFn: () => call(accountEndpoints.askEmailChange, { body: { email, password } }) })
  return (
    <form
      className="space-y-3"
      onSubmit={(event) => {
        event.preventDefault()
        ask.mutate()
      }}
    >
      <Field label={outsideWords.newEmail}>
        {(parts) => (
          <input
            {...parts}
            type="email"
            required
            autoComplete="email"
            className="field"
            value={email}
            onChange={({ target }) => setEmail(target.value)}
          />
        )}
      </Field>
      <Field label={outsideWords.currentPassword}>
        {(parts) => (
          <input
            {...parts}
            type="password"
            required
            autoComplete="current-password"
            className="field"
            value={password}
            onChange={({ target }) => setPassword(target.value)}
          />
        )}
      </Field>
      <RefusalNote error={ask.error} />
      <button type="submit" className="button" disabled={ask.isPending}>
        {outsideWords.changeEmail}
      </button>
      <p role="status">{ask.isSuccess ? outsideWords.emailAsked : ''}</p>
    </form>
  )
}

export function TeamForm(): JSX.Element {
  const client = useQueryClient()
  const navigate = useNavigate()
  const [name, setName] = useState('')
  const [typed, setTyped] = useState<string | null>(null)
  const slug =
    typed ??
    name
      .toLowerCase()
      .replace(/[^a-z0-9]+/g, '-')
      .replace(/^-+|-+$/g, '')
      .slice(0, 60)
  const make = useMutation({
    mutationFn: () => call(teamEndpoints.createTeam, { body: { slug, name } }),
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: meQuery.queryKey })
      void navigate(paths.sets(slug))
    },
  })
  return (
    <form
      className="space-y-3"
      onSubmit={(event) => {
        event.preventDefault()
        make.mutate()
      }}
    >
      <Field label={outsideWords.teamName}>
        {(parts) => (
          <input
            {...parts}
            required
            maxLength={limits.name}
            className="field"
            value={name}
            onChange={({ target }) => setName(target.value)}
          />
        )}
      </Field>
      <Field label={outsideWords.teamSlug} hint={outsideWords.slugHint}>
        {(parts) => (
          <input
            {...parts}
            required
            pattern="[a-z0-9]([a-z0-9\-]{0,58}[a-z0-9])?"
            className="field figure"
            value={slug}
            onChange={({ target }) => setTyped(target.value)}
          />
        )}
      </Field>
      <RefusalNote error={make.error} />
      <button type="submit" className="button" disabled={make.isPending}>
        {outsideWords.makeTeam}
      </button>
    </form>
  )
}
