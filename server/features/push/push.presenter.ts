import type { EntityManager } from 'typeorm'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { pushEndpoints } from '../../../shared/api/push-endpoints.ts'
import { presentBaseline, presentChange } from '../versions/version.presenter.ts'
import { Version } from '../versions/version.entity.ts'
import { PushVersion } from './push-version.entity.ts'
import type { Push } from './push.entity.ts'
import { rippleCandidates } from './ripple.service.ts'

/** How many sets that wait for their turn are named in an answer. */
const rippleLimit = 200

/** A push with what became of its sets by now. */
export async function presentPush(
  manager: EntityManager,
  teamSlug: string,
  push: Push,
  isNew: boolean,
): Promise<AnswerOf<(typeof pushEndpoints)['push']>> {
  const links = await manager.findBy(PushVersion, { pushId: push.id })
  const rows: { id: string; name: string }[] = await manager.query(
    `select v.id, s.name from version v join template_set s on s.id = v.set_id where v.id = any($1::uuid[])`,
    [links.map(({ versionId }) => versionId)],
  )
  const names = new Map(rows.map(({ id, name }) => [id, name]))
  const versions = await manager
    .createQueryBuilder(Version, 'v')
    .where('v.id = any(:ids)', { ids: rows.map(({ id }) => id) })
    .getMany()
  const linkOf = new Map(links.map((link) => [link.versionId, link]))
  const named = versions
    .map((version) => ({ version, set: names.get(version.id) ?? '', link: linkOf.get(version.id) }))
    .toSorted((a, b) => (a.set < b.set ? -1 : 1))
  const waiting = await rippleCandidates(manager, push, rippleLimit)
  return {
    id: push.id,
    isNew,
    branch: push.branch,
    sets: named
      .filter(({ link }) => link?.origin === 'push')
      .map(({ version, set, link }) => ({
        file: version.file,
        set,
        number: version.number,
        isNew: isNew && link?.isNew === true,
        verdict: version.verdict,
        works: version.works,
        baseline: presentBaseline(version),
        change: presentChange(version),
        differs: version.differs,
        page: `/teams/${teamSlug}/sets/${encodeURIComponent(set)}/versions/${String(version.number)}`,
      })),
    ripple: [
      ...named
        .filter(({ link }) => link?.origin === 'ripple')
        .map(({ version, set }) => ({ set, number: version.number, state: version.changeState })),
      ...waiting.map(({ name }) => ({ set: name, number: null, state: 'pending' as const })),
    ],
  }
}
