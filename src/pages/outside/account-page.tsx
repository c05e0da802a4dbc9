import { useQuery } from '@tanstack/react-query'
import type { JSX, ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { accountEndpoints } from '../../../shared/api/account-endpoints.ts'
import { teamEndpoints } from '../../../shared/api/team-endpoints.ts'
import { paths } from '../../app/paths.ts'
import { EmailForm, NameForm, PasswordForm, TeamForm } from '../../features/account/account-forms.tsx'
import { meQuery, type Me } from '../../features/session/session-queries.ts'
import { useTeamAction } from '../../features/team/use-team-action.ts'
import { call } from '../../lib/api.ts'
import { momentText } from '../../lib/dates.ts'
import { useTitle } from '../../lib/use-title.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Loaded } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { SureButton } from '../../ui/sure-button.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { outsideWords } from '../../words/outside-words.ts'
import { teamWords } from '../../words/team-words.ts'

function Sessions(): ReactNode {
  const sessions = useQuery({
    queryKey: ['sessions'],
    queryFn: ({ signal }) => call(accountEndpoints.sessions, { signal }),
  })
  const end = useTeamAction([['sessions']], (session: string) =>
    call(accountEndpoints.endSession, { params: { session } }),
  )
  return (
    <Loaded query={sessions}>
      {({ items }) => (
        <>
          <RefusalNote error={end.error} />
          <DataTable
            caption={outsideWords.sessions}
            rows={items}
            keyOf={(row) => row.id}
            columns={[
              {
                name: outsideWords.session,
                isHead: true,
                cell: (row) => (
                  <>
                    {row.device === '' ? row.address : row.device}{' '}
                    {row.isThis ? <span className="label">({outsideWords.thisSession})</span> : null}
                  </>
                ),
              },
              { name: outsideWords.sessionStarted, isExtra: true, cell: (row) => momentText(row.startedAt) },
              { name: outsideWords.sessionSeen, cell: (row) => momentText(row.lastSeenAt) },
              {
                name: outsideWords.endSession,
                cell: (row) =>
                  row.isThis ? null : (
                    <button
                      type="button"
                      className="button"
                      data-size="small"
                      disabled={end.isPending}
                      onClick={() => end.mutate(row.id)}
                    >
                      {outsideWords.endSession}
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

function Teams({ me }: { readonly me: Me }): JSX.Element {
  const leave = useTeamAction([['me']], (team: string) => call(teamEndpoints.leaveTeam, { params: { team } }))
  return (
    <>
      {me.teams.length === 0 ? <p className="mb-3">{outsideWords.noTeams}</p> : null}
      <ul className="mb-5 space-y-2">
        {me.teams.map((team) => (
          <li key={team.slug} className="flex flex-wrap items-center justify-between gap-3">
            <span>
              {team.role === 'tester' ? team.name : <Link to={paths.sets(team.slug)}>{team.name}</Link>}{' '}
              <span className="label">{teamWords.roles[team.role]}</span>
            </span>
            <SureButton
              name={outsideWords.leave}
              label={`${outsideWords.leave}: ${team.name}`}
              isBusy={leave.isPending}
              onSure={() => leave.mutate(team.slug)}
            />
          </li>
        ))}
      </ul>
      <RefusalNote error={leave.error} />
      <details>
        <summary className="font-semibold">{outsideWords.makeTeam}</summary>
        <div className="mt-3 max-w-md">
          <TeamForm />
        </div>
      </details>
    </>
  )
}

/** The own account: name, address, password, sessions and teams. */
export default function AccountPage(): JSX.Element | null {
  useTitle(outsideWords.accountTitle)
  const me = useQuery(meQuery)
  if (me.data == null) return null
  return (
    <>
      <TitleBlock title={outsideWords.accountTitle} above={me.data.email} />
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <Sheet title={outsideWords.teams}>
          <Teams me={me.data} />
        </Sheet>
        <Sheet title={outsideWords.name}>
          <NameForm key={me.data.id} me={me.data} />
        </Sheet>
        <Sheet title={outsideWords.changePassword}>
          <PasswordForm />
        </Sheet>
        <Sheet title={outsideWords.changeEmail}>
          <EmailForm />
        </Sheet>
        <div className="lg:col-span-2">
          <Sheet title={outsideWords.sessions}>
            <Sessions />
          </Sheet>
        </div>
      </div>
    </>
  )
}
