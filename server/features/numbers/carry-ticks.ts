import type { EntityManager } from 'typeorm'
import type { Report } from '../../../shared/report/report.ts'
import type { Version } from '../versions/version.entity.ts'
import { measuresOf } from './measures.ts'
import { NumberTick } from './number-tick.entity.ts'

/** Beyond this a measure is another one; figures come out of the same arithmetic, so only its last digits may differ. */
const sameMeasure = 1e-6

/** Carries ticks from the version before, on the same branch or its baseline, where the measure is unchanged. */
export async function carryTicks(manager: EntityManager, version: Version): Promise<void> {
  const [before]: { id: string; number: number }[] = await manager.query(
    `select id, number from version v
     where set_id = $1 and number < $2 and (branch = $3 or id = $4)
       and exists (select 1 from number_tick where version_id = v.id)
     order by number desc limit 1`,
    [version.setId, version.number, version.branch, version.baselineId],
  )
  if (before === undefined) return
  const [row]: { report: Report }[] = await manager.query('select report from version_content where version_id = $1', [
    version.id,
  ])
  if (row === undefined) return
  const ticks = await manager.findBy(NumberTick, { versionId: before.id })
  const measures = new Map(measuresOf(row.report).map((measure) => [measure.key, measure.value]))
  const carried = ticks.flatMap((tick) => {
    const value = measures.get(tick.key)
    if (value === undefined) return []
    const isSame = Math.abs(value - tick.value) <= sameMeasure
    return [
      {
        ...tick,
        versionId: version.id,
        // A measure that moved keeps the old value beside it, to be looked at again.
        state: isSame ? tick.state : ('changed' as const),
        carriedFrom: tick.carriedFrom ?? before.number,
      },
    ]
  })
  if (carried.length > 0)
    await manager.createQueryBuilder().insert().into(NumberTick).values(carried).orIgnore().execute()
}
