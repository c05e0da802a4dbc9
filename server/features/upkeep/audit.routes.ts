import type { EntityManager } from 'typeorm'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { csvAnswer } from '../../http/answers.ts'
import { writeCsv } from '../../http/csv.ts'
import { pageOfRows, readCursor } from '../../http/cursor.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import { AuditEntry } from './audit-entry.entity.ts'

/** Entries before an id, newest first; `%` and `_` in the words are looked for as they are. */
function listAudit(
  manager: EntityManager,
  teamId: string,
  before: string | null,
  search: string | undefined,
  limit: number,
): Promise<AuditEntry[]> {
  const query = manager
    .createQueryBuilder(AuditEntry, 'entry')
    .where('entry.teamId = :teamId', { teamId })
    .orderBy('entry.id', 'DESC')
    .limit(limit)
  if (before !== null) query.andWhere('entry.id < :before', { before })
  if (search !== undefined && search !== '')
    query.andWhere('entry.sentence ilike :like', { like: `%${search.replace(/[\\%_]/g, '\\$&')}%` })
  return query.getMany()
}

const present = (entry: AuditEntry) => ({
  id: entry.id,
  at: entry.at.toISOString(),
  actor: { kind: entry.actorKind, name: entry.actorName },
  verb: entry.verb,
  object: { kind: entry.objectKind, name: entry.objectName },
  sentence: entry.sentence,
})

export const auditRoutes: readonly Route[] = [
  teamRoute(endpoints.audit, async ({ query, access, context: { database } }) => {
    const cursor = readCursor<[string]>(query.cursor, ['string'])
    const rows = await listAudit(database.manager, access.team.id, cursor?.[0] ?? null, query.search, query.limit + 1)
    return pageOfRows(rows, query.limit, present, ({ id }) => [id])
  }),
  teamRoute(endpoints.auditCsv, async ({ access, context: { database } }) => {
    const rows = await listAudit(database.manager, access.team.id, null, undefined, 50_000)
    const text = writeCsv(
      ['at', 'who', 'verb', 'kind', 'name', 'sentence'],
      rows.map((row) => [row.at.toISOString(), row.actorName, row.verb, row.objectKind, row.objectName, row.sentence]),
    )
    return csvAnswer(`${access.team.slug}-audit.csv`, text)
  }),
]
