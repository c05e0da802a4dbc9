import type { Logger } from 'pino'
import type { DataSource } from 'typeorm'
import type { Config } from './config.ts'
import type { JobQueue } from './jobs/job-queue.ts'
import type { ObjectStore } from './storage/object-store.ts'

/** What every part of the server works with; tests hand in their own. */
export interface Context {
  readonly config: Config
  readonly database: DataSource
  readonly jobs: JobQueue
  readonly objects: ObjectStore
  readonly log: Logger
  now(): Date
}

/** Today as the engine wants it, in UTC. */
export const todayOf = (context: Context): string => context.now().toISOString().slice(0, 10)
