import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { deadLetter, jobKinds, type JobKind, type JobLabel } from '../../jobs/job-kinds.ts'
import { found } from '../../http/refusal.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import type { EntityManager } from 'typeorm'

interface DeadRow {
  readonly id: string
  readonly data: JobLabel
  readonly at: Date
  readonly output: { readonly message?: string } | null
}

/** Jobs of a team whose retries are used up. The dead letter carries what the job was given. */
const deadOf = (manager: EntityManager, teamId: string): Promise<DeadRow[]> =>
  manager.query(
    `select id, data, created_on as at, output from pgboss.job
     where name = $1 and state = 'created' and data ->> 'teamId' = $2 order by created_on desc limit 200`,
    [deadLetter, teamId],
  )

export const failedWorkRoutes: readonly Route[] = [
  teamRoute(endpoints.deadJobs, async ({ access, context: { database } }) => ({
    items: (await deadOf(database.manager, access.team.id)).map(({ id, data, at, output }) => ({
      id,
      kind: data.kind,
      about: data.about,
      failedAt: at.toISOString(),
      reason: output?.message ?? 'every attempt failed',
    })),
  })),
  teamRoute(endpoints.retryJob, async ({ params, access, context }) => {
    await context.database.transaction(async (manager) => {
      const job = found((await deadOf(manager, access.team.id)).find(({ id }) => id === params.job))
      const { kind, teamId, about, ...data } = job.data
      const known = found((Object.keys(jobKinds) as JobKind[]).find((name) => name === kind))
      const gone: [unknown, number] = await manager.query(
        `delete from pgboss.job where name = $1 and id = $2 and state = 'created'`,
        [deadLetter, job.id],
      )
      if (gone[1] === 1) await context.jobs.add(manager, known, data as never, { teamId, about })
    })
  }),
]
