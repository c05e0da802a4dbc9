import { useState, type JSX } from 'react'
import { limits } from '../../../shared/api/limits.ts'
import { Dialog } from '../../ui/dialog.tsx'
import { Field } from '../../ui/field.tsx'
import { commonWords } from '../../words/common-words.ts'
import { numbersWords } from '../../words/numbers-words.ts'
import type { Measure } from './number-queries.ts'

/** Asks what is doubtful about a measure. */
export function QueryForm({
  item,
  onClose,
  onSend,
}: {
  readonly item: Measure | null
  readonly onClose: () => void
  readonly onSend: (item: Measure, note: string) => void
}): JSX.Element {
  const [note, setNote] = useState('')
  return (
    <Dialog title={numbersWords.queryTitle(item?.what ?? '')} isOpen={item !== null} onClose={onClose}>
      <form
        className="space-y-4"
        onSubmit={(event) => {
          event.preventDefault()
          if (item !== null) onSend(item, note)
          setNote('')
          onClose()
        }}
      >
        <Field label={numbersWords.queryNote}>
          {(parts) => (
            <textarea
              {...parts}
              required
              rows={3}
              maxLength={limits.note}
              className="field"
              value={note}
              onChange={({ target }) => setNote(target.value)}
            />
          )}
        </Field>
        <div className="flex gap-3">
          <button type="submit" className="button" data-kind="main">
            {numbersWords.query}
          </button>
          <button type="button" className="button" onClick={onClose}>
            {commonWords.cancel}
          </button>
        </div>
      </form>
    </Dialog>
  )
}
