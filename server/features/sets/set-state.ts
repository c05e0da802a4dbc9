import type { EntityManager } from 'typeorm'
import type { setStates } from '../../../shared/api/set-endpoints.ts'
import type { Version } from '../versions/version.entity.ts'
import { Version as VersionEntity } from '../versions/version.entity.ts'
import { TemplateSet } from './template-set.entity.ts'

export type SetState = (typeof setStates)[number]

/** Order of the list: what needs somebody first. */
export const stateRanks: Readonly<Record<SetState, number>> = {
  'newly-failing': 0,
  invalid: 1,
  failing: 2,
  warning: 3,
  'known-failing': 4,
  passing: 5,
}

/** The state of a set by its shown version and the failures that are accepted. */
export function stateOfSet(
  version: Pick<Version, 'verdict' | 'failing' | 'changeState'>,
  known: ReadonlySet<string>,
): SetState {
  if (version.verdict === 'invalid') return 'invalid'
  const news = version.failing.filter((fingerprint) => !known.has(fingerprint))
  if (news.length > 0)
    return version.changeState === 'worse' || version.changeState === 'first' ? 'newly-failing' : 'failing'
  if (version.failing.length > 0) return 'known-failing'
  return version.verdict === 'warn' ? 'warning' : 'passing'
}

/** Fingerprints of failures accepted on a day. */
export async function knownFingerprints(
  manager: EntityManager,
  setId: string,
  today: string,
): Promise<ReadonlySet<string>> {
  const rows: { fingerprint: string }[] = await manager.query(
    'select fingerprint from known_failure where set_id = $1 and ended_at is null and until >= $2::date',
    [setId, today],
  )
  return new Set(rows.map(({ fingerprint }) => fingerprint))
}

/** Writes the state of a set anew after anything that bears on it. */
export async function refreshSetState(manager: EntityManager, setId: string, today: string): Promise<void> {
  const set = await manager.findOneBy(TemplateSet, { id: setId })
  if (set?.shownVersionId == null) return
  const version = await manager.findOneBy(VersionEntity, { id: set.shownVersionId })
  if (version === null) return
  const state = stateOfSet(version, await knownFingerprints(manager, setId, today))
  if (state !== set.state) await manager.update(TemplateSet, { id: setId }, { state, stateRank: stateRanks[state] })
}
