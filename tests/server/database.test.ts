import { afterAll, describe, expect, it } from 'vitest'
import { createDataSource } from '../../server/db/data-source.ts'
import { migrate } from '../../server/db/migrate.ts'
import { createTestDatabase } from './support/test-database.ts'

const drops: (() => Promise<void>)[] = []
afterAll(async () => {
  for (const drop of drops) await drop()
})

async function emptyDatabase() {
  const { url, drop } = await createTestDatabase('empty')
  drops.push(drop)
  return createDataSource(url, 4).initialize()
}

type Tables = readonly { readonly line: string }[]

/** Everything that migrations make: columns, indexes and constraints of our own tables. */
const shapeOf = (database: Awaited<ReturnType<typeof emptyDatabase>>): Promise<Tables> =>
  database.query(
    `select table_name || '.' || column_name || ' ' || data_type || ' ' || is_nullable || ' ' || coalesce(column_default, '') as line
       from information_schema.columns where table_schema = 'public' and table_name <> 'migration'
     union all select indexdef from pg_indexes where schemaname = 'public' and tablename <> 'migration'
     union all select conrelid::regclass || ' ' || pg_get_constraintdef(oid) from pg_constraint
       where connamespace = 'public'::regnamespace and conrelid <> 'migration'::regclass order by 1`,
  )

describe('migrations', () => {
  it('go up, down to nothing, and up to the same again', async () => {
    const database = await emptyDatabase()
    await database.runMigrations({ transaction: 'each' })
    const up = await shapeOf(database)
    for (let index = database.migrations.length; index > 0; index -= 1)
      await database.undoLastMigration({ transaction: 'each' })
    expect(await shapeOf(database)).toEqual([])
    await database.runMigrations({ transaction: 'each' })
    expect(await shapeOf(database)).toEqual(up)
    expect(up.length).toBeGreaterThan(200)
    await database.destroy()
  })

  it('leave nothing that the entities say otherwise', async () => {
    const database = await emptyDatabase()
    await database.runMigrations({ transaction: 'each' })
    const { upQueries } = await database.driver.createSchemaBuilder().log()
    expect(upQueries.map(({ query }) => query)).toEqual([])
    await database.destroy()
  })

  it('run once when four processes start together', async () => {
    const first = await emptyDatabase()
    const url = (first.options as { readonly url?: string }).url ?? ''
    const others = await Promise.all([1, 2, 3].map(() => createDataSource(url, 3).initialize()))
    const ran = await Promise.all([first, ...others].map((database) => migrate(database)))
    expect(ran.filter((names) => names.length > 0)).toHaveLength(1)
    for (const database of [first, ...others]) await database.destroy()
  })
})
