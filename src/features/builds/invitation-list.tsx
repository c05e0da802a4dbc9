import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import { buildEndpoints } from '../../../shared/api/build-endpoints.ts'
import { call } from '../../lib/api.ts'
import { dayText } from '../../lib/dates.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Loaded } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { buildWords } from '../../words/build-words.ts'
import { setWords } from '../../words/set-words.ts'
import { buildInvitationsQuery, type BuildInvitation, type Place } from './build-queries.ts'

/** Who was invited to build a version, and how far they are. */
export function InvitationList({
  place,
  canRevoke,
}: {
  readonly place: Place
  readonly canRevoke: boolean
}): ReactNode {
  const client = useQueryClient()
  const invitations = useQuery(buildInvitationsQuery(place))
  const revoke = useMutation({
    mutationFn: (invitation: string) =>
      call(buildEndpoints.revokeBuildInvitation, { params: { team: place.team, invitation } }),
    onSuccess: () => client.invalidateQueries({ queryKey: buildInvitationsQuery(place).queryKey }),
  })
  return (
    <Loaded
      query={invitations}
      isEmpty={({ items }) => items.length === 0}
      empty={<p className="text-sm text-soft">{buildWords.noInvitations}</p>}
    >
      {({ items }) => (
        <>
          <DataTable
            caption={buildWords.invitations}
            rows={items}
            keyOf={(row) => row.id}
            columns={[
              { name: buildWords.tester, isHead: true, cell: (row) => row.name },
              { name: buildWords.email, isExtra: true, cell: (row) => row.email },
              { name: buildWords.stamp, cell: (row) => <span className="figure">{row.stamp}</span> },
              { name: setWords.state, cell: (row) => buildWords.states[row.state] },
              { name: buildWords.dueOn, isExtra: true, cell: (row) => (row.dueOn === null ? '–' : dayText(row.dueOn)) },
              ...(canRevoke
                ? [
                    {
                      name: buildWords.revoke,
                      cell: (row: BuildInvitation) =>
                        row.state === 'revoked' || row.state === 'expired' ? null : (
                          <button
                            type="button"
                            className="button"
                            data-size="small"
                            aria-label={`${buildWords.revoke}: ${row.name}`}
                            disabled={revoke.isPending}
                            onClick={() => revoke.mutate(row.id)}
                          >
                            {buildWords.revoke}
                          </button>
                        ),
                    },
                  ]
                : []),
            ]}
          />
          <RefusalNote error={revoke.error} />
        </>
      )}
    </Loaded>
  )
}
