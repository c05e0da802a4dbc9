import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { JSX } from 'react'
import { versionEndpoints } from '../../../shared/api/version-endpoints.ts'
import { call } from '../../lib/api.ts'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { commonWords } from '../../words/common-words.ts'
import { stateWords } from '../../words/state-words.ts'
import { versionWords } from '../../words/version-words.ts'
import { versionQuery, type Version } from './version-queries.ts'

/** What must be known of who judged a version: an older engine, or a sender that saw it differently. */
export function EngineNotes({
  team,
  version,
  canRecheck,
}: {
  readonly team: string
  readonly version: Version
  readonly canRecheck: boolean
}): JSX.Element | null {
  const client = useQueryClient()
  const { set, number } = version
  const recheck = useMutation({
    mutationFn: () => call(versionEndpoints.recheck, { params: { team, set, number } }),
    onSuccess: () => client.invalidateQueries({ queryKey: versionQuery(team, set, number).queryKey }),
  })
  if (!version.isOldEngine && version.differs === null) return null
  return (
    <div className="space-y-3 border-l-4 border-warn bg-warn-wash p-4">
      {version.differs === null ? null : (
        <p>
          <span className="font-semibold">{versionWords.differs}:</span> {version.differs}
        </p>
      )}
      {version.isOldEngine ? <p>{versionWords.oldEngine(version.engine)}</p> : null}
      {version.rechecks.map((said) => (
        <p key={said.engine} className="figure text-sm">
          {versionWords.rechecked(said.engine, stateWords[said.verdict])} · {versionWords.worksShare(said.works)}
        </p>
      ))}
      {version.isOldEngine && canRecheck ? (
        <button type="button" className="button" disabled={recheck.isPending} onClick={() => recheck.mutate()}>
          {recheck.isPending ? commonWords.sending : versionWords.recheck}
        </button>
      ) : null}
      <RefusalNote error={recheck.error} />
    </div>
  )
}
