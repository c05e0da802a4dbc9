import { useMutation, useQueryClient, type UseMutationResult } from '@tanstack/react-query'
import { setEndpoints } from '../../../shared/api/set-endpoints.ts'
import { versionEndpoints } from '../../../shared/api/version-endpoints.ts'
import { call, sendFile } from '../../lib/api.ts'
import { setQuery, type TemplateSet } from './set-queries.ts'

interface Changes {
  readonly tags?: string[]
  readonly isPublic?: boolean
}

export function useChangeSet(team: string, set: string): UseMutationResult<TemplateSet, Error, Changes> {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (body: Changes) => call(setEndpoints.changeSet, { params: { team, set }, body }),
    onSuccess: (data) => {
      client.setQueryData(setQuery(team, set).queryKey, data)
      void client.invalidateQueries({ queryKey: ['sets', team] })
    },
  })
}

export function usePutPhoto(team: string, set: string): UseMutationResult<unknown, Error, File> {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (file: File) => sendFile(setEndpoints.putSetPhoto, { params: { team, set } }, file),
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: setQuery(team, set).queryKey })
      void client.invalidateQueries({ queryKey: ['sets', team] })
    },
  })
}

/** Pins a version as baseline of later ones, or leaves the choice to the rules (null). */
export function usePinBaseline(
  team: string,
  set: string,
): UseMutationResult<unknown, Error, { readonly number: number; readonly note: string } | null> {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (pin) =>
      pin === null
        ? call(versionEndpoints.unpinBaseline, { params: { team, set } })
        : call(versionEndpoints.pinBaseline, { params: { team, set }, body: pin }),
    onSuccess: () =>
      Promise.all(
        [
          ['set', team, set],
          ['versions', team, set],
          ['version', team, set],
          ['comparison', team, set],
        ].map((queryKey) => client.invalidateQueries({ queryKey })),
      ),
  })
}
