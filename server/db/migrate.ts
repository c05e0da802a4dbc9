import type { DataSource } from 'typeorm'
import { installQueues } from '../jobs/install-queues.ts'

/** Any number; the same for everybody who migrates. */
const lockNumber = 4_180_001

/** Brings the schema up to date, one process at a time however many start together. @returns names of what ran */
export async function migrate(database: DataSource): Promise<readonly string[]> {
  const runner = database.createQueryRunner()
  await runner.connect()
  try {
    await runner.query('select pg_advisory_lock($1)', [lockNumber])
    const done = await database.runMigrations({ transaction: 'each' })
    await installQueues(database)
    return done.map(({ name }) => name)
  } finally {
    await runner.query('select pg_advisory_unlock($1)', [lockNumber])
    await runner.release()
  }
}

/** True where every migration of this code has run. */
export const isUpToDate = async (database: DataSource): Promise<boolean> => !(await database.showMigrations())
