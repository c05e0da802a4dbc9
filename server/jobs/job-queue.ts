import PgBoss from 'pg-boss'
import type { DataSource, EntityManager } from 'typeorm'
import { poolOf } from '../db/pool-of.ts'
import type { JobData, JobKind } from './job-kinds.ts'

/** Where work is put that a request causes but need not wait for. */
export interface JobQueue {
  /** Enqueues in the transaction of the fact that causes it: both are kept or neither. */
  add<K extends JobKind>(
    manager: EntityManager,
    kind: K,
    data: JobData[K],
    label: { readonly teamId: string | null; readonly about: string },
  ): Promise<void>
}

export function createBoss(
  database: DataSource,
  { migrate, isWorking }: { readonly migrate: boolean; readonly isWorking: boolean },
): PgBoss {
  const pool = poolOf(database)
  return new PgBoss({
    db: { executeSql: (text, values) => pool.query(text, values) },
    migrate,
    supervise: isWorking,
    schedule: isWorking,
    maintenanceIntervalSeconds: 60,
    archiveCompletedAfterSeconds: 3_600,
    deleteAfterDays: 7,
  })
}

/** The queue's statements through a transaction of TypeORM. */
const databaseOf = (manager: EntityManager): PgBoss.Db => ({
  executeSql: async (text, values) => {
    const runner = manager.queryRunner
    if (runner === undefined) throw new Error('jobs are enqueued in a transaction')
    const result = await runner.query(text, values, true)
    return { rows: (result.records as unknown[] | undefined) ?? [] }
  },
})

export function createJobQueue(boss: PgBoss): JobQueue {
  return {
    async add(manager, kind, data, label) {
      const id = await boss.send(kind, { ...data, kind, ...label }, { db: databaseOf(manager) })
      if (id === null) throw new Error(`the queue ${kind} did not take a job`)
    },
  }
}
