import { useQuery } from '@tanstack/react-query'
import { useState, type JSX, type ReactNode } from 'react'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { upkeepEndpoints } from '../../../shared/api/upkeep-endpoints.ts'
import { call } from '../../lib/api.ts'
import { Field } from '../../ui/field.tsx'
import { Loaded } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { commonWords } from '../../words/common-words.ts'
import { teamWords } from '../../words/team-words.ts'
import { useTeamAction } from '../team/use-team-action.ts'

type Retention = AnswerOf<typeof upkeepEndpoints.retention>

const fields = [
  ['mainDays', 7],
  ['branchDays', 1],
  ['branchVersions', 1],
] as const

function Form({ team, retention }: { readonly team: string; readonly retention: Retention }): JSX.Element {
  const [typed, setTyped] = useState(() => ({
    mainDays: retention.mainDays === null ? '' : String(retention.mainDays),
    branchDays: retention.branchDays === null ? '' : String(retention.branchDays),
    branchVersions: retention.branchVersions === null ? '' : String(retention.branchVersions),
  }))
  const number = (text: string): number | null => (text.trim() === '' ? null : Number(text))
  const change = useTeamAction([['retention', team]], (isTrial: boolean) =>
    call(upkeepEndpoints.changeRetention, {
      params: { team },
      query: { dryRun: isTrial ? 'true' : 'false' },
      body: {
        mainDays: number(typed.mainDays),
        branchDays: number(typed.branchDays),
        branchVersions: number(typed.branchVersions),
      },
    }),
  )
  return (
    <form
      className="space-y-3"
      onSubmit={(event) => {
        event.preventDefault()
        change.mutate(false)
      }}
    >
      <div className="grid gap-3 sm:grid-cols-3">
        {fields.map(([name, min]) => (
          <Field key={name} label={teamWords[name]}>
            {(parts) => (
              <input
                {...parts}
                type="number"
                min={min}
                className="field figure"
                value={typed[name]}
                onChange={({ target }) => setTyped({ ...typed, [name]: target.value })}
              />
            )}
          </Field>
        ))}
      </div>
      <RefusalNote error={change.error} />
      <div className="flex flex-wrap items-center gap-3">
        <button type="button" className="button" disabled={change.isPending} onClick={() => change.mutate(true)}>
          {teamWords.tryRetention}
        </button>
        <button type="submit" className="button" data-kind="main" disabled={change.isPending}>
          {commonWords.save}
        </button>
        <span role="status">
          {change.data === undefined
            ? ''
            : `${change.variables ? '' : `${commonWords.saved}. `}${teamWords.wouldRemove(change.data.wouldRemove)}`}
        </span>
      </div>
    </form>
  )
}

/** How long versions are kept, and what tonight would remove. */
export function RetentionForm({ team }: { readonly team: string }): ReactNode {
  const retention = useQuery({
    queryKey: ['retention', team],
    queryFn: ({ signal }) => call(upkeepEndpoints.retention, { params: { team }, signal }),
  })
  return <Loaded query={retention}>{(data) => <Form team={team} retention={data} />}</Loaded>
}
