import { useQuery } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import { upkeepEndpoints } from '../../../shared/api/upkeep-endpoints.ts'
import { call } from '../../lib/api.ts'
import { momentText } from '../../lib/dates.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Loaded } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { teamWords } from '../../words/team-words.ts'
import { useTeamAction } from '../team/use-team-action.ts'

/** Work that failed for good: mails, exports, comparisons. */
export function FailedWork({ team }: { readonly team: string }): ReactNode {
  const work = useQuery({
    queryKey: ['failed-work', team],
    queryFn: ({ signal }) => call(upkeepEndpoints.deadJobs, { params: { team }, signal }),
  })
  const retry = useTeamAction([['failed-work', team]], (job: string) =>
    call(upkeepEndpoints.retryJob, { params: { team, job } }),
  )
  return (
    <Loaded
      query={work}
      isEmpty={({ items }) => items.length === 0}
      empty={<p className="text-sm text-soft">{teamWords.noFailedWork}</p>}
    >
      {({ items }) => (
        <>
          <RefusalNote error={retry.error} />
          <DataTable
            caption={teamWords.failedWork}
            rows={items}
            keyOf={(row) => row.id}
            columns={[
              { name: teamWords.work, isHead: true, cell: (row) => `${row.kind}: ${row.about}` },
              { name: teamWords.reason, cell: (row) => row.reason },
              { name: teamWords.at, isExtra: true, cell: (row) => momentText(row.failedAt) },
              {
                name: teamWords.retry,
                cell: (row) => (
                  <button
                    type="button"
                    className="button"
                    data-size="small"
                    disabled={retry.isPending}
                    onClick={() => retry.mutate(row.id)}
                  >
                    {teamWords.retry}
                  </button>
                ),
              },
            ]}
          />
        </>
      )}
    </Loaded>
  )
}
