import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { todayOf } from '../../context.ts'
import { csvAnswer } from '../../http/answers.ts'
import { writeCsv } from '../../http/csv.ts'
import { pageOfRows, readCursor } from '../../http/cursor.ts'
import { found, notFound, unacceptable } from '../../http/refusal.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import { TemplateSet } from '../sets/template-set.entity.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import { BranchState } from './branch-state.entity.ts'
import { compareVersions, presentReport } from './compare-versions.service.ts'
import { trendOf } from './trend.ts'
import { presentWholeVersion } from './version-detail.presenter.ts'
import { presentVersion } from './version.presenter.ts'
import { companyOf, findSet, findVersion, getVersion, listVersions, textsOf } from './version.repository.ts'
import { publishedVersionOf } from './published-version.ts'
import { Version } from './version.entity.ts'

export const versionRoutes: readonly Route[] = [
  teamRoute(endpoints.versions, async ({ params, query, access, context: { database } }) => {
    const { manager } = database
    const set = found(await findSet(manager, access.team.id, params.set))
    const below = readCursor<[number]>(query.cursor, ['number'])?.[0] ?? null
    const { branch, review } = query
    const rows = await listVersions(manager, set.id, { branch, review, below }, query.limit + 1)
    const company = await companyOf(manager, rows)
    return pageOfRows(
      rows,
      query.limit,
      (row) => presentVersion(row, company),
      ({ number }) => [number],
    )
  }),
  teamRoute(endpoints.versionsCsv, async ({ params, query, access, context: { database } }) => {
    const { manager } = database
    const set = found(await findSet(manager, access.team.id, params.set))
    const rows = await listVersions(manager, set.id, { branch: query.branch, below: null }, 10_000)
    const company = await companyOf(manager, rows)
    const text = writeCsv(
      [
        'number',
        'branch',
        'commit',
        'verdict',
        'works',
        'change',
        'sentence',
        'review',
        'label',
        'engine',
        'pushed at',
        'pushed by',
      ],
      rows
        .map((row) => presentVersion(row, company))
        .map((row) => [
          row.number,
          row.branch,
          row.commit,
          row.verdict,
          row.works,
          row.change.state,
          row.change.sentence,
          row.review,
          row.label,
          row.engine,
          row.pushedAt,
          row.pushedBy.name,
        ]),
    )
    return csvAnswer(`${set.name}-versions.csv`, text)
  }),
  teamRoute(endpoints.version, async ({ params, access, context }) => {
    const { manager } = context.database
    const { set, version } = await getVersion(manager, access.team.id, params.set, params.number)
    return presentWholeVersion(manager, set, version, todayOf(context))
  }),
  teamRoute(endpoints.versionNamed, async ({ params, query, access, context }) => {
    const { manager } = context.database
    if ((query.published === undefined) === (query.branch === undefined))
      throw unacceptable(
        'name-one',
        'Ask for the published version or for a branch.',
        'Send ?published=true or ?branch=NAME.',
      )
    const set = found(await findSet(manager, access.team.id, params.set), `There is no set ${params.set} here.`)
    const version =
      query.branch === undefined
        ? await publishedVersionOf(manager, set.id)
        : await manager
            .createQueryBuilder(Version, 'v')
            .innerJoin(BranchState, 'b', 'b.versionId = v.id')
            .where('b.setId = :id and b.branch = :branch', { id: set.id, branch: query.branch })
            .getOne()
    const what = query.branch === undefined ? 'nothing is published of it' : `it has no version on ${query.branch}`
    return presentWholeVersion(manager, set, found(version, `${set.name}: ${what}.`), todayOf(context))
  }),
  teamRoute(endpoints.compare, async ({ params, query, access, context }) => {
    const { manager } = context.database
    const { set, version } = await getVersion(manager, access.team.id, params.set, params.number)
    const isAsked = query.with !== undefined
    const before = isAsked
      ? await findVersion(manager, set.id, query.with ?? 0)
      : version.baselineId === null
        ? null
        : await manager.findOneBy(Version, { id: version.baselineId })
    if (before === null)
      throw notFound(
        isAsked
          ? `${set.name} has no version ${String(query.with)}; it may have been removed by retention.`
          : `Version ${String(version.number)} has nothing to be compared with: ${version.baselineSentence}.`,
      )
    const { comparison, isRechecked } = await compareVersions(context, before, version)
    const why = isAsked ? '' : ` (${version.baselineSentence})`
    return {
      sentence: `version ${String(version.number)} compared with version ${String(before.number)}${why}`,
      before: before.number,
      after: version.number,
      reason: isAsked ? ('asked' as const) : version.baselineReason,
      comparison,
      isRechecked,
      texts: { before: (await textsOf(manager, before.id)).text, after: (await textsOf(manager, version.id)).text },
    }
  }),
  teamRoute(endpoints.pinBaseline, async ({ params, body, access, context }) => {
    await context.database.transaction(async (manager) => {
      const { set, version } = await getVersion(manager, access.team.id, params.set, body.number)
      if (version.verdict === 'invalid')
        throw unacceptable('not-eligible', 'A version that cannot be read is no baseline.')
      const pin = { pinnedVersionId: version.id, pinNote: body.note, pinnedBy: access.actor.name }
      await manager.update(TemplateSet, { id: set.id }, pin)
      await recordAudit(manager, access.team.id, access.actor, {
        verb: 'pinned',
        kind: 'version',
        name: `${set.name} version ${String(version.number)}`,
        sentence: `pinned ${set.name} version ${String(version.number)} as baseline: ${body.note}`,
      })
    })
  }),
  teamRoute(endpoints.unpinBaseline, async ({ params, access, context }) => {
    await context.database.transaction(async (manager) => {
      const set = found(await findSet(manager, access.team.id, params.set))
      await manager.update(TemplateSet, { id: set.id }, { pinnedVersionId: null, pinNote: null, pinnedBy: null })
      await recordAudit(manager, access.team.id, access.actor, {
        verb: 'unpinned',
        kind: 'set',
        name: set.name,
        sentence: `unpinned the baseline of ${set.name}`,
      })
    })
  }),
  teamRoute(endpoints.recheck, async ({ params, access, context }) => {
    const { version } = await getVersion(context.database.manager, access.team.id, params.set, params.number)
    return { report: (await presentReport(context, version)).report }
  }),
  teamRoute(endpoints.trend, async ({ params, query, access, context: { database } }) => {
    const set = found(await findSet(database.manager, access.team.id, params.set))
    return { items: await trendOf(database.manager, set.id, query.branch ?? access.team.mainBranch, query.versions) }
  }),
]
