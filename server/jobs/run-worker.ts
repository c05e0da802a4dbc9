import type PgBoss from 'pg-boss'
import type { Metrics } from '../http/metrics.ts'
import type { WorkContext } from './job-handler.ts'
import { jobHandlers } from './handler-registry.ts'
import { jobKinds, type JobData, type JobKind } from './job-kinds.ts'

type AnyHandler = (context: WorkContext, data: object) => Promise<void>

const kinds = Object.keys(jobKinds) as JobKind[]
/** How long a queue that was empty is left alone, and the queue itself after it failed. */
const rest = 500
const recovery = 2_000

/** Does one job and settles it; what fails is tried again later by the queue. */
async function doJob(
  boss: PgBoss,
  context: WorkContext,
  metrics: Metrics | null,
  kind: JobKind,
  job: PgBoss.Job<JobData[JobKind]>,
): Promise<void> {
  try {
    await (jobHandlers[kind] as AnyHandler)(context, job.data)
  } catch (error) {
    metrics?.jobs.inc({ kind, outcome: 'failed' })
    context.log.warn({ kind, job: job.id, err: error }, 'job failed')
    // Kept beside the job: a sentence is enough there.
    await boss.fail(kind, job.id, { message: error instanceof Error ? error.message : String(error) })
    return
  }
  await boss.complete(kind, job.id)
  metrics?.jobs.inc({ kind, outcome: 'done' })
}

/** Takes what waits of a kind. @returns how many jobs it did */
async function doWaiting(boss: PgBoss, context: WorkContext, metrics: Metrics | null, kind: JobKind): Promise<number> {
  // One at a time: a worker that dies holds back one job until its time is over, not many.
  const jobs = await boss.fetch<JobData[JobKind]>(kind, { batchSize: 1 })
  for (const job of jobs) await doJob(boss, context, metrics, kind, job)
  return jobs.length
}

export interface Worker {
  /** Takes no more jobs and waits for those under way. */
  stop(): Promise<void>
}

/** Takes jobs of every kind as they come, the kinds beside one another. */
export async function runWorker(boss: PgBoss, context: WorkContext, metrics: Metrics | null): Promise<Worker> {
  let isOn = true
  const wakers = new Set<() => void>()
  const pause = (milliseconds: number): Promise<void> =>
    new Promise((fulfil) => {
      const wake = (): void => {
        clearTimeout(timer)
        wakers.delete(wake)
        fulfil()
      }
      const timer = setTimeout(wake, milliseconds)
      wakers.add(wake)
    })
  const lane = async (kind: JobKind): Promise<void> => {
    while (isOn) {
      const done = await doWaiting(boss, context, metrics, kind).catch((error: unknown) => {
        context.log.warn({ kind, err: error }, 'the queue does not answer')
        return null
      })
      if (done === null) await pause(recovery)
      else if (done === 0) await pause(rest)
    }
  }
  for (const kind of kinds) {
    const { every } = jobKinds[kind]
    if (every !== null) await boss.schedule(kind, every, { kind, teamId: null, about: kind }, { tz: 'UTC' })
  }
  const lanes = kinds.map(lane)
  return {
    async stop() {
      isOn = false
      for (const wake of [...wakers]) wake()
      await Promise.all(lanes)
    },
  }
}

/** Does everything that waits, once, in this process: for tests and for filling a database. @returns how many jobs */
export async function drainJobs(boss: PgBoss, context: WorkContext): Promise<number> {
  let done = 0
  for (let before = -1; before !== done;) {
    before = done
    for (const kind of kinds) {
      for (let more = 1; more > 0; done += more) more = await doWaiting(boss, context, null, kind)
    }
  }
  return done
}
