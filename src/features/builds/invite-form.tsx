import { zodResolver } from '@hookform/resolvers/zod'
import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { JSX } from 'react'
import { useForm } from 'react-hook-form'
import { z } from 'zod'
import { buildEndpoints } from '../../../shared/api/build-endpoints.ts'
import { limits } from '../../../shared/api/limits.ts'
import { call } from '../../lib/api.ts'
import { today } from '../../lib/dates.ts'
import { Dialog } from '../../ui/dialog.tsx'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { buildWords } from '../../words/build-words.ts'
import { commonWords } from '../../words/common-words.ts'
import { outsideWords } from '../../words/outside-words.ts'
import { buildInvitationsQuery, type Place } from './build-queries.ts'

const shape = z.object({
  name: z.string().trim().min(1, outsideWords.required).max(limits.name),
  email: z.email(outsideWords.emailWrong),
  note: z.string().max(limits.note),
  dueOn: z.string(),
})

/** Invites somebody by mail to build a version. */
export function InviteForm({
  place,
  isOpen,
  onClose,
}: {
  readonly place: Place
  readonly isOpen: boolean
  readonly onClose: () => void
}): JSX.Element {
  const client = useQueryClient()
  const { register, handleSubmit, formState, reset } = useForm({
    resolver: zodResolver(shape),
    defaultValues: { name: '', email: '', note: '', dueOn: '' },
  })
  const invite = useMutation({
    mutationFn: ({ dueOn, ...body }: z.output<typeof shape>) =>
      call(buildEndpoints.inviteTester, { params: place, body: { ...body, dueOn: dueOn === '' ? null : dueOn } }),
    onSuccess: async () => {
      reset()
      onClose()
      await client.invalidateQueries({ queryKey: buildInvitationsQuery(place).queryKey })
    },
  })
  const { errors } = formState
  return (
    <Dialog title={buildWords.inviteTitle} isOpen={isOpen} onClose={onClose}>
      <form
        noValidate
        className="space-y-4"
        onSubmit={(event) => void handleSubmit((values) => invite.mutate(values))(event)}
      >
        <Field label={buildWords.name} error={errors.name?.message}>
          {(parts) => <input {...parts} {...register('name')} className="field" />}
        </Field>
        <Field label={buildWords.email} error={errors.email?.message}>
          {(parts) => <input {...parts} {...register('email')} type="email" className="field" />}
        </Field>
        <Field label={buildWords.inviteNote}>
          {(parts) => <textarea {...parts} {...register('note')} rows={3} className="field" />}
        </Field>
        <Field label={buildWords.dueOn} hint={commonWords.optional}>
          {(parts) => <input {...parts} {...register('dueOn')} type="date" min={today()} className="field" />}
        </Field>
        <RefusalNote error={invite.error} />
        <div className="flex gap-3">
          <button type="submit" className="button" data-kind="main" disabled={invite.isPending}>
            {invite.isPending ? commonWords.sending : buildWords.invite}
          </button>
          <button type="button" className="button" onClick={onClose}>
            {commonWords.cancel}
          </button>
        </div>
      </form>
    </Dialog>
  )
}
