import { QueryClient } from '@tanstack/react-query'
import { isPassing } from './refusals.ts'

export const queryClient = new QueryClient({
  defaultOptions: {
    queries: {
      staleTime: 15_000,
      retry: (count, error) => isPassing(error) && count < 2,
      retryDelay: (count) => 400 * 2 ** count,
    },
    mutations: { retry: false, networkMode: 'always' },
  },
})
