import { useQuery } from '@tanstack/react-query'
import type { JSX } from 'react'
import { Navigate, Outlet, useLocation, useParams } from 'react-router-dom'
import { meQuery } from '../features/session/session-queries.ts'
import { teamQuery } from '../features/team/team-queries.ts'
import { Failed, Waiting } from '../ui/loaded.tsx'
import { commonWords } from '../words/common-words.ts'
import { AwayBanner } from './away-banner.tsx'
import { PageHead, PlaceNav } from './page-head.tsx'
import { paths } from './paths.ts'
import { SessionWatch } from './session-watch.tsx'

const teamParts = /^\/teams\/[^/]+\/(team|papers|tokens|notices|webhooks|audit|settings)$/
const setParts = /^\/teams\/[^/]+\/(sets|holds|upload)/

function Places({ team, canRead }: { readonly team: string | undefined; readonly canRead: boolean }): JSX.Element {
  const { nav } = commonWords
  const own = { to: paths.myBuilds, name: nav.builds }
  const places =
    team === undefined || !canRead
      ? [own]
      : [
          { to: paths.sets(team), name: nav.sets, also: setParts },
          { to: paths.tryIt(team), name: nav.tryIt },
          { to: paths.team(team), name: nav.team, also: teamParts },
          own,
        ]
  return <PlaceNav label={commonWords.places} places={places} />
}

/** Everything behind sign-in: the head with the places of the team in the address, or of the first one. */
export function SignedInLayout(): JSX.Element {
  const me = useQuery(meQuery)
  const { team: slug } = useParams()
  const { pathname, search } = useLocation()
  const memberships = me.data?.teams ?? []
  const current = memberships.find((team) => team.slug === slug) ?? memberships[0]
  const team = useQuery({ ...teamQuery(slug ?? ''), enabled: slug !== undefined && current?.role !== 'tester' })
  if (me.data === null)
    return <Navigate to={`${paths.signIn}?next=${encodeURIComponent(`${pathname}${search}`)}`} replace />
  return (
    <>
      <SessionWatch />
      <AwayBanner />
      <PageHead me={me.data ?? null}>
        <Places team={current?.slug} canRead={current !== undefined && current.role !== 'tester'} />
      </PageHead>
      <main id="page" tabIndex={-1} className="mx-auto max-w-[84rem] px-4 py-6 outline-none">
        {me.isError ? (
          <Failed error={me.error} onAgain={() => void me.refetch()} />
        ) : me.data === undefined ? (
          <Waiting />
        ) : team.isError ? (
          <Failed error={team.error} onAgain={() => void team.refetch()} />
        ) : (
          <Outlet />
        )}
      </main>
    </>
  )
}
