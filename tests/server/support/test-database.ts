import { existsSync, mkdirSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { Client } from 'pg'
import { inject } from 'vitest'
import { createDataSource } from '../../../server/db/data-source.ts'
import { migrate } from '../../../server/db/migrate.ts'
import { runningPostgres, startPostgres } from '../../../server/dev/postgres.mjs'

const pause = (milliseconds: number): Promise<void> => new Promise((fulfil) => setTimeout(fulfil, milliseconds))

/** One file at a time, by the one thing that file systems do atomically. */
async function alone<T>(folder: string, work: () => Promise<T>): Promise<T> {
  const lock = join(folder, 'lock')
  for (;;) {
    try {
      mkdirSync(lock)
      break
    } catch {
      const age = existsSync(lock) ? Date.now() - statSync(lock).mtimeMs : 0
      if (age > 60_000) rmSync(lock, { recursive: true, force: true })
      await pause(25)
    }
  }
  try {
    return await work()
  } finally {
    rmSync(lock, { recursive: true, force: true })
  }
}

const withDatabase = (url: string, name: string): string => url.replace(/\/foldgauge$/, `/${name}`)

export async function runSql(url: string, sql: string): Promise<void> {
  const client = new Client({ connectionString: url })
  await client.connect()
  try {
    await client.query(sql)
  } finally {
    await client.end()
  }
}

/** The shared cluster, with a migrated database to copy. @returns its url */
export async function testCluster(): Promise<string> {
  const folder = inject('postgresFolder')
  return alone(folder, async () => {
    const running = runningPostgres(folder) ?? (await startPostgres({ folder, isLasting: false }))
    const ready = join(folder, 'template-ready')
    if (!existsSync(ready)) {
      await runSql(running.url, 'create database pattern')
      const database = await createDataSource(withDatabase(running.url, 'pattern'), 4).initialize()
      await migrate(database)
      await database.destroy()
      writeFileSync(ready, '')
    }
    return running.url
  })
}

let count = 0

/** An own migrated database for a test file. */
export async function createTestDatabase(from = 'pattern'): Promise<{ readonly url: string; drop(): Promise<void> }> {
  const cluster = await testCluster()
  count += 1
  const name = `test_${String(process.pid)}_${String(count)}_${Math.random().toString(36).slice(2, 8)}`
  const copy = from === 'empty' ? '' : ` template ${from} strategy file_copy`
  await alone(inject('postgresFolder'), () => runSql(cluster, `create database ${name}${copy}`))
  return {
    url: withDatabase(cluster, name),
    drop: () => runSql(cluster, `drop database if exists ${name} with (force)`),
  }
}
