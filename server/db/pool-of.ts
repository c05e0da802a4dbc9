import type { Pool } from 'pg'
import type { DataSource } from 'typeorm'

/** The pool under TypeORM, shared with the session store and the counters of attempts. */
export const poolOf = (database: DataSource): Pool => (database.driver as unknown as { readonly master: Pool }).master
