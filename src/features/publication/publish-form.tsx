import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useState, type JSX, type ReactNode } from 'react'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { limits } from '../../../shared/api/limits.ts'
import { publicationEndpoints } from '../../../shared/api/publication-endpoints.ts'
import { call } from '../../lib/api.ts'
import { Field } from '../../ui/field.tsx'
import { Loaded } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { commonWords } from '../../words/common-words.ts'
import { publicationWords } from '../../words/publication-words.ts'
import { proposalQuery } from './publication-queries.ts'

interface Place {
  readonly team: string
  readonly set: string
  readonly number: number
}

type Proposal = AnswerOf<typeof publicationEndpoints.proposal>

function Form({ place, proposal }: { readonly place: Place; readonly proposal: Proposal }): JSX.Element {
  const client = useQueryClient()
  const [label, setLabel] = useState<string>(proposal.label)
  const [notes, setNotes] = useState('')
  const [reason, setReason] = useState('')
  const publish = useMutation({
    mutationFn: () =>
      call(publicationEndpoints.publish, {
        params: place,
        body: { label, notes, overrideReason: reason.trim() === '' ? null : reason },
      }),
    onSuccess: () => client.invalidateQueries(),
  })
  return (
    <form
      className="mt-4 space-y-3 border-t border-hair pt-4"
      onSubmit={(event) => {
        event.preventDefault()
        publish.mutate()
      }}
    >
      <Field label={publicationWords.label} hint={`${publicationWords.steps[proposal.step]}: ${proposal.why}`}>
        {(parts) => (
          <input
            {...parts}
            required
            pattern="\d{1,4}\.\d{1,4}\.\d{1,4}"
            className="field figure max-w-40"
            value={label}
            onChange={({ target }) => setLabel(target.value)}
          />
        )}
      </Field>
      <Field label={publicationWords.notes}>
        {(parts) => (
          <textarea
            {...parts}
            rows={2}
            maxLength={limits.note}
            className="field"
            value={notes}
            onChange={({ target }) => setNotes(target.value)}
          />
        )}
      </Field>
      {proposal.blockers.length === 0 ? null : (
        <Field label={publicationWords.override} hint={publicationWords.overrideHint}>
          {(parts) => (
            <input
              {...parts}
              maxLength={limits.reason}
              className="field"
              value={reason}
              onChange={({ target }) => setReason(target.value)}
            />
          )}
        </Field>
      )}
      <RefusalNote error={publish.error} />
      <div role="status">
        {publish.data === undefined ? null : (
          <StateMark state="published">{publicationWords.published(publish.data.label)}</StateMark>
        )}
      </div>
      <button type="submit" className="button" data-kind="main" disabled={publish.isPending || publish.isSuccess}>
        {publish.isPending ? commonWords.sending : publicationWords.publish}
      </button>
    </form>
  )
}

/** What stands between a version and publication, which label it would get, and publishing it. */
export function PublishForm({ place, canPublish }: { readonly place: Place; readonly canPublish: boolean }): ReactNode {
  const proposal = useQuery(proposalQuery(place.team, place.set, place.number))
  return (
    <Loaded query={proposal}>
      {(data) => (
        <>
          {data.blockers.length === 0 ? (
            <p>
              <StateMark state="pass">{publicationWords.noBlockers}</StateMark>
            </p>
          ) : (
            <ul className="space-y-1">
              {data.blockers.map((blocker) => (
                <li key={blocker}>
                  <StateMark state="warn">{blocker}</StateMark>
                </li>
              ))}
            </ul>
          )}
          <ul className="mt-3 space-y-1 text-sm" aria-label={publicationWords.checklist}>
            {data.checklist.map(({ item, isDone }) => (
              <li key={item} className="flex flex-wrap items-baseline gap-2">
                <StateMark state={isDone ? 'ticked' : 'open'}>
                  {isDone ? publicationWords.done : publicationWords.notDone}
                </StateMark>
                <span>{item}</span>
              </li>
            ))}
          </ul>
          {data.mating.length === 0 ? null : (
            <details className="mt-3">
              <summary className="text-sm font-semibold">{publicationWords.mating}</summary>
              <ul className="mt-1 list-inside list-disc text-sm">
                {data.mating.map((sentence) => (
                  <li key={sentence}>{sentence}</li>
                ))}
              </ul>
            </details>
          )}
          {canPublish ? <Form key={data.label} place={place} proposal={data} /> : null}
        </>
      )}
    </Loaded>
  )
}
