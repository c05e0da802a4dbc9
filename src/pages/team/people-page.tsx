import { useQuery } from '@tanstack/react-query'
import { useState, type JSX, type ReactNode } from 'react'
import { actions, permissions, roles } from '../../../shared/api/permissions.ts'
import { teamEndpoints } from '../../../shared/api/team-endpoints.ts'
import { InvitePersonForm } from '../../features/team/invite-person-form.tsx'
import { TeamHead } from '../../features/team/team-head.tsx'
import { useMay } from '../../features/team/team-queries.ts'
import { useTeamAction } from '../../features/team/use-team-action.ts'
import { call } from '../../lib/api.ts'
import { dayText } from '../../lib/dates.ts'
import { usePart } from '../../lib/use-part.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Loaded } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { SureButton } from '../../ui/sure-button.tsx'
import { teamWords } from '../../words/team-words.ts'

function Members({ team, canManage }: { readonly team: string; readonly canManage: boolean }): ReactNode {
  const members = useQuery({
    queryKey: ['members', team],
    queryFn: ({ signal }) => call(teamEndpoints.members, { params: { team }, signal }),
  })
  const keys = [['members', team], ['team', team], ['me']]
  const change = useTeamAction(keys, ({ person, role }: { person: string; role: (typeof roles)[number] }) =>
    call(teamEndpoints.changeRole, { params: { team, person }, body: { role } }),
  )
  const remove = useTeamAction(keys, (person: string) => call(teamEndpoints.removeMember, { params: { team, person } }))
  return (
    <Loaded query={members}>
      {({ items }) => (
        <>
          <RefusalNote error={change.error ?? remove.error} />
          <DataTable
            caption={teamWords.people}
            rows={items}
            keyOf={(row) => row.id}
            columns={[
              {
                name: teamWords.name,
                isHead: true,
                cell: (row) => (
                  <>
                    {row.name} {row.isMe ? <span className="label">({teamWords.you})</span> : null}
                    <div className="font-normal text-soft">{row.email}</div>
                  </>
                ),
              },
              {
                name: teamWords.role,
                cell: (row) =>
                  canManage ? (
                    <select
                      className="field w-auto"
                      aria-label={teamWords.roleOf(row.name)}
                      value={row.role}
                      disabled={change.isPending}
                      onChange={({ target }) => {
                        const role = roles.find((name) => name === target.value)
                        if (role !== undefined) change.mutate({ person: row.id, role })
                      }}
                    >
                      {roles.map((role) => (
                        <option key={role} value={role}>
                          {teamWords.roles[role]}
                        </option>
                      ))}
                    </select>
                  ) : (
                    teamWords.roles[row.role]
                  ),
              },
              { name: teamWords.joined, isExtra: true, cell: (row) => dayText(row.joinedAt) },
              ...(canManage
                ? [
                    {
                      name: teamWords.remove,
                      cell: (row: (typeof items)[number]) =>
                        row.isMe ? null : (
                          <SureButton
                            name={teamWords.remove}
                            label={teamWords.removeMember(row.name)}
                            isBusy={remove.isPending}
                            onSure={() => remove.mutate(row.id)}
                          />
                        ),
                    },
                  ]
                : []),
            ]}
          />
        </>
      )}
    </Loaded>
  )
}

function Invitations({ team }: { readonly team: string }): ReactNode {
  const invitations = useQuery({
    queryKey: ['invitations', team],
    queryFn: ({ signal }) => call(teamEndpoints.invitations, { params: { team }, signal }),
  })
  const revoke = useTeamAction([['invitations', team]], (invitation: string) =>
    call(teamEndpoints.revokeInvitation, { params: { team, invitation } }),
  )
  return (
    <Loaded
      query={invitations}
      isEmpty={({ items }) => items.length === 0}
      empty={<p className="text-sm text-soft">{teamWords.noInvitations}</p>}
    >
      {({ items }) => (
        <>
          <RefusalNote error={revoke.error} />
          <DataTable
            caption={teamWords.invitations}
            rows={items}
            keyOf={(row) => row.id}
            columns={[
              { name: teamWords.email, isHead: true, cell: (row) => row.email },
              { name: teamWords.role, cell: (row) => teamWords.roles[row.role] },
              { name: teamWords.state, cell: (row) => teamWords.states[row.state] },
              { name: teamWords.until, isExtra: true, cell: (row) => dayText(row.expiresAt) },
              { name: teamWords.invitedBy, isExtra: true, cell: (row) => row.invitedBy },
              {
                name: teamWords.takeBack,
                cell: (row) =>
                  row.state === 'open' ? (
                    <button
                      type="button"
                      className="button"
                      data-size="small"
                      aria-label={`${teamWords.takeBack}: ${row.email}`}
                      onClick={() => revoke.mutate(row.id)}
                    >
                      {teamWords.takeBack}
                    </button>
                  ) : null,
              },
            ]}
          />
        </>
      )}
    </Loaded>
  )
}

function RolesTable(): JSX.Element {
  return (
    <DataTable
      caption={teamWords.rolesExplain}
      rows={actions}
      keyOf={(action) => action}
      columns={[
        { name: teamWords.did, isHead: true, cell: (action) => <span className="figure font-normal">{action}</span> },
        ...roles.map((role) => ({
          name: teamWords.roles[role],
          cell: (action: (typeof actions)[number]) => {
            const allowance = permissions[action][role]
            if (allowance === 'no') return <span className="text-soft">–</span>
            return allowance === 'yes' ? (
              <StateMark state="pass">{teamWords.yes}</StateMark>
            ) : (
              <span className="text-sm">{teamWords.choiceNames[allowance]}</span>
            )
          },
        })),
      ]}
    />
  )
}

export default function PeoplePage(): JSX.Element {
  const team = usePart('team')
  const may = useMay(team)
  const [isInviting, setIsInviting] = useState(false)
  const canManage = may('team:manage')
  return (
    <>
      <TeamHead
        team={team}
        title={teamWords.people}
        actions={
          canManage ? (
            <button type="button" className="button" data-kind="main" onClick={() => setIsInviting(true)}>
              {teamWords.invite}
            </button>
          ) : undefined
        }
      />
      <div className="space-y-5">
        <Sheet title={teamWords.people}>
          <Members team={team} canManage={canManage} />
        </Sheet>
        {canManage ? (
          <Sheet title={teamWords.invitations}>
            <Invitations team={team} />
          </Sheet>
        ) : null}
        <Sheet title={teamWords.rolesExplain}>
          <RolesTable />
        </Sheet>
      </div>
      <InvitePersonForm team={team} isOpen={isInviting} onClose={() => setIsInviting(false)} />
    </>
  )
}
