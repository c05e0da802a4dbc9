import { randomUUID } from 'node:crypto'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { pageOfRows, readCursor } from '../../http/cursor.ts'
import { found } from '../../http/refusal.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import { PaperReading } from './paper-reading.entity.ts'
import { recordAudit } from './record-audit.ts'

const meanOf = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length

/** Standard deviation of a sample; null for a single reading. */
function spreadOf(values: readonly number[]): number | null {
  if (values.length < 2) return null
  const mean = meanOf(values)
  return Math.sqrt(values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (values.length - 1))
}

const present = (paper: PaperReading) => ({
  id: paper.id,
  stock: paper.stock,
  method: paper.method,
  readings: paper.readings,
  mean: meanOf(paper.readings),
  spread: spreadOf(paper.readings),
  note: paper.note,
  by: paper.measuredBy,
  at: paper.createdAt.toISOString(),
})

export const paperRoutes: readonly Route[] = [
  teamRoute(endpoints.papers, async ({ query, access, context: { database } }) => {
    const cursor = readCursor<[string, string]>(query.cursor, ['string', 'string'])
    const find = database.manager
      .createQueryBuilder(PaperReading, 'paper')
      .where('paper.teamId = :teamId', { teamId: access.team.id })
      .orderBy('paper.createdAt', 'DESC')
      .addOrderBy('paper.id', 'DESC')
      .limit(query.limit + 1)
    if (query.stock !== undefined) find.andWhere('paper.stock = :stock', { stock: query.stock })
    if (cursor !== null)
      find.andWhere('(paper.createdAt, paper.id) < (:at::timestamptz, :id::uuid)', { at: cursor[0], id: cursor[1] })
    return pageOfRows(await find.getMany(), query.limit, present, (row) => [row.createdAt.toISOString(), row.id])
  }),
  teamRoute(endpoints.addPaper, async ({ body, access, context }) => {
    const perSheet = body.method === 'stack-of-ten' ? 10 : 1
    const id = randomUUID()
    return context.database.transaction(async (manager) => {
      await manager.insert(PaperReading, {
        id,
        teamId: access.team.id,
        stock: body.stock,
        method: body.method,
        readings: body.readings.map((reading) => reading / perSheet),
        note: body.note,
        measuredBy: access.actor.name,
        createdAt: context.now(),
      })
      return present(found(await manager.findOneBy(PaperReading, { id })))
    })
  }),
  teamRoute(endpoints.removePaper, async ({ params, access, context }) => {
    await context.database.transaction(async (manager) => {
      const where = { id: params.paper, teamId: access.team.id }
      const paper = found(await manager.findOneBy(PaperReading, where))
      await manager.delete(PaperReading, where)
      await recordAudit(manager, access.team.id, access.actor, {
        verb: 'removed',
        kind: 'paper',
        name: paper.stock,
        sentence: `removed ${String(paper.readings.length)} readings of ${paper.stock}`,
      })
    })
  }),
]
