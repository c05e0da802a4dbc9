import { queryOptions } from '@tanstack/react-query'
import type { WorkspaceText } from './judge-text.ts'

/** What a stored version is drawn from. */
export interface VersionText {
  readonly file: string
  readonly text: string
  readonly workspace: WorkspaceText | null
  readonly digest: string
  readonly asOf: string
}

/** Blanks of a stored version. The engine is fetched only where something is drawn. */
export const blanksQuery = (version: VersionText) =>
  queryOptions({
    queryKey: ['blanks', version.digest, version.file],
    queryFn: async () => {
      const { blanksOf } = await import('./judge-text.ts')
      return blanksOf(version.text, version.workspace, { file: version.file, asOf: version.asOf })
    },
    staleTime: Infinity,
  })
