import type { EntityManager } from 'typeorm'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { setEndpoints } from '../../../shared/api/set-endpoints.ts'
import { found } from '../../http/refusal.ts'
import { Version } from '../versions/version.entity.ts'
import type { TemplateSet } from './template-set.entity.ts'
import { branchesOf, listSets, type SetListRow } from './sets.repository.ts'

type Row = AnswerOf<(typeof setEndpoints)['sets']>['items'][number]

const photoPath = (team: string, set: string, key: string): string =>
  // The key changes with the photograph, so that a browser never shows an old one.
  `/api/teams/${team}/sets/${encodeURIComponent(set)}/photo?size=thumbnail&of=${key.slice(-8)}`

export const presentSetRow = (team: string, row: SetListRow): Row => ({
  name: row.name,
  title: row.title,
  family: row.family,
  units: row.units,
  tags: row.tags,
  state: row.state,
  latest: {
    number: row.number,
    branch: row.branch,
    verdict: row.verdict,
    works: row.works,
    counts: row.counts,
    pushedAt: row.pushedAt.toISOString(),
  },
  worstFit: row.worstFit,
  trend: row.trend ?? [],
  published: row.published,
  review: row.reviewState,
  knownFailures: row.knownFailures,
  builds: row.builds,
  photo: row.photoKey === null ? null : photoPath(team, row.name, row.photoKey),
  updatedAt: row.updatedAt.toISOString(),
})

export async function presentSet(
  manager: EntityManager,
  team: string,
  set: TemplateSet,
  today: string,
): Promise<AnswerOf<(typeof setEndpoints)['set']>> {
  const [row] = await listSets(manager, set.teamId, {}, null, 1, today, set.id)
  const pinned = set.pinnedVersionId === null ? null : await manager.findOneBy(Version, { id: set.pinnedVersionId })
  const branches = await branchesOf(manager, set.id)
  return {
    ...presentSetRow(team, found(row)),
    branches: branches.map((branch) => ({
      branch: branch.branch,
      number: branch.number,
      verdict: branch.verdict,
      change: {
        state: branch.changeState,
        sentence: branch.changeSentence,
        newlyFailing: branch.newlyFailing,
        nowPassing: branch.nowPassing,
      },
      pushedAt: branch.pushedAt.toISOString(),
    })),
    pinned: pinned === null ? null : { number: pinned.number, note: set.pinNote ?? '', by: set.pinnedBy ?? '' },
    isPublic: set.isPublic,
    publicPage: set.isPublic && set.publicKey !== null ? `/public/${set.publicKey}` : null,
    versions: set.lastNumber,
  }
}
