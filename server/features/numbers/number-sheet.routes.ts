import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import type { Context } from '../../context.ts'
import { csvAnswer } from '../../http/answers.ts'
import { writeCsv } from '../../http/csv.ts'
import { unacceptable } from '../../http/refusal.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import type { Version } from '../versions/version.entity.ts'
import { getVersion, textsOf } from '../versions/version.repository.ts'
import { marksOn, measuresOf } from './measures.ts'
import { NumberTick } from './number-tick.entity.ts'

type Sheet = AnswerOf<typeof endpoints.numberSheet>

async function sheetOf(context: Context, version: Version): Promise<Sheet> {
  const { manager } = context.database
  const { report } = (await textsOf(manager, version.id)).content
  const ticks = new Map((await manager.findBy(NumberTick, { versionId: version.id })).map((tick) => [tick.key, tick]))
  const items = measuresOf(report).map((measure) => {
    const tick = ticks.get(measure.key)
    return {
      ...measure,
      sum: [...measure.sum],
      marks: marksOn(measure.value),
      state: tick?.state ?? ('open' as const),
      note: tick?.note ?? '',
      by: tick?.tickedBy ?? null,
      at: tick?.tickedAt.toISOString() ?? null,
      carriedFrom: tick?.carriedFrom ?? null,
    }
  })
  const count = (state: string): number => items.filter((item) => item.state === state).length
  return { items, ticked: count('ticked'), queried: count('queried'), open: count('open') + count('changed') }
}

export const numberSheetRoutes: readonly Route[] = [
  teamRoute(endpoints.numberSheet, async ({ params, access, context }) => {
    const { version } = await getVersion(context.database.manager, access.team.id, params.set, params.number)
    return sheetOf(context, version)
  }),
  teamRoute(endpoints.numberSheetCsv, async ({ params, access, context }) => {
    const { version } = await getVersion(context.database.manager, access.team.id, params.set, params.number)
    const { items } = await sheetOf(context, version)
    const text = writeCsv(
      ['key', 'what', 'millimetres', 'mm mark', 'inch mark', 'from', 'state', 'note', 'by'],
      items.map((item) => [
        item.key,
        item.what,
        item.value,
        item.marks.mm,
        item.marks.in,
        item.from,
        item.state,
        item.note,
        item.by,
      ]),
    )
    return csvAnswer(`${params.set}-v${String(version.number)}-measures.csv`, text)
  }),
  teamRoute(endpoints.tick, async ({ params, body, access, context }) => {
    const { version } = await getVersion(context.database.manager, access.team.id, params.set, params.number)
    const { report } = (await textsOf(context.database.manager, version.id)).content
    const measures = new Map(measuresOf(report).map((measure) => [measure.key, measure]))
    const unknown = body.keys.filter((key) => !measures.has(key))
    if (unknown.length > 0) throw unacceptable('no-such-measure', `This version has no measure ${unknown[0] ?? ''}.`)
    const { state } = body
    await context.database.transaction(async (manager) => {
      if (state === 'open') {
        for (const key of body.keys) await manager.delete(NumberTick, { versionId: version.id, key })
        return
      }
      const rows = [...new Set(body.keys)].map((key) => ({
        versionId: version.id,
        key,
        value: measures.get(key)?.value ?? 0,
        state,
        note: body.note,
        tickedBy: access.actor.name,
        tickedAt: context.now(),
        carriedFrom: null,
      }))
      await manager.upsert(NumberTick, rows, ['versionId', 'key'])
    })
    return sheetOf(context, version)
  }),
]
