import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import { Team } from '../teams/team.entity.ts'
import { recordAudit } from './record-audit.ts'
import { countExpendable, type Retention } from './retention.service.ts'

const days = (count: number | null): string => (count === null ? 'for ever' : `${String(count)} days`)

const words = ({ mainDays, branchDays, branchVersions }: Retention): string =>
  `the main branch ${days(mainDays)}, other branches ${days(branchDays)}${branchVersions === null ? '' : ` and ${String(branchVersions)} versions`}`

const retentionOf = ({ mainDays, branchDays, branchVersions }: Team): Retention => ({
  mainDays,
  branchDays,
  branchVersions,
})

export const retentionRoutes: readonly Route[] = [
  teamRoute(endpoints.retention, ({ access }) => Promise.resolve(retentionOf(access.team))),
  teamRoute(endpoints.changeRetention, async ({ query, body, access, context }) => {
    const wouldRemove = await countExpendable(context.database.manager, access.team, body, context.now())
    if (query.dryRun === 'false')
      await context.database.transaction(async (manager) => {
        await manager.update(Team, { id: access.team.id }, body)
        await recordAudit(manager, access.team.id, access.actor, {
          verb: 'changed',
          kind: 'retention',
          name: access.team.name,
          sentence: `keeps ${words(body)} from now on`,
        })
      })
    return { retention: body, wouldRemove }
  }),
]
