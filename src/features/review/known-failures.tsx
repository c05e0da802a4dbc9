import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import { reviewEndpoints } from '../../../shared/api/review-endpoints.ts'
import { call } from '../../lib/api.ts'
import { dayText } from '../../lib/dates.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Loaded } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { setWords } from '../../words/set-words.ts'
import { knownFailuresQuery } from './review-queries.ts'

/** Failures that were accepted until a day, lapsed ones too. */
export function KnownFailures({
  team,
  set,
  canEnd,
}: {
  readonly team: string
  readonly set: string
  readonly canEnd: boolean
}): ReactNode {
  const client = useQueryClient()
  const failures = useQuery(knownFailuresQuery(team, set))
  const end = useMutation({
    mutationFn: (failure: string) => call(reviewEndpoints.endFailure, { params: { team, set, failure } }),
    onSuccess: () => client.invalidateQueries(),
  })
  return (
    <Loaded
      query={failures}
      isEmpty={({ items }) => items.length === 0}
      empty={<p className="text-sm text-soft">{setWords.noFailures}</p>}
    >
      {({ items }) => (
        <>
          <DataTable
            caption={setWords.failures}
            rows={items}
            keyOf={(row) => row.id}
            columns={[
              {
                name: setWords.fingerprint,
                isHead: true,
                cell: (row) => <span className="figure">{row.fingerprint}</span>,
              },
              { name: setWords.state, cell: (row) => <StateMark state={row.state} /> },
              { name: setWords.reason, cell: (row) => row.reason },
              { name: setWords.until, cell: (row) => dayText(row.until) },
              { name: setWords.acceptedBy, isExtra: true, cell: (row) => row.acceptedBy },
              ...(canEnd
                ? [
                    {
                      name: setWords.endIt,
                      cell: (row: (typeof items)[number]) =>
                        row.state === 'ended' ? null : (
                          <button
                            type="button"
                            className="button"
                            data-size="small"
                            disabled={end.isPending}
                            onClick={() => end.mutate(row.id)}
                          >
                            {setWords.endIt}
                          </button>
                        ),
                    },
                  ]
                : []),
            ]}
          />
          <RefusalNote error={end.error} />
        </>
      )}
    </Loaded>
  )
}
