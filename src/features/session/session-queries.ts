import { queryOptions } from '@tanstack/react-query'
import { accountEndpoints } from '../../../shared/api/account-endpoints.ts'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { call } from '../../lib/api.ts'
import { isSignedOut } from '../../lib/refusals.ts'

export type Me = AnswerOf<typeof accountEndpoints.me>

/** Who is signed in; null where nobody is. */
export const meQuery = queryOptions({
  queryKey: ['me'],
  queryFn: async ({ signal }): Promise<Me | null> => {
    try {
      return await call(accountEndpoints.me, { signal })
    } catch (error) {
      if (isSignedOut(error)) return null
      throw error
    }
  },
  staleTime: 60_000,
})
