import { queryOptions } from '@tanstack/react-query'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { versionEndpoints } from '../../../shared/api/version-endpoints.ts'
import { call } from '../../lib/api.ts'

export type TrendPoint = AnswerOf<typeof versionEndpoints.trend>['items'][number]

export const trendQuery = (team: string, set: string, branch: string) =>
  queryOptions({
    queryKey: ['trend', team, set, branch],
    queryFn: ({ signal }) =>
      call(versionEndpoints.trend, {
        params: { team, set },
        query: branch === '' ? {} : { branch },
        signal,
      }),
  })
