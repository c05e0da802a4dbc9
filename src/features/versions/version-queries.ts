import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { versionEndpoints } from '../../../shared/api/version-endpoints.ts'
import { call, fileAddress } from '../../lib/api.ts'

export type Version = AnswerOf<typeof versionEndpoints.version>
export type VersionRow = AnswerOf<typeof versionEndpoints.versions>['items'][number]
export type VersionComparison = AnswerOf<typeof versionEndpoints.compare>

export const versionsQuery = (team: string, set: string, branch: string) =>
  infiniteQueryOptions({
    queryKey: ['versions', team, set, branch],
    queryFn: ({ pageParam, signal }) =>
      call(versionEndpoints.versions, {
        params: { team, set },
        query: {
          ...(branch === '' ? {} : { branch }),
          ...(pageParam === null ? {} : { cursor: pageParam }),
        },
        signal,
      }),
    initialPageParam: null as string | null,
    getNextPageParam: ({ next }) => next,
  })

export const versionsCsvAddress = (team: string, set: string, branch: string): string =>
  fileAddress(versionEndpoints.versionsCsv, { params: { team, set }, query: branch === '' ? {} : { branch } })

export const versionQuery = (team: string, set: string, number: number) =>
  queryOptions({
    queryKey: ['version', team, set, number],
    queryFn: ({ signal }) => call(versionEndpoints.version, { params: { team, set, number }, signal }),
  })

export const comparisonQuery = (team: string, set: string, number: number, other: number | null) =>
  queryOptions({
    queryKey: ['comparison', team, set, number, other],
    queryFn: ({ signal }) =>
      call(versionEndpoints.compare, {
        params: { team, set, number },
        query: other === null ? {} : { with: other },
        signal,
      }),
  })
