import type { JSX } from 'react'
import { reasonOf } from '../lib/refusals.ts'

/** What the server said no to, beside the control that asked. */
export function RefusalNote({ error }: { readonly error: unknown }): JSX.Element | null {
  if (error === null || error === undefined) return null
  const { fact, hint, problems } = reasonOf(error)
  return (
    <div role="alert" className="border-l-4 border-fail bg-fail-wash p-3 text-sm">
      <p className="font-semibold">{fact}</p>
      {hint === null ? null : <p>{hint}</p>}
      {problems.length === 0 ? null : (
        <ul className="mt-1 list-inside list-disc">
          {problems.slice(0, 20).map((problem) => (
            <li key={problem}>{problem}</li>
          ))}
        </ul>
      )}
    </div>
  )
}
