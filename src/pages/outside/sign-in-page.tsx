import { zodResolver } from '@hookform/resolvers/zod'
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import type { JSX } from 'react'
import { useForm } from 'react-hook-form'
import { Link, Navigate, useNavigate, useSearchParams } from 'react-router-dom'
import { z } from 'zod'
import { accountEndpoints } from '../../../shared/api/account-endpoints.ts'
import { paths } from '../../app/paths.ts'
import { meQuery } from '../../features/session/session-queries.ts'
import { call } from '../../lib/api.ts'
import { announceSession } from '../../lib/session-channel.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { commonWords } from '../../words/common-words.ts'
import { outsideWords } from '../../words/outside-words.ts'

const shape = z.object({
  email: z.email(outsideWords.emailWrong),
  password: z.string().min(1, outsideWords.required),
})

/** Only ever to a page of this very site. */
const safePath = (next: string | null): string =>
  next !== null && /^\/(?![/\\])/.test(next) && !next.startsWith(paths.signIn) ? next : paths.home

export default function SignInPage(): JSX.Element {
  useTitle(outsideWords.signInTitle)
  const client = useQueryClient()
  const navigate = useNavigate()
  const [params] = useSearchParams()
  const next = safePath(params.get('next'))
  const me = useQuery(meQuery)
  const form = useForm({ resolver: zodResolver(shape), defaultValues: { email: '', password: '' } })
  const enter = useMutation({
    mutationFn: (body: z.output<typeof shape>) => call(accountEndpoints.signIn, { body }),
    onSuccess: (data) => {
      client.setQueryData(meQuery.queryKey, data)
      announceSession()
      void navigate(next, { replace: true })
    },
  })
  const { errors } = form.formState
  if (me.data != null && !enter.isSuccess) return <Navigate to={next} replace />
  return (
    <>
      <TitleBlock title={outsideWords.signInTitle} />
      <form
        noValidate
        className="sheet max-w-md space-y-4 p-5"
        onSubmit={(event) => void form.handleSubmit((values) => enter.mutate(values))(event)}
      >
        <Field label={outsideWords.email} error={errors.email?.message}>
          {(parts) => (
            <input {...parts} {...form.register('email')} type="email" autoComplete="username" className="field" />
          )}
        </Field>
        <Field label={outsideWords.password} error={errors.password?.message}>
          {(parts) => (
            <input
              {...parts}
              {...form.register('password')}
              type="password"
              autoComplete="current-password"
              className="field"
            />
          )}
        </Field>
        <RefusalNote error={enter.error} />
        <div className="flex flex-wrap items-center gap-4">
          <button type="submit" className="button" data-kind="main" disabled={enter.isPending}>
            {enter.isPending ? commonWords.sending : outsideWords.signIn}
          </button>
          <Link to={paths.reset}>{outsideWords.forgot}</Link>
        </div>
      </form>
    </>
  )
}
