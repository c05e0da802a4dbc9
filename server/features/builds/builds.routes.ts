import { randomUUID } from 'node:crypto'
import { IsNull, Not, type EntityManager } from 'typeorm'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import type { Context } from '../../context.ts'
import { csvAnswer } from '../../http/answers.ts'
import { writeCsv } from '../../http/csv.ts'
import { pageOfRows, readCursor } from '../../http/cursor.ts'
import { found } from '../../http/refusal.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import { photoAnswer } from '../../storage/photo-files.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import type { Version } from '../versions/version.entity.ts'
import { getVersion, textsOf } from '../versions/version.repository.ts'
import { namedDimensions } from './build-form.ts'
import { inviteTester, presentInvite } from './build-invitations.service.ts'
import { checkNames } from './build-links.service.ts'
import { readBuildSheet, sheetTitles } from './build-sheet.ts'
import { BuildInvitation } from './build-invitation.entity.ts'
import { BuildPhoto } from './build-photo.entity.ts'
import { presentBuild } from './build.presenter.ts'
import { Build } from './build.entity.ts'
import { studyOf } from './study.ts'

const at = (context: Context, access: TeamAccess, params: { readonly set: string; readonly number: number }) =>
  getVersion(context.database.manager, access.team.id, params.set, params.number)

const photoBase = (access: TeamAccess): string => `/api/teams/${access.team.slug}/photos/`

const submittedOf = (manager: EntityManager, version: Version): Promise<Build[]> =>
  manager.find(Build, {
    where: { versionId: version.id, submittedAt: Not(IsNull()) },
    order: { startedAt: 'ASC' },
    take: 2_000,
  })

const separators = { comma: ',', semicolon: ';', tab: '\t' } as const
const decimals = { point: '.', comma: ',' } as const

