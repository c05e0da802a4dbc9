import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { setEndpoints, setStates } from '../../../shared/api/set-endpoints.ts'
import { call, fileAddress } from '../../lib/api.ts'

export type SetRow = AnswerOf<typeof setEndpoints.sets>['items'][number]
export type TemplateSet = AnswerOf<typeof setEndpoints.set>
export type Hold = AnswerOf<typeof setEndpoints.holds>['items'][number]

export interface SetFilter {
  readonly search: string
  readonly family: string
  readonly state: string
  readonly branch: string
  readonly tag: string
}

const queryOf = ({ state, ...filter }: SetFilter) => {
  const known = setStates.find((name) => name === state)
  return {
    ...Object.fromEntries(Object.entries(filter).filter(([, value]) => value !== '')),
    ...(known === undefined ? {} : { state: known }),
  }
}

export const setsQuery = (team: string, filter: SetFilter) =>
  infiniteQueryOptions({
    queryKey: ['sets', team, filter],
    queryFn: ({ pageParam, signal }) =>
      call(setEndpoints.sets, {
        params: { team },
        query: { ...queryOf(filter), ...(pageParam === null ? {} : { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: null as string | null,
    getNextPageParam: ({ next }) => next,
  })

export const setsCsvAddress = (team: string, filter: SetFilter): string =>
  fileAddress(setEndpoints.setsCsv, { params: { team }, query: queryOf(filter) })

export const setWordsQuery = (team: string) =>
  queryOptions({
    queryKey: ['set-words', team],
    queryFn: ({ signal }) => call(setEndpoints.setWords, { params: { team }, signal }),
  })

export const setQuery = (team: string, set: string) =>
  queryOptions({
    queryKey: ['set', team, set],
    queryFn: ({ signal }) => call(setEndpoints.set, { params: { team, set }, signal }),
  })

export interface Thing {
  readonly length: number
  readonly width: number
  readonly height: number | null
}

export const holdsQuery = (team: string, thing: Thing) =>
  queryOptions({
    queryKey: ['holds', team, thing],
    queryFn: ({ signal }) =>
      call(setEndpoints.holds, {
        params: { team },
        query: {
          length: thing.length,
          width: thing.width,
          ...(thing.height === null ? {} : { height: thing.height }),
        },
        signal,
      }),
  })
