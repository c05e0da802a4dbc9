import { queryOptions, useQuery } from '@tanstack/react-query'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { Action } from '../../../shared/api/permissions.ts'
import { teamEndpoints } from '../../../shared/api/team-endpoints.ts'
import { call } from '../../lib/api.ts'

export type Team = AnswerOf<typeof teamEndpoints.team>

export const teamQuery = (team: string) =>
  queryOptions({
    queryKey: ['team', team],
    queryFn: ({ signal }) => call(teamEndpoints.team, { params: { team }, signal }),
    staleTime: 60_000,
  })

/** Whether the reader may do something in a team; false until that is known. */
export function useMay(team: string): (action: Action) => boolean {
  const { data } = useQuery(teamQuery(team))
  return (action) => data?.may.includes(action) ?? false
}
