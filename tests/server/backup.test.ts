import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { endpoints } from '../../shared/api/endpoint-registry.ts'
import { isUpToDate } from '../../server/db/migrate.ts'
import { createDataSource } from '../../server/db/data-source.ts'
import { postgresPrograms } from '../../server/dev/postgres.mjs'
import { createTeam } from './support/agent.ts'
import { pushOf } from './support/demo-push.ts'
import { createTestDatabase } from './support/test-database.ts'
import { startTestServer, type TestServer } from './support/test-server.ts'

let server: TestServer
const folder = mkdtempSync(join(tmpdir(), 'foldgauge-backup-'))
beforeAll(async () => {
  server = await startTestServer()
})
afterAll(async () => {
  await server.stop()
  rmSync(folder, { recursive: true, force: true })
})

const program = (name: string, words: readonly string[]): void => {
  const result = spawnSync(join(postgresPrograms(), name), words, { encoding: 'utf8' })
  expect([name, result.status, result.stderr]).toEqual([name, 0, ''])
}

describe('a backup', () => {
  it('restores into an empty database with every row, and waiting jobs, as they were', async () => {
    const team = await createTeam(server, 'kept')
    await team.author.call(endpoints.push, { params: { team: 'kept' }, body: pushOf() })
    const file = join(folder, 'backup')
    program('pg_dump', ['--format=custom', `--file=${file}`, server.context.config.DATABASE_URL])
    const empty = await createTestDatabase('empty')
    program('pg_restore', ['--no-owner', '--exit-on-error', `--dbname=${empty.url}`, file])
    const restored = await createDataSource(empty.url, 2).initialize()
    expect(await isUpToDate(restored)).toBe(true)
    const countAll = async (database: typeof restored): Promise<Record<string, number>> => {
      const tables: { name: string }[] = await database.query(
        `select schemaname || '.' || tablename as name from pg_tables where schemaname in ('public', 'pgboss') order by 1`,
      )
      const counts: Record<string, number> = {}
      for (const { name } of tables) {
        const [row]: { n: number }[] = await database.query(`select count(*)::int as n from ${name}`)
        counts[name] = row?.n ?? -1
      }
      return counts
    }
    const counts = await countAll(restored)
    expect(counts).toEqual(await countAll(server.context.database))
    expect(counts['public.version']).toBe(1)
    await restored.destroy()
    await empty.drop()
  })
})
