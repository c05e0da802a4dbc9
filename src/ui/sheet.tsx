import { useId, type JSX, type ReactNode } from 'react'

/** A part of a page on its own sheet, headed by its name and a score line. */
export function Sheet({
  title,
  aside,
  id,
  level = 2,
  children,
}: {
  readonly title: string
  readonly aside?: ReactNode
  readonly id?: string
  readonly level?: 2 | 3
  readonly children: ReactNode
}): JSX.Element {
  const own = useId()
  const Heading = `h${String(level)}` as 'h2' | 'h3'
  return (
    <section id={id} aria-labelledby={own} className="sheet p-4 sm:p-5">
      <div className="mb-3 flex flex-wrap items-center gap-x-4 gap-y-1">
        <Heading id={own} className="score-line flex min-w-0 flex-1 items-center text-base">
          {title}
        </Heading>
        {aside}
      </div>
      {children}
    </section>
  )
}
