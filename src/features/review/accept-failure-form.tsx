import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { limits } from '../../../shared/api/limits.ts'
import { reviewEndpoints } from '../../../shared/api/review-endpoints.ts'
import type { Verdict } from '../../../shared/report/report.ts'
import { call } from '../../lib/api.ts'
import { today } from '../../lib/dates.ts'
import { Dialog } from '../../ui/dialog.tsx'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { commonWords } from '../../words/common-words.ts'
import { setWords } from '../../words/set-words.ts'
import { versionWords } from '../../words/version-words.ts'

/** Accepts a failure until a day, with a reason. */
export function AcceptFailureForm({
  team,
  set,
  verdict,
  onClose,
}: {
  readonly team: string
  readonly set: string
  readonly verdict: Verdict | null
  readonly onClose: () => void
}): JSX.Element {
  const client = useQueryClient()
  const [reason, setReason] = useState('')
  const [until, setUntil] = useState('')
  const accept = useMutation({
    mutationFn: () =>
      call(reviewEndpoints.acceptFailure, {
        params: { team, set },
        body: { fingerprint: verdict?.fingerprint ?? '', reason, until },
      }),
    onSuccess: async () => {
      onClose()
      await client.invalidateQueries()
    },
  })
  return (
    <Dialog title={versionWords.acceptTitle} isOpen={verdict !== null} onClose={onClose}>
      <form
        className="space-y-4"
        onSubmit={(event) => {
          event.preventDefault()
          accept.mutate()
        }}
      >
        <p className="border-l-4 border-fail pl-3 text-sm">{verdict?.message}</p>
        <p>{versionWords.acceptExplain}</p>
        <Field label={setWords.reason}>
          {(parts) => (
            <textarea
              {...parts}
              required
              rows={3}
              maxLength={limits.reason}
              className="field"
              value={reason}
              onChange={({ target }) => setReason(target.value)}
            />
          )}
        </Field>
        <Field label={setWords.until}>
          {(parts) => (
            <input
              {...parts}
              type="date"
              required
              min={today()}
              className="field"
              value={until}
              onChange={({ target }) => setUntil(target.value)}
            />
          )}
        </Field>
        <RefusalNote error={accept.error} />
        <div className="flex gap-3">
          <button type="submit" className="button" data-kind="main" disabled={accept.isPending}>
            {accept.isPending ? commonWords.sending : versionWords.accept}
          </button>
          <button type="button" className="button" onClick={onClose}>
            {commonWords.cancel}
          </button>
        </div>
      </form>
    </Dialog>
  )
}
