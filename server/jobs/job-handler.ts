import type { Context } from '../context.ts'
import type { Mailer } from '../mail/mailer.ts'
import type { JobData, JobKind } from './job-kinds.ts'

/** What workers have besides what servers have. */
export interface WorkContext extends Context {
  readonly mailer: Mailer
}

/** Does a job; may be called again for the same one after a crash, so that every handler must bear that. */
export type JobHandlers = { readonly [K in JobKind]: (context: WorkContext, data: JobData[K]) => Promise<void> }
