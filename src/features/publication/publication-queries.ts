import { queryOptions } from '@tanstack/react-query'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { publicationEndpoints } from '../../../shared/api/publication-endpoints.ts'
import { call } from '../../lib/api.ts'

export type Publication = AnswerOf<typeof publicationEndpoints.publications>['items'][number]
export type Erratum = Publication['errata'][number]

export const publicationsQuery = (team: string, set: string) =>
  queryOptions({
    queryKey: ['publications', team, set],
    queryFn: ({ signal }) => call(publicationEndpoints.publications, { params: { team, set }, signal }),
    // Files are drawn in the background after publishing.
    refetchInterval: ({ state }) =>
      state.data?.items.some(({ exports }) => exports === 'pending') === true ? 2_500 : false,
  })

export const proposalQuery = (team: string, set: string, number: number) =>
  queryOptions({
    queryKey: ['proposal', team, set, number],
    queryFn: ({ signal }) => call(publicationEndpoints.proposal, { params: { team, set, number }, signal }),
  })

export const publicPageQuery = (page: string, label: string) =>
  queryOptions({
    queryKey: ['public', page, label],
    queryFn: ({ signal }) =>
      call(publicationEndpoints.publicPage, { params: { page }, query: label === '' ? {} : { label }, signal }),
  })
