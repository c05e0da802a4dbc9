import { useMutation, useQueryClient, type UseMutationResult } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { limits } from '../../../shared/api/limits.ts'
import { reviewEndpoints } from '../../../shared/api/review-endpoints.ts'
import { call } from '../../lib/api.ts'
import { dayText, momentText } from '../../lib/dates.ts'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { commonWords } from '../../words/common-words.ts'
import { reviewWords } from '../../words/review-words.ts'
import type { Review } from './review-queries.ts'

interface Place {
  readonly team: string
  readonly set: string
  readonly number: number
}

type Decision = 'approve' | 'ask-changes'

/** Whatever is decided changes the version, its set and the lists that show them. */
function useRefreshed<T>(act: (values: T) => Promise<unknown>): UseMutationResult<unknown, Error, T> {
  const client = useQueryClient()
  return useMutation({ mutationFn: act, onSuccess: () => client.invalidateQueries() })
}

function AskForm({ place }: { readonly place: Place }): JSX.Element {
  const [note, setNote] = useState('')
  const ask = useRefreshed(() => call(reviewEndpoints.askReview, { params: place, body: { note } }))
  return (
    <form
      className="space-y-3"
      onSubmit={(event) => {
        event.preventDefault()
        ask.mutate(undefined)
      }}
    >
      <Field label={reviewWords.askNote}>
        {(parts) => (
          <textarea
            {...parts}
            rows={2}
            maxLength={limits.note}
            className="field"
            value={note}
            onChange={({ target }) => setNote(target.value)}
          />
        )}
      </Field>
      <RefusalNote error={ask.error} />
      <button type="submit" className="button" data-kind="main" disabled={ask.isPending}>
        {ask.isPending ? commonWords.sending : reviewWords.ask}
      </button>
    </form>
  )
}

function DecideForm({ place, content }: { readonly place: Place; readonly content: string }): JSX.Element {
  const [note, setNote] = useState('')
  const [reason, setReason] = useState('')
  const decide = useRefreshed((decision: Decision) =>
    call(reviewEndpoints.decide, {
      params: place,
      body: { decision, note, content, overrideReason: reason.trim() === '' ? null : reason },
    }),
  )
  return (
    <div className="space-y-3">
      <Field label={reviewWords.decideNote}>
        {(parts) => (
          <textarea
            {...parts}
            rows={2}
            maxLength={limits.note}
            className="field"
            value={note}
            onChange={({ target }) => setNote(target.value)}
          />
        )}
      </Field>
      <details>
        <summary className="text-sm">{reviewWords.override}</summary>
        <div className="mt-2">
          <Field label={reviewWords.override} hint={reviewWords.overrideHint}>
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
        </div>
      </details>
      <RefusalNote error={decide.error} />
      <div className="flex flex-wrap gap-3">
        <button
          type="button"
          className="button"
          data-kind="main"
          disabled={decide.isPending}
          onClick={() => decide.mutate('approve')}
        >
          {reviewWords.approve}
        </button>
        <button
          type="button"
          className="button"
          disabled={decide.isPending}
          onClick={() => decide.mutate('ask-changes')}
        >
          {reviewWords.askChanges}
        </button>
      </div>
    </div>
  )
}

/** Who asked for review, what was decided, and the forms for both. */
export function Decisions({
  place,
  review,
  content,
  canAsk,
  canDecide,
}: {
  readonly place: Place
  readonly review: Review
  readonly content: string
  readonly canAsk: boolean
  readonly canDecide: boolean
}): JSX.Element {
  return (
    <div className="space-y-4">
      {review.asked === null ? (
        <p className="text-soft">{reviewWords.notAsked}</p>
      ) : (
        <div>
          <p className="font-semibold">{reviewWords.asked(review.asked.by, dayText(review.asked.at))}</p>
          <p className="whitespace-pre-wrap">{review.asked.note}</p>
        </div>
      )}
      <ul className="space-y-2">
        {review.decisions.length === 0 ? <li className="text-soft">{reviewWords.noDecisions}</li> : null}
        {review.decisions.map((decision) => (
          <li key={decision.id}>
            <StateMark
              state={decision.isStale ? 'stale' : decision.decision === 'approve' ? 'approved' : 'changes-asked'}
            >
              {decision.decision === 'approve' ? reviewWords.approved : reviewWords.askedChanges}
            </StateMark>{' '}
            <span className="font-semibold">{decision.by.name}</span>{' '}
            <span className="label">
              {momentText(decision.decidedAt)}, {reviewWords.onVersion(decision.version)}
              {decision.isStale ? `, ${reviewWords.stale}` : ''}
              {decision.overrideReason === null ? '' : `, ${reviewWords.overridden(decision.overrideReason)}`}
            </span>
            {decision.note === '' ? null : <p className="whitespace-pre-wrap text-sm">{decision.note}</p>}
          </li>
        ))}
      </ul>
      {review.asked === null && canAsk ? <AskForm place={place} /> : null}
      {canDecide ? (
        <DecideForm place={place} content={content} />
      ) : (
        <p className="text-sm text-soft">{reviewWords.mayNot}</p>
      )}
    </div>
  )
}
