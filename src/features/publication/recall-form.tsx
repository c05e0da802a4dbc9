import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { publicationEndpoints } from '../../../shared/api/publication-endpoints.ts'
import { limits } from '../../../shared/api/limits.ts'
import { call } from '../../lib/api.ts'
import { Dialog } from '../../ui/dialog.tsx'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { commonWords } from '../../words/common-words.ts'
import { publicationWords } from '../../words/publication-words.ts'

/** Asks for the reason of a recall, after a checklist. */
export function RecallForm({
  team,
  set,
  label,
  onClose,
}: {
  readonly team: string
  readonly set: string
  readonly label: string | null
  readonly onClose: () => void
}): JSX.Element {
  const client = useQueryClient()
  const [reason, setReason] = useState('')
  const [ticked, setTicked] = useState<ReadonlySet<string>>(new Set())
  const recall = useMutation({
    mutationFn: () =>
      call(publicationEndpoints.recall, { params: { team, set, label: label ?? '' }, body: { reason } }),
    onSuccess: async () => {
      onClose()
      await client.invalidateQueries()
    },
  })
  const isReady = reason.trim() !== '' && publicationWords.recallItems.every((item) => ticked.has(item))
  return (
    <Dialog title={publicationWords.recallTitle(label ?? '')} isOpen={label !== null} onClose={onClose}>
      <form
        className="space-y-4"
        onSubmit={(event) => {
          event.preventDefault()
          recall.mutate()
        }}
      >
        <p>{publicationWords.recallExplain}</p>
        <fieldset>
          <legend className="text-sm font-semibold">{publicationWords.recallChecklist}</legend>
          {publicationWords.recallItems.map((item) => (
            <label key={item} className="flex items-start gap-2 py-1">
              <input
                type="checkbox"
                checked={ticked.has(item)}
                onChange={({ target }) =>
                  setTicked(
                    (before) =>
                      new Set(target.checked ? [...before, item] : [...before].filter((other) => other !== item)),
                  )
                }
              />
              <span>{item}</span>
            </label>
          ))}
        </fieldset>
        <Field label={publicationWords.recallWhy}>
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
        <RefusalNote error={recall.error} />
        <div className="flex gap-3">
          <button type="submit" className="button" data-kind="grave" disabled={!isReady || recall.isPending}>
            {recall.isPending ? commonWords.sending : publicationWords.recall}
          </button>
          <button type="button" className="button" onClick={onClose}>
            {commonWords.cancel}
          </button>
        </div>
      </form>
    </Dialog>
  )
}
