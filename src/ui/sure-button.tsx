import { useState, type JSX } from 'react'
import { commonWords } from '../words/common-words.ts'

/** Asks once more before something that cannot be undone. */
export function SureButton({
  name,
  label,
  isBusy,
  onSure,
}: {
  readonly name: string
  /** For readers who hear the button alone. */
  readonly label?: string
  readonly isBusy: boolean
  readonly onSure: () => void
}): JSX.Element {
  const [isAsked, setIsAsked] = useState(false)
  if (!isAsked)
    return (
      <button
        type="button"
        className="button"
        data-size="small"
        aria-label={label}
        disabled={isBusy}
        onClick={() => setIsAsked(true)}
      >
        {name}
      </button>
    )
  return (
    <span className="inline-flex flex-wrap gap-2">
      <button
        type="button"
        autoFocus
        className="button"
        data-size="small"
        data-kind="grave"
        disabled={isBusy}
        onClick={() => {
          setIsAsked(false)
          onSure()
        }}
      >
        {label ?? name}
      </button>
      <button type="button" className="button" data-size="small" onClick={() => setIsAsked(false)}>
        {commonWords.cancel}
      </button>
    </span>
  )
}