export const buildRoutes: readonly Route[] = [
  teamRoute(endpoints.inviteTester, async ({ params, body, access, context }) => {
    const { set, version } = await at(context, access, params)
    const invitation = await inviteTester(context, access, set, version, body)
    return presentInvite(invitation, version.number, null, context.now())
  }),
  teamRoute(endpoints.buildInvitations, async ({ params, access, context }) => {
    const { manager } = context.database
    const { version } = await at(context, access, params)
    const invitations = await manager.find(BuildInvitation, {
      where: { versionId: version.id },
      order: { tester: 'ASC' },
      take: 500,
    })
    const builds = new Map(
      (await manager.findBy(Build, { versionId: version.id })).map((build) => [build.invitationId, build]),
    )
    return {
      items: invitations.map((invitation) =>
        presentInvite(invitation, version.number, builds.get(invitation.id) ?? null, context.now()),
      ),
    }
  }),
  teamRoute(endpoints.revokeBuildInvitation, async ({ params, access, context }) => {
    await context.database.transaction(async (manager) => {
      const where = { id: params.invitation, teamId: access.team.id }
      const invitation = found(await manager.findOneBy(BuildInvitation, where))
      await manager.update(BuildInvitation, where, { revokedAt: context.now() })
      await recordAudit(manager, access.team.id, access.actor, {
        verb: 'took back',
        kind: 'tester',
        name: invitation.name,
        sentence: `ended the build link of ${invitation.name}`,
      })
    })
  }),
  teamRoute(endpoints.builds, async ({ params, query, access, context }) => {
    const { manager } = context.database
    const { version } = await at(context, access, params)
    const cursor = readCursor<[string, string]>(query.cursor, ['string', 'string'])
    const find = manager
      .createQueryBuilder(Build, 'b')
      .where('b.versionId = :id', { id: version.id })
      .orderBy('b.startedAt', 'DESC')
      .addOrderBy('b.id', 'DESC')
      .limit(query.limit + 1)
    if (cursor !== null)
      find.andWhere('(b.startedAt, b.id) < (:at::timestamptz, :last::uuid)', { at: cursor[0], last: cursor[1] })
    const page = pageOfRows(
      await find.getMany(),
      query.limit,
      (build) => build,
      (row) => [row.startedAt.toISOString(), row.id],
    )
    const items = []
    for (const build of page.items) items.push(await presentBuild(manager, build, photoBase(access)))
    return { items, next: page.next }
  }),
  teamRoute(endpoints.ownBuild, async ({ params, body, access, context }) => {
    const { manager } = context.database
    const { version } = await at(context, access, params)
    checkNames((await textsOf(manager, version.id)).content.report, body)
    const id = randomUUID()
    await manager.insert(Build, {
      id,
      teamId: access.team.id,
      versionId: version.id,
      stamp: `v${String(version.number)}-own`,
      tester: access.actor.name,
      source: 'member',
      report: body as never,
      startedAt: context.now(),
      submittedAt: context.now(),
    })
    return presentBuild(manager, found(await manager.findOneBy(Build, { id })), photoBase(access))
  }),
  teamRoute(endpoints.buildsCsv, async ({ params, access, context }) => {
    const { manager } = context.database
    const { version } = await at(context, access, params)
    const builds = await submittedOf(manager, version)
    const rows = builds.flatMap(({ tester, report }) => [
      ...report.readings.map(({ key, values }) => [tester, key, 'mm', values[0], values[1], values[2], '', '']),
      ...report.fits.map(({ fit, felt, note }) => [tester, fit, 'mm', '', '', '', felt, note]),
    ])
    return csvAnswer(`${params.set}-v${String(version.number)}-builds.csv`, writeCsv(sheetTitles, rows))
  }),
  teamRoute(endpoints.buildsTemplate, async ({ params, query, access, context }) => {
    const { version } = await at(context, access, params)
    const { report } = (await textsOf(context.database.manager, version.id)).content
    const rows = [
      ...namedDimensions(report).map(({ key }) => ['', key, query.units, '', '', '', '', '']),
      ...report.fits.map(({ id }) => ['', id, query.units, '', '', '', '', '']),
    ]
    return csvAnswer(`${params.set}-v${String(version.number)}-sheet.csv`, writeCsv(sheetTitles, rows))
  }),
  teamRoute(endpoints.importBuilds, async ({ params, query, bytes, access, context }) => {
    const { manager } = context.database
    const { set, version } = await at(context, access, params)
    const { report } = (await textsOf(manager, version.id)).content
    const names = {
      dimensions: new Set(namedDimensions(report).map(({ key }) => key)),
      fits: new Set(report.fits.map(({ id }) => id)),
    }
    const sheet = readBuildSheet(bytes.toString('utf8'), names, {
      separator: query.separator === undefined ? undefined : separators[query.separator],
      decimal: query.decimal === undefined ? undefined : decimals[query.decimal],
      units: query.units,
    })
    const isStored = query.store === 'true' && sheet.problems.length === 0
    if (isStored) {
      const key = `teams/${access.team.id}/imports/${randomUUID()}.csv`
      await context.objects.put(key, 'text/csv', bytes)
      await context.database.transaction(async (inner) => {
        for (const [tester, one] of sheet.builds)
          await inner.insert(Build, {
            id: randomUUID(),
            teamId: access.team.id,
            versionId: version.id,
            stamp: `v${String(version.number)}-import`,
            tester,
            source: 'import',
            report: one as never,
            startedAt: context.now(),
            submittedAt: context.now(),
          })
        await recordAudit(inner, access.team.id, access.actor, {
          verb: 'imported',
          kind: 'build',
          name: `${set.name} version ${String(version.number)}`,
          sentence: `imported ${String(sheet.builds.size)} builds of ${set.name} version ${String(version.number)}; the sheet is kept as ${key}`,
        })
      })
    }
    return {
      separator: sheet.separator,
      decimal: sheet.decimal,
      units: sheet.units,
      rows: sheet.rows,
      builds: sheet.builds.size,
      preview: [...sheet.preview],
      problems: [...sheet.problems],
      isStored,
    }
  }),
  teamRoute(endpoints.study, async ({ params, access, context }) => {
    const { manager } = context.database
    const { version } = await at(context, access, params)
    const { report } = (await textsOf(manager, version.id)).content
    return studyOf(report, await submittedOf(manager, version))
  }),
  teamRoute(endpoints.buildPhoto, async ({ params, query, access, context }) => {
    const photo = found(
      await context.database.manager.findOneBy(BuildPhoto, { id: params.photo, teamId: access.team.id }),
    )
    return photoAnswer(context, photo.key, query.size)
  }),
]
