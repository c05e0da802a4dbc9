import type { JSX, ReactNode } from 'react'

/** The head of a page, as drawings have it: its title, and cells with what it is of. */
export function TitleBlock({
  title,
  above,
  cells = [],
  actions,
}: {
  readonly title: string
  readonly above?: ReactNode
  readonly cells?: readonly { readonly label: string; readonly value: ReactNode }[]
  readonly actions?: ReactNode
}): JSX.Element {
  return (
    <header className="mb-5 border-2 border-ink bg-sheet">
      <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3 px-4 py-3">
        <div className="min-w-0">
          {above === undefined ? null : <div className="label mb-0.5">{above}</div>}
          <h1 className="line-clamp-4 text-xl sm:text-2xl">{title}</h1>
        </div>
        {actions === undefined ? null : <div className="no-print flex flex-wrap gap-2">{actions}</div>}
      </div>
      {cells.length === 0 ? null : (
        <dl className="grid grid-cols-2 gap-px border-t border-ink bg-hair sm:flex sm:flex-wrap">
          {cells.map(({ label, value }) => (
            <div key={label} className="min-w-0 bg-sheet px-4 py-1.5 last:odd:col-span-2 sm:grow">
              <dt className="label">{label}</dt>
              <dd className="min-w-0 text-sm">{value}</dd>
            </div>
          ))}
        </dl>
      )}
    </header>
  )
}
