import { useMutation, useQueryClient, type UseMutationResult } from '@tanstack/react-query'

/** Something done to a team; whatever shows the named parts is asked for again. */
export function useTeamAction<Given, Answer>(
  keys: readonly (readonly string[])[],
  act: (given: Given) => Promise<Answer>,
): UseMutationResult<Answer, Error, Given> {
  const client = useQueryClient()
  return useMutation({
    mutationFn: act,
    onSuccess: () => Promise.all(keys.map((queryKey) => client.invalidateQueries({ queryKey }))),
  })
}
