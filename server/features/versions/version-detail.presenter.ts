import type { EntityManager } from 'typeorm'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { versionEndpoints } from '../../../shared/api/version-endpoints.ts'
import type { TemplateSet } from '../sets/template-set.entity.ts'
import { Recheck } from './recheck.entity.ts'
import { companyOf, textsOf } from './version.repository.ts'
import { presentVersion } from './version.presenter.ts'
import type { Version } from './version.entity.ts'

type Answer = AnswerOf<(typeof versionEndpoints)['version']>

const activeFailures = (manager: EntityManager, setId: string, today: string): Promise<Answer['knownFailures']> =>
  manager.query(
    `select fingerprint, reason, until::text as until, accepted_by as "acceptedBy" from known_failure
     where set_id = $1 and ended_at is null and until >= $2::date order by until, fingerprint`,
    [setId, today],
  )

/** A version whole: texts, report, and what is accepted of its failures today. */
export async function presentWholeVersion(
  manager: EntityManager,
  set: TemplateSet,
  version: Version,
  today: string,
): Promise<Answer> {
  const { text, workspace, content } = await textsOf(manager, version.id)
  const rechecks = await manager.find(Recheck, { where: { versionId: version.id }, order: { checkedAt: 'DESC' } })
  const known = await activeFailures(manager, set.id, today)
  return {
    ...presentVersion(version, await companyOf(manager, [version])),
    set: set.name,
    file: version.file,
    text,
    workspace,
    report: content.report,
    sender: { engine: version.senderEngine, digest: version.senderDigest, verdict: version.senderVerdict },
    differs: version.differs,
    knownFailures: known.filter(({ fingerprint }) => version.failing.includes(fingerprint)),
    rechecks: rechecks.map(({ engine, verdict, works, checkedAt }) => ({
      engine,
      verdict,
      works,
      checkedAt: checkedAt.toISOString(),
    })),
  }
}
