import { useMutation, useQuery } from '@tanstack/react-query'
import { useEffect, useState, type JSX, type ReactNode } from 'react'
import { useForm, useWatch } from 'react-hook-form'
import { buildEndpoints } from '../../../shared/api/build-endpoints.ts'
import { limits } from '../../../shared/api/limits.ts'
import { buildFormQuery } from '../../features/builds/build-queries.ts'
import { draftOf, readDraft, type Draft, type FormAnswer } from '../../features/builds/draft.ts'
import {
  FitsPart,
  MeasurePart,
  PaperPart,
  ProblemsPart,
  ScalePart,
  ToolsPart,
} from '../../features/builds/test-form-parts.tsx'
import { TestPhotos } from '../../features/builds/test-photos.tsx'
import { call } from '../../lib/api.ts'
import { dayText } from '../../lib/dates.ts'
import { readStored, store } from '../../lib/stored.ts'
import { useUnits } from '../../lib/units.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Field } from '../../ui/field.tsx'
import { Loaded } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { commonWords } from '../../words/common-words.ts'
import { buildWords } from '../../words/build-words.ts'

const storeKey = (key: string): string => `foldgauge-draft-${key}`

/** What was typed here last; null where it is none or of another form. */
function typedBefore(key: string, fresh: Draft): Draft | null {
  try {
    const kept = JSON.parse(readStored(storeKey(key)) ?? 'null') as Draft | null
    return kept !== null && kept.readings.length === fresh.readings.length && kept.fits.length === fresh.fits.length
      ? kept
      : null
  } catch {
    return null
  }
}

function TestForm({ linkKey, answer }: { readonly linkKey: string; readonly answer: FormAnswer }): JSX.Element {
  const units = useUnits()
  const { form } = answer
  const [fresh] = useState(() => draftOf(answer, units))
  const { register, control, getValues, handleSubmit } = useForm<Draft>({
    defaultValues: typedBefore(linkKey, fresh) ?? fresh,
  })
  const values = useWatch({ control })
  const [wrong, setWrong] = useState<readonly string[]>([])
  useEffect(() => store(storeKey(linkKey), JSON.stringify(values)), [linkKey, values])

  const read = () => {
    const { report, problems } = readDraft(getValues(), form)
    setWrong(problems)
    return { report, isWrong: problems.length > 0 }
  }
  const keep = useMutation({
    mutationFn: () => call(buildEndpoints.saveBuild, { params: { key: linkKey }, body: read().report }),
  })
  const send = useMutation({
    mutationFn: async () => {
      const { report, isWrong } = read()
      return isWrong ? null : call(buildEndpoints.submitBuild, { params: { key: linkKey }, body: report })
    },
    onSuccess: (build) => {
      if (build !== null) store(storeKey(linkKey), null)
    },
  })
  const isSent = send.data != null
  return (
    <form className="space-y-5" onSubmit={(event) => void handleSubmit(() => send.mutate())(event)}>
      {form.note === '' ? null : (
        <Sheet title={buildWords.asked}>
          <p className="whitespace-pre-wrap">{form.note}</p>
        </Sheet>
      )}
      <aside aria-label={buildWords.cautions} className="border-l-4 border-warn bg-warn-wash p-4 text-sm">
        <p className="font-semibold">{buildWords.cautions}</p>
        <ul className="list-inside list-disc">
          {form.cautions.map((caution) => (
            <li key={caution}>{caution}</li>
          ))}
        </ul>
      </aside>
      <Sheet title={buildWords.scaleHeading}>
        <ScalePart register={register} />
      </Sheet>
      <Sheet title={buildWords.paperHeading}>
        <PaperPart register={register} />
      </Sheet>
      <Sheet title={buildWords.measureHeading}>
        <MeasurePart register={register} form={form} units={values.units ?? units} />
      </Sheet>
      <Sheet title={buildWords.fitsHeading}>
        <FitsPart register={register} form={form} />
      </Sheet>
      <Sheet title={buildWords.problemsHeading}>
        <ProblemsPart register={register} control={control} form={form} />
      </Sheet>
      <Sheet title={buildWords.toolsHeading}>
        <ToolsPart register={register} />
      </Sheet>
      <Sheet title={buildWords.photosHeading}>
        <TestPhotos linkKey={linkKey} photos={answer.build?.photos ?? []} onBefore={() => keep.mutateAsync()} />
      </Sheet>
      <Sheet title={buildWords.noteHeading}>
        <Field label={buildWords.note}>
          {(parts) => <textarea {...parts} {...register('note')} rows={4} maxLength={limits.note} className="field" />}
        </Field>
      </Sheet>
      <div className="sticky bottom-0 -mx-4 border-t-2 border-ink bg-sheet px-4 py-3">
        {wrong.length === 0 ? null : (
          <ul role="alert" className="mb-2 text-sm font-semibold text-fail">
            {wrong.map((problem) => (
              <li key={problem}>{problem}</li>
            ))}
          </ul>
        )}
        <RefusalNote error={send.error ?? keep.error} />
        <div className="flex flex-wrap items-center gap-3">
          <button type="submit" className="button min-h-11" data-kind="main" disabled={send.isPending}>
            {send.isPending ? commonWords.sending : buildWords.submit}
          </button>
          <button type="button" className="button min-h-11" disabled={keep.isPending} onClick={() => keep.mutate()}>
            {keep.isPending ? commonWords.saving : buildWords.saveDraft}
          </button>
          <span role="status" className="text-sm">
            {isSent ? buildWords.submitted : keep.isSuccess ? buildWords.draftKept : buildWords.draftLocal}
          </span>
        </div>
      </div>
    </form>
  )
}

/** The tester's form: phone first, kept as it is typed, no account needed. */
export default function TestFormPage(): ReactNode {
  const key = usePart('key')
  const form = useQuery(buildFormQuery(key))
  useTitle(form.data?.form.title ?? buildWords.openForm)
  return (
    <Loaded query={form} lines={8}>
      {(answer) => (
        <>
          <TitleBlock
            title={answer.form.title}
            above={buildWords.formAbove(answer.form.team, answer.form.stamp)}
            cells={answer.form.dueOn === null ? [] : [{ label: buildWords.dueOn, value: dayText(answer.form.dueOn) }]}
          />
          <TestForm linkKey={key} answer={answer} />
        </>
      )}
    </Loaded>
  )
}
