// Speed of the server as ratios, each against something measured in the same run.
import express from 'express'
import { randomUUID } from 'node:crypto'
import { mkdtempSync, rmSync } from 'node:fs'
import { createServer } from 'node:http'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { createDataSource } from '../../server/db/data-source.ts'
import { migrate } from '../../server/db/migrate.ts'
import { poolOf } from '../../server/db/pool-of.ts'
import { startPostgres, stopPostgres } from '../../server/dev/postgres.mjs'
import { judge, readTokens } from '../../server/features/versions/judge.ts'
import { endpoints } from '../../shared/api/endpoint-registry.ts'
import { createTeam } from '../server/support/agent.ts'
import { boxText, pushOf } from '../server/support/demo-push.ts'
import { multiply } from '../server/support/multiply.ts'
import { startTestServer } from '../server/support/test-server.ts'

interface Row {
  readonly what: string
  readonly ratio: number
  readonly limit: number
  readonly isAtLeast: boolean
  readonly detail: string
}

const median = (values: readonly number[]): number =>
  values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0
const timed = async (work: () => Promise<unknown>): Promise<number> => {
  const from = performance.now()
  await work()
  return performance.now() - from
}

/** Medians of two things run turn about, so that a busy machine slows both alike. */
async function interleave(
  rounds: number,
  one: () => Promise<unknown>,
  other: () => Promise<unknown>,
): Promise<readonly [number, number]> {
  const times: [number[], number[]] = [[], []]
  for (let round = 0; round < rounds; round += 1) {
    times[0].push(await timed(one))
    times[1].push(await timed(other))
  }
  return [median(times[0]), median(times[1])]
}

const folder = mkdtempSync(join(tmpdir(), 'foldgauge-bench-'))
const postgres = await startPostgres({ folder })

async function server(name: string) {
  const admin = await createDataSource(postgres.url, 2).initialize()
  await admin.query(`create database ${name}`)
  await admin.destroy()
  const url = postgres.url.replace(/\/foldgauge$/, `/${name}`)
  const database = await createDataSource(url, 4).initialize()
  await migrate(database)
  await database.destroy()
  return startTestServer({ CHECK_ANSWERS: 'false', LOG_LEVEL: 'silent' }, { url, drop: () => Promise.resolve() })
}

let count = 0
const nextBody = () => {
  count += 1
  const lid = `${String(177 + (count % 4_000) / 1_000)} x 135 mm`
  return pushOf({ sets: [{ file: 'a.yaml', text: boxText({ lid }) }], commit: count.toString(16).padStart(40, '0') })
}

async function pushRow(): Promise<Row> {
  const real = await server('pushes')
  const team = await createTeam(real, 'bench')
  const pool = poolOf(real.context.database)
  await pool.query('create table bare (id uuid primary key, body jsonb not null)')
  const bare = express()
  bare.post('/', express.json({ limit: '12mb' }), async (request, response) => {
    await pool.query('insert into bare (id, body) values ($1, $2)', [randomUUID(), JSON.stringify(request.body)])
    response.status(201).json({})
  })
  const web = createServer(bare)
  await new Promise<void>((fulfil) => web.listen(0, '127.0.0.1', fulfil))
  const address = web.address()
  const url = `http://127.0.0.1:${String(typeof address === 'object' && address !== null ? address.port : 0)}/`
  const push = () => team.author.call(endpoints.push, { params: { team: 'bench' }, body: nextBody() })
  const insert = () =>
    fetch(url, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(nextBody()),
    }).then((answer) => answer.text())
  for (let warm = 0; warm < 15; warm += 1) await Promise.all([push(), insert()])
  const check = async () => {
    const body = nextBody()
    const workspace = readTokens(body.workspace)
    for (const set of body.sets)
      await judge(set.text, set.file, workspace, { asOf: '2026-12-01', workmanship: null, paper: null, scale: 1 })
  }
  const [pushed, inserted] = await interleave(60, push, insert)
  const [checked] = await interleave(30, check, () => Promise.resolve())
  web.close()
  await real.stop()
  return {
    what: 'pushes a second against a bare route that inserts the same JSON, without the check',
    ratio: inserted / Math.max(0.01, pushed - checked),
    limit: 0.5,
    isAtLeast: true,
    detail: `push ${pushed.toFixed(1)} ms of which the check ${checked.toFixed(1)} ms; bare ${inserted.toFixed(1)} ms; with the check ${(inserted / pushed).toFixed(2)}`,
  }
}

async function filled(name: string, versions: number) {
  const one = await server(name)
  const team = await createTeam(one, 'bench')
  for (const lid of ['177 x 135 mm', '178 x 136 mm'])
    await team.author.call(endpoints.push, {
      params: { team: 'bench' },
      body: pushOf({ sets: [{ file: 'a.yaml', text: boxText({ lid }) }] }),
    })
  await one.work()
  await multiply(one.context.database, { versions, sets: Math.max(10, versions / 50), notices: 10, entries: 10 })
  const set = { team: 'bench', set: 'boxed-notes' }
  return {
    list: () => team.viewer.call(endpoints.versions, { params: set }),
    sets: () => team.viewer.call(endpoints.sets, { params: { team: 'bench' } }),
    compare: () => team.viewer.call(endpoints.compare, { params: { ...set, number: 2 }, query: { with: 1 } }),
    stop: () => one.stop(),
  }
}

async function sizeRows(): Promise<readonly Row[]> {
  const small = await filled('small', 1_000)
  const large = await filled('large', 100_000)
  const rows: Row[] = []
  for (const [what, name] of [
    ['list of versions', 'list'],
    ['list of sets', 'sets'],
    ['comparison', 'compare'],
  ] as const) {
    for (let warm = 0; warm < 10; warm += 1) await Promise.all([small[name](), large[name]()])
    const [much, little] = await interleave(40, large[name], small[name])
    rows.push({
      what: `${what} at 100,000 versions against 1,000`,
      ratio: much / little,
      limit: 1.5,
      isAtLeast: false,
      detail: `${much.toFixed(1)} ms against ${little.toFixed(1)} ms`,
    })
  }
  await small.stop()
  await large.stop()
  return rows
}

const rows = [await pushRow(), ...(await sizeRows())]
await stopPostgres(folder)
rmSync(folder, { recursive: true, force: true })
for (const { what, ratio, limit, isAtLeast, detail } of rows) {
  const isMet = isAtLeast ? ratio >= limit : ratio <= limit
  console.log(
    `${isMet ? 'ok  ' : 'MISS'} ${ratio.toFixed(2)} (${isAtLeast ? 'at least' : 'at most'} ${String(limit)})  ${what}: ${detail}`,
  )
  if (!isMet) process.exitCode = 1
}
