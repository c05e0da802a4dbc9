import { queryOptions } from '@tanstack/react-query'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { reviewEndpoints } from '../../../shared/api/review-endpoints.ts'
import { call } from '../../lib/api.ts'

export type Review = AnswerOf<typeof reviewEndpoints.review>
export type KnownFailure = AnswerOf<typeof reviewEndpoints.knownFailures>['items'][number]

export const reviewQuery = (team: string, set: string, number: number) =>
  queryOptions({
    queryKey: ['review', team, set, number],
    queryFn: ({ signal }) => call(reviewEndpoints.review, { params: { team, set, number }, signal }),
  })

export const knownFailuresQuery = (team: string, set: string) =>
  queryOptions({
    queryKey: ['known-failures', team, set],
    queryFn: ({ signal }) => call(reviewEndpoints.knownFailures, { params: { team, set }, signal }),
  })
