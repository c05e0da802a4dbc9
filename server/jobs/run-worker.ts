import type PgBoss from 'pg-boss'
import type { Metrics } from '../http/metrics.ts'
import type { WorkContext } from './job-handler.ts'
import { jobHandlers } from './handler-registry.ts'
import { jobKinds, type JobData, type JobKind } from './job-kinds.ts'

type AnyHandler = (context: WorkContext, data: object) => Promise<void>

/** Does one job; what it throws makes the queue try again later. */
async function doJob(
  context: WorkContext,
  metrics: Metrics | null,
  kind: JobKind,
  job: PgBoss.Job<JobData[JobKind]>,
): Promise<void> {
  try {
    await (jobHandlers[kind] as AnyHandler)(context, job.data)
    metrics?.jobs.inc({ kind, outcome: 'done' })
  } catch (error) {
    metrics?.jobs.inc({ kind, outcome: 'failed' })
    context.log.warn({ kind, job: job.id, err: error }, 'job failed')
    // The queue keeps what is thrown beside the job: a sentence is enough there.
    throw new Error(error instanceof Error ? error.message : String(error), { cause: error })
  }
}

/** Takes jobs of every kind until the queue is stopped. */
export async function runWorker(boss: PgBoss, context: WorkContext, metrics: Metrics | null): Promise<void> {
  for (const kind of Object.keys(jobKinds) as JobKind[]) {
    await boss.work<JobData[JobKind]>(kind, { pollingIntervalSeconds: 0.5, batchSize: 1 }, async (jobs) => {
      for (const job of jobs) await doJob(context, metrics, kind, job)
    })
    const { every } = jobKinds[kind]
    if (every !== null) await boss.schedule(kind, every, { kind, teamId: null, about: kind }, { tz: 'UTC' })
  }
}

/** Does everything that waits, once, in this process: for tests and for filling a database. @returns how many jobs */
export async function drainJobs(boss: PgBoss, context: WorkContext): Promise<number> {
  let done = 0
  for (let isBusy = true; isBusy;) {
    isBusy = false
    for (const kind of Object.keys(jobKinds) as JobKind[]) {
      const jobs = await boss.fetch<JobData[JobKind]>(kind, { batchSize: 50 })
      for (const job of jobs) {
        isBusy = true
        done += 1
        try {
          await doJob(context, null, kind, job)
          await boss.complete(kind, job.id)
        } catch (error) {
          await boss.fail(kind, job.id, { message: String(error) })
        }
      }
    }
  }
  return done
}
