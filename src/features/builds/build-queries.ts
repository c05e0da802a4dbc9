import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query'
import { buildEndpoints } from '../../../shared/api/build-endpoints.ts'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { call, fileAddress } from '../../lib/api.ts'

export interface Place {
  readonly team: string
  readonly set: string
  readonly number: number
}

export type Study = AnswerOf<typeof buildEndpoints.study>
export type BuildRow = AnswerOf<typeof buildEndpoints.builds>['items'][number]
export type BuildInvitation = AnswerOf<typeof buildEndpoints.buildInvitations>['items'][number]
export type Import = AnswerOf<typeof buildEndpoints.importBuilds>

export const myBuildsQuery = queryOptions({
  queryKey: ['my-builds'],
  queryFn: ({ signal }) => call(buildEndpoints.myBuilds, { signal }),
})

export const buildFormQuery = (key: string) =>
  queryOptions({
    queryKey: ['build-form', key],
    queryFn: ({ signal }) => call(buildEndpoints.buildForm, { params: { key }, signal }),
    // What is being typed must not be overwritten by what was kept.
    staleTime: Infinity,
    refetchOnWindowFocus: false,
  })

export const studyQuery = (place: Place) =>
  queryOptions({
    queryKey: ['study', place.team, place.set, place.number],
    queryFn: ({ signal }) => call(buildEndpoints.study, { params: place, signal }),
  })

export const buildsQuery = (place: Place) =>
  infiniteQueryOptions({
    queryKey: ['builds', place.team, place.set, place.number],
    queryFn: ({ pageParam, signal }) =>
      call(buildEndpoints.builds, { params: place, query: pageParam === null ? {} : { cursor: pageParam }, signal }),
    initialPageParam: null as string | null,
    getNextPageParam: ({ next }) => next,
  })

export const buildInvitationsQuery = (place: Place) =>
  queryOptions({
    queryKey: ['build-invitations', place.team, place.set, place.number],
    queryFn: ({ signal }) => call(buildEndpoints.buildInvitations, { params: place, signal }),
  })

export const buildsCsvAddress = (place: Place): string => fileAddress(buildEndpoints.buildsCsv, { params: place })
export const templateAddress = (place: Place, units: 'mm' | 'in'): string =>
  fileAddress(buildEndpoints.buildsTemplate, { params: place, query: { units } })
