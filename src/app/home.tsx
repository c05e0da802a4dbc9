import { useQuery } from '@tanstack/react-query'
import type { JSX } from 'react'
import { Navigate } from 'react-router-dom'
import { meQuery } from '../features/session/session-queries.ts'
import { paths } from './paths.ts'

/** The first page: the sets of the first team that shows any, else what one is asked to build. */
export function Home(): JSX.Element | null {
  const me = useQuery(meQuery)
  if (me.data === undefined || me.data === null) return null
  const team = me.data.teams.find(({ role }) => role !== 'tester')
  if (team !== undefined) return <Navigate to={paths.sets(team.slug)} replace />
  return <Navigate to={me.data.teams.length === 0 ? paths.account : paths.myBuilds} replace />
}
