import { useId, type JSX, type ReactNode } from 'react'

export interface FieldParts {
  readonly id: string
  readonly 'aria-describedby': string | undefined
  readonly 'aria-invalid': boolean | undefined
}

/** A control with its label, its hint and what is wrong with it, tied together. */
export function Field({
  label,
  hint,
  error,
  children,
}: {
  readonly label: string
  readonly hint?: string | undefined
  readonly error?: string | undefined
  readonly children: (parts: FieldParts) => ReactNode
}): JSX.Element {
  const id = useId()
  const described = [hint === undefined ? null : `${id}-hint`, error === undefined ? null : `${id}-error`].filter(
    (part) => part !== null,
  )
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="mb-1 block text-sm font-semibold">
        {label}
      </label>
      {children({
        id,
        'aria-describedby': described.length === 0 ? undefined : described.join(' '),
        'aria-invalid': error === undefined ? undefined : true,
      })}
      {hint === undefined ? null : (
        <p id={`${id}-hint`} className="mt-1 text-sm text-soft">
          {hint}
        </p>
      )}
      {error === undefined ? null : (
        <p id={`${id}-error`} className="mt-1 text-sm font-semibold text-fail">
          {error}
        </p>
      )}
    </div>
  )
}
