import { randomBytes } from 'node:crypto'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { todayOf } from '../../context.ts'
import { csvAnswer } from '../../http/answers.ts'
import { writeCsv } from '../../http/csv.ts'
import { pageOfRows, readCursor } from '../../http/cursor.ts'
import { found } from '../../http/refusal.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import { keepPhoto, photoAnswer, removePhoto } from '../../storage/photo-files.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import { findSet } from '../versions/version.repository.ts'
import { findHolds } from './holds.ts'
import { presentSet, presentSetRow } from './set.presenter.ts'
import { filterWords, listSets } from './sets.repository.ts'
import { TemplateSet } from './template-set.entity.ts'

const asKey = (name: string): string =>
  name
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, 40)

export const setRoutes: readonly Route[] = [
  teamRoute(endpoints.sets, async ({ query, access, context }) => {
    const after = readCursor<[number, string, string]>(query.cursor, ['number', 'string', 'string'])
    const { manager } = context.database
    const rows = await listSets(manager, access.team.id, query, after, query.limit + 1, todayOf(context))
    return pageOfRows(
      rows,
      query.limit,
      (row) => presentSetRow(access.team.slug, row),
      (row) => [row.stateRank, row.updatedAt.toISOString(), row.id],
    )
  }),
  teamRoute(endpoints.setsCsv, async ({ query, access, context }) => {
    const rows = await listSets(context.database.manager, access.team.id, query, null, 10_000, todayOf(context))
    const text = writeCsv(
      [
        'name',
        'title',
        'family',
        'tags',
        'state',
        'version',
        'branch',
        'verdict',
        'works',
        'worst fit',
        'closes',
        'published',
        'review',
        'known failures',
        'builds',
        'updated at',
      ],
      rows.map((row) => [
        row.name,
        row.title,
        row.family,
        row.tags.join(' '),
        row.state,
        row.number,
        row.branch,
        row.verdict,
        row.works,
        row.worstFit?.id,
        row.worstFit?.closes,
        row.published,
        row.reviewState,
        row.knownFailures,
        row.builds,
        row.updatedAt.toISOString(),
      ]),
    )
    return csvAnswer(`${access.team.slug}-sets.csv`, text)
  }),
  teamRoute(endpoints.setWords, ({ access, context }) => filterWords(context.database.manager, access.team.id)),
  teamRoute(endpoints.holds, async ({ query, access, context }) => ({
    items: await findHolds(context.database.manager, access.team.id, query),
  })),
  teamRoute(endpoints.set, async ({ params, access, context }) => {
    const { manager } = context.database
    const set = found(await findSet(manager, access.team.id, params.set), `There is no set ${params.set} here.`)
    return presentSet(manager, access.team.slug, set, todayOf(context))
  }),
  teamRoute(endpoints.changeSet, async ({ params, body, access, context }) => {
    const { team, actor } = access
    return context.database.transaction(async (manager) => {
      const set = found(await findSet(manager, team.id, params.set))
      const change = {
        ...(body.tags === undefined ? {} : { tags: [...new Set(body.tags)] }),
        ...(body.isPublic === undefined ? {} : { isPublic: body.isPublic }),
        ...(body.isPublic === true && set.publicKey === null
          ? { publicKey: `${asKey(set.name)}-${randomBytes(6).toString('hex')}` }
          : {}),
      }
      if (Object.keys(change).length > 0) await manager.update(TemplateSet, { id: set.id }, change)
      if (body.isPublic !== undefined && body.isPublic !== set.isPublic)
        await recordAudit(manager, team.id, actor, {
          verb: body.isPublic ? 'opened' : 'closed',
          kind: 'public page',
          name: set.name,
          sentence: `switched the public page of ${set.name} ${body.isPublic ? 'on' : 'off'}`,
        })
      return presentSet(manager, team.slug, found(await findSet(manager, team.id, params.set)), todayOf(context))
    })
  }),
  teamRoute(endpoints.putSetPhoto, async ({ params, bytes, access, context }) => {
    const { manager } = context.database
    const set = found(await findSet(manager, access.team.id, params.set))
    const { key } = await keepPhoto(context, access.team.id, bytes)
    await manager.update(TemplateSet, { id: set.id }, { photoKey: key })
    if (set.photoKey !== null) await removePhoto(context, set.photoKey)
    return { photo: `/api/teams/${access.team.slug}/sets/${encodeURIComponent(set.name)}/photo?of=${key.slice(-8)}` }
  }),
  teamRoute(endpoints.setPhoto, async ({ params, query, access, context }) => {
    const set = found(await findSet(context.database.manager, access.team.id, params.set))
    return photoAnswer(context, set.photoKey, query.size)
  }),
]
