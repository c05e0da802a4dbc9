import { zodResolver } from '@hookform/resolvers/zod'
import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { JSX } from 'react'
import { useForm, type UseFormRegisterReturn } from 'react-hook-form'
import { z } from 'zod'
import { limits } from '../../../shared/api/limits.ts'
import { publicationEndpoints } from '../../../shared/api/publication-endpoints.ts'
import { call } from '../../lib/api.ts'
import { Dialog } from '../../ui/dialog.tsx'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { commonWords } from '../../words/common-words.ts'
import { outsideWords } from '../../words/outside-words.ts'
import { publicationWords } from '../../words/publication-words.ts'

const severities = ['cosmetic', 'wastes-paper', 'will-not-assemble'] as const

const shape = z.object({
  labels: z.array(z.string()).min(1, outsideWords.required),
  pieces: z.array(z.string()),
  pages: z.string(),
  symptom: z.string().trim().min(1, outsideWords.required).max(limits.reason),
  wrong: z.string().max(limits.reason),
  right: z.string().max(limits.reason),
  severity: z.enum(severities),
  workaround: z.string().max(limits.note),
  replacement: z.string(),
  thanks: z.string().max(limits.name),
})

type Values = z.output<typeof shape>

function Ticks({
  legend,
  names,
  field,
}: {
  readonly legend: string
  readonly names: readonly string[]
  readonly field: UseFormRegisterReturn
}): JSX.Element {
  return (
    <fieldset>
      <legend className="text-sm font-semibold">{legend}</legend>
      <div className="flex flex-wrap gap-x-5">
        {names.map((name) => (
          <label key={name} className="flex items-center gap-2 py-1">
            <input type="checkbox" value={name} {...field} />
            {name}
          </label>
        ))}
      </div>
    </fieldset>
  )
}

interface Given {
  readonly team: string
  readonly set: string
  readonly label: string | null
  readonly labels: readonly string[]
  readonly pieces: readonly string[]
  readonly onClose: () => void
}

function Fields({ team, set, label, labels, pieces, onClose }: Given): JSX.Element {
  const client = useQueryClient()
  const { register, handleSubmit, formState } = useForm<Values>({
    resolver: zodResolver(shape),
    defaultValues: {
      labels: label === null ? [] : [label],
      pieces: [],
      pages: '',
      symptom: '',
      wrong: '',
      right: '',
      severity: 'wastes-paper',
      workaround: '',
      replacement: '',
      thanks: '',
    },
  })
  const add = useMutation({
    mutationFn: ({ pages, replacement, ...body }: Values) =>
      call(publicationEndpoints.addErratum, {
        params: { team, set },
        body: {
          ...body,
          pages: pages
            .split('\n')
            .map((page) => page.trim())
            .filter((page) => page !== ''),
          replacement: replacement === '' ? null : replacement,
        },
      }),
    onSuccess: async () => {
      onClose()
      await client.invalidateQueries({ queryKey: ['publications', team, set] })
    },
  })
  return (
    <form
      noValidate
      className="space-y-3"
      onSubmit={(event) => void handleSubmit((values) => add.mutate(values))(event)}
    >
      <Ticks legend={publicationWords.about} names={labels} field={register('labels')} />
      <Ticks legend={publicationWords.pieces} names={pieces} field={register('pieces')} />
      <Field label={publicationWords.symptom} error={formState.errors.symptom?.message}>
        {(parts) => <input {...parts} {...register('symptom')} className="field" />}
      </Field>
      <div className="grid gap-3 sm:grid-cols-2">
        <Field label={publicationWords.wrong}>
          {(parts) => <input {...parts} {...register('wrong')} className="field figure" />}
        </Field>
        <Field label={publicationWords.right}>
          {(parts) => <input {...parts} {...register('right')} className="field figure" />}
        </Field>
        <Field label={publicationWords.severity}>
          {(parts) => (
            <select {...parts} {...register('severity')} className="field">
              {severities.map((name) => (
                <option key={name} value={name}>
                  {publicationWords.severities[name]}
                </option>
              ))}
            </select>
          )}
        </Field>
        <Field label={publicationWords.replacement}>
          {(parts) => (
            <select {...parts} {...register('replacement')} className="field">
              <option value="">{publicationWords.noReplacement}</option>
              {labels.map((name) => (
                <option key={name}>{name}</option>
              ))}
            </select>
          )}
        </Field>
      </div>
      <Field label={publicationWords.pages} hint={publicationWords.pagesHint}>
        {(parts) => <textarea {...parts} {...register('pages')} rows={2} className="field" />}
      </Field>
      <Field label={publicationWords.workaround}>
        {(parts) => <textarea {...parts} {...register('workaround')} rows={2} className="field" />}
      </Field>
      <Field label={publicationWords.thanks}>
        {(parts) => <input {...parts} {...register('thanks')} className="field" />}
      </Field>
      <RefusalNote error={add.error} />
      <div className="flex gap-3">
        <button type="submit" className="button" data-kind="main" disabled={add.isPending}>
          {add.isPending ? commonWords.sending : publicationWords.erratum}
        </button>
        <button type="button" className="button" onClick={onClose}>
          {commonWords.cancel}
        </button>
      </div>
    </form>
  )
}

/** A correction: what is wrong in what makers printed, and what to reprint. */
export function ErratumForm(given: Given): JSX.Element {
  return (
    <Dialog title={publicationWords.erratumTitle} isOpen={given.label !== null} onClose={given.onClose}>
      {given.label === null ? null : <Fields key={given.label} {...given} />}
    </Dialog>
  )
}
