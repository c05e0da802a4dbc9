import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { Link } from 'react-router-dom'
import { limits } from '../../../shared/api/limits.ts'
import { reviewEndpoints } from '../../../shared/api/review-endpoints.ts'
import type { Report } from '../../../shared/report/report.ts'
import { paths } from '../../app/paths.ts'
import { call } from '../../lib/api.ts'
import { momentText } from '../../lib/dates.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { Field } from '../../ui/field.tsx'
import { Empty } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { commonWords } from '../../words/common-words.ts'
import { reviewWords } from '../../words/review-words.ts'
import { reviewQuery, type Review } from './review-queries.ts'

interface Place {
  readonly team: string
  readonly set: string
  readonly number: number
}

type Comment = Review['comments'][number]

const anchorOf = (about: string): { readonly kind: 'version' | 'fit' | 'piece'; readonly name: string | null } => {
  const [kind, ...name] = about.split(':')
  return kind === 'fit' || kind === 'piece' ? { kind, name: name.join(':') } : { kind: 'version', name: null }
}

function CommentForm({ place, report }: { readonly place: Place; readonly report: Report }): JSX.Element {
  const client = useQueryClient()
  const { value, choose } = useAddressFilter()
  const [body, setBody] = useState('')
  const about = value('about')
  const send = useMutation({
    mutationFn: () => call(reviewEndpoints.comment, { params: place, body: { anchor: anchorOf(about), body } }),
    onSuccess: async () => {
      setBody('')
      await client.invalidateQueries({ queryKey: reviewQuery(place.team, place.set, place.number).queryKey })
    },
  })
  return (
    <form
      className="mt-4 space-y-3 border-t border-hair pt-4"
      onSubmit={(event) => {
        event.preventDefault()
        send.mutate()
      }}
    >
      <Field label={reviewWords.about}>
        {(parts) => (
          <select {...parts} className="field" value={about} onChange={({ target }) => choose({ about: target.value })}>
            <option value="">{reviewWords.wholeVersion}</option>
            {report.fits.map(({ id }) => (
              <option key={id} value={`fit:${id}`}>
                {reviewWords.anchors.fit} {id}
              </option>
            ))}
            {Object.keys(report.pieces).map((name) => (
              <option key={name} value={`piece:${name}`}>
                {reviewWords.anchors.piece} {name}
              </option>
            ))}
          </select>
        )}
      </Field>
      <Field label={reviewWords.body}>
        {(parts) => (
          <textarea
            {...parts}
            required
            rows={3}
            maxLength={limits.comment}
            className="field"
            value={body}
            onChange={({ target }) => setBody(target.value)}
          />
        )}
      </Field>
      <RefusalNote error={send.error} />
      <button type="submit" className="button" disabled={send.isPending || body.trim() === ''}>
        {send.isPending ? commonWords.sending : reviewWords.send}
      </button>
    </form>
  )
}

function CommentEntry({
  place,
  comment,
  canResolve,
}: {
  readonly place: Place
  readonly comment: Comment
  readonly canResolve: boolean
}): JSX.Element {
  const client = useQueryClient()
  const resolve = useMutation({
    mutationFn: (isResolved: boolean) =>
      call(reviewEndpoints.resolveComment, { params: { team: place.team, comment: comment.id }, body: { isResolved } }),
    onSuccess: () => client.invalidateQueries({ queryKey: reviewQuery(place.team, place.set, place.number).queryKey }),
  })
  const { kind, name } = comment.anchor
  const isResolved = comment.resolvedAt !== null
  return (
    <li className={`border-l-4 pl-3 ${isResolved ? 'border-hair' : 'border-info'}`}>
      <p className="flex flex-wrap items-baseline gap-x-3">
        <span className="font-semibold">{comment.by.name}</span>
        {name === null ? null : (
          <Link to={`${paths.version(place.team, place.set, place.number)}#${kind}-${name}`}>
            {reviewWords.anchors[kind]} {name}
          </Link>
        )}
        <span className="label">
          {momentText(comment.createdAt)}, {reviewWords.onVersion(comment.version)}
        </span>
      </p>
      <p className="whitespace-pre-wrap">{comment.body}</p>
      <p className="flex flex-wrap items-center gap-3 text-sm">
        {isResolved ? <span className="text-soft">{reviewWords.resolved(comment.resolvedBy ?? '')}</span> : null}
        {canResolve ? (
          <button
            type="button"
            className="button"
            data-size="small"
            disabled={resolve.isPending}
            onClick={() => resolve.mutate(!isResolved)}
          >
            {isResolved ? reviewWords.reopen : reviewWords.resolve}
          </button>
        ) : null}
      </p>
      <RefusalNote error={resolve.error} />
    </li>
  )
}

/** Comments on a version, its fits and pieces, and a form for one more. */
export function Comments({
  place,
  review,
  report,
  canComment,
}: {
  readonly place: Place
  readonly review: Review
  readonly report: Report
  readonly canComment: boolean
}): JSX.Element {
  const { value, choose } = useAddressFilter()
  const onlyOpen = value('comments') === 'open'
  const shown = review.comments.filter(({ resolvedAt }) => !onlyOpen || resolvedAt === null)
  return (
    <>
      <div className="mb-3 flex flex-wrap items-center justify-between gap-3">
        <p className="font-semibold">{reviewWords.unresolved(review.unresolved)}</p>
        <label className="flex items-center gap-2 text-sm">
          {reviewWords.show}
          <select
            className="field w-auto"
            value={onlyOpen ? 'open' : ''}
            onChange={({ target }) => choose({ comments: target.value })}
          >
            <option value="">{reviewWords.showAll}</option>
            <option value="open">{reviewWords.showOpen}</option>
          </select>
        </label>
      </div>
      {shown.length === 0 ? (
        <Empty title={reviewWords.noComments} />
      ) : (
        <ul className="space-y-4">
          {shown.map((comment) => (
            <CommentEntry key={comment.id} place={place} comment={comment} canResolve={canComment} />
          ))}
        </ul>
      )}
      {canComment ? <CommentForm place={place} report={report} /> : null}
    </>
  )
}
