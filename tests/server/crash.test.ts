import { existsSync, mkdtempSync, rmSync } from 'node:fs'
import type { ChildProcess } from 'node:child_process'
import { randomUUID } from 'node:crypto'
import { join } from 'node:path'
import type { DataSource } from 'typeorm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createClient } from '../../shared/api/create-client.ts'
import { endpoints } from '../../shared/api/endpoint-registry.ts'
import { createDataSource } from '../../server/db/data-source.ts'
import { migrate } from '../../server/db/migrate.ts'
import { startMailFake, type MailFake } from '../../server/dev/mail-fake.ts'
import { startObjectStoreFake } from '../../server/dev/object-store-fake.ts'
import { startPostgres, stopPostgres, type RunningPostgres } from '../../server/dev/postgres.mjs'
import { Team } from '../../server/features/teams/team.entity.ts'
import { ApiToken } from '../../server/features/tokens/api-token.entity.ts'
import { hashSecret, makeSecret } from '../../server/http/secrets.ts'
import { createBoss, createJobQueue } from '../../server/jobs/job-queue.ts'
import { boxText, commitOf, pushOf } from './support/demo-push.ts'
import { freePort, kill, startProcess } from './support/processes.ts'

const folder = mkdtempSync(join(existsSync('/dev/shm') ? '/dev/shm' : '/tmp', 'foldgauge-crash-'))
const secret = makeSecret()
let postgres: RunningPostgres
let database: DataSource
let mail: MailFake
let objects: Awaited<ReturnType<typeof startObjectStoreFake>>
let env: Record<string, string>
const ports: number[] = []
const servers: ChildProcess[] = []
const workers: ChildProcess[] = []
const teamId = randomUUID()

const startServer = async (index: number): Promise<void> => {
  servers[index] = await startProcess(['server'], { ...env, PORT: String(ports[index]) })
}
const startWorker = async (index: number): Promise<void> => {
  workers[index] = await startProcess(['worker'], env)
}

beforeAll(async () => {
  // As in production: what is committed is on the disk.
  postgres = await startPostgres({ folder, isLasting: true })
  database = await createDataSource(postgres.url, 4).initialize()
  await migrate(database)
  mail = await startMailFake()
  objects = await startObjectStoreFake(join(folder, 'objects'))
  await database.manager.insert(Team, { id: teamId, slug: 'crash', name: 'Crash', createdAt: new Date() })
  await database.manager.insert(ApiToken, {
    id: randomUUID(),
    teamId,
    name: 'ci',
    prefix: 'abcdefghij',
    secretHash: hashSecret(secret),
    lastFour: secret.slice(-4),
    scopes: ['push', 'read'],
    creatorName: 'nobody',
    createdAt: new Date(),
    expiresAt: new Date(Date.now() + 86_400_000),
  })
  ports.push(await freePort(), await freePort())
  env = {
    NODE_ENV: 'test',
    DATABASE_URL: postgres.url,
    DATABASE_POOL: '6',
    PUBLIC_URL: 'http://localhost',
    FOLDGAUGE_SECRET: 'a secret for tests that is long enough',
    SMTP_URL: mail.url,
    S3_ENDPOINT: objects.url,
    S3_ACCESS_KEY: 'test',
    S3_SECRET_KEY: 'test',
    LOG_LEVEL: 'silent',
  }
  await Promise.all([startServer(0), startServer(1), startWorker(0), startWorker(1)])
})
afterAll(async () => {
  await Promise.all([...servers, ...workers].map(kill))
  if (database.isInitialized) await database.destroy()
  objects.server.closeAllConnections()
  objects.server.close()
  await mail.stop()
  await stopPostgres(folder)
  rmSync(folder, { recursive: true, force: true })
})

const pause = (milliseconds: number): Promise<void> => new Promise((fulfil) => setTimeout(fulfil, milliseconds))

async function until(what: string, isDone: () => Promise<boolean>, patience = 25_000): Promise<void> {
  for (const end = Date.now() + patience; Date.now() < end; await pause(150))
    if (await isDone().catch(() => false)) return
  throw new Error(`waited in vain for ${what}`)
}

const client = (index: number) =>
  createClient(
    (address, sent) => fetch(address, { ...(sent as RequestInit), signal: AbortSignal.timeout(8_000) }),
    `http://127.0.0.1:${String(ports[index])}`,
    { authorization: `Bearer fgt_abcdefghij_${secret}`, connection: 'close' },
  )

interface Acknowledged {
  readonly id: string
  readonly numbers: readonly number[]
}

/** Pushes one content after another to both servers until told to stop; keeps what was acknowledged. */
function startLoad(lanes: number): {
  readonly acknowledged: Acknowledged[]
  readonly failed: () => number
  stop(): Promise<void>
} {
  const acknowledged: Acknowledged[] = []
  let isOn = true
  let count = 0
  let failed = 0
  const lane = async (index: number): Promise<void> => {
    while (isOn) {
      count += 1
      const lid = `${(177 + (count % 90) / 10).toFixed(1)} x 135 mm`
      const body = pushOf({
        sets: ['a', 'b'].map((name) => ({
          file: `${name}.yaml`,
          text: boxText({ name: `${name}-${String(index)}`, lid }),
        })),
        commit: commitOf(count).slice(0, 30) + count.toString(16).padStart(10, '0'),
      })
      await client(index % 2)
        .call(endpoints.push, { params: { team: 'crash' }, body })
        .then(({ id, sets }) => void acknowledged.push({ id, numbers: sets.map(({ number }) => number) }))
        .catch(async () => {
          failed += 1
          await pause(100)
        })
    }
  }
  const running = Array.from({ length: lanes }, (_, index) => lane(index))
  return {
    acknowledged,
    failed: () => failed,
    async stop() {
      isOn = false
      await Promise.all(running)
    },
  }
}

/** What must hold whatever was killed when. */
async function expectNothingLost(acknowledged: readonly Acknowledged[]): Promise<void> {
  const pushes: { id: string; versions: number }[] = await database.query(
    `select p.id, count(c.version_id)::int as versions from push p
     left join push_version pv on pv.push_id = p.id left join version_content c on c.version_id = pv.version_id group by p.id`,
  )
  const versionsOf = new Map(pushes.map(({ id, versions }) => [id, versions]))
  expect(acknowledged.filter(({ id }) => versionsOf.get(id) !== 2)).toEqual([])
  // No half push either, acknowledged or not.
  expect(pushes.filter(({ versions }) => versions !== 2)).toEqual([])
  const orphans: unknown[] = await database.query(
    `select v.id from version v where not exists (select 1 from version_content c where c.version_id = v.id)
       or not exists (select 1 from push_version pv where pv.version_id = v.id)`,
  )
  expect(orphans).toEqual([])
  const numbers: { ok: boolean }[] = await database.query(
    `select count(*) = max(number) and max(number) = max(s.last_number) as ok from version v join template_set s on s.id = v.set_id group by set_id`,
  )
  expect(numbers.every(({ ok }) => ok)).toBe(true)
}

/** Jobs that a dead worker had begun are free again once their time is over: the test does not wait for it. */
async function freeJobsOfTheDead(): Promise<void> {
  await database.query(`update pgboss.job set expire_in = interval '1 millisecond' where state = 'active'`)
  const boss = createBoss(database, { migrate: false, isWorking: false })
  await boss.start()
  await boss.expire()
  await boss.stop({ graceful: false, close: false })
}

const nothingPending = async (): Promise<boolean> => {
  await database.query(`update pgboss.job set start_after = now() where state = 'retry'`)
  const [row]: { n: number }[] = await database.query(
    `select count(*)::int as n from version where change_state = 'pending'`,
  )
  return row?.n === 0
}

describe('two servers and two workers on one database', () => {
  it('do each job once', async () => {
    const boss = createBoss(database, { migrate: false, isWorking: false })
    await boss.start()
    const jobs = createJobQueue(boss)
    await database.transaction(async (manager) => {
      for (let index = 0; index < 60; index += 1)
        await jobs.add(
          manager,
          'send-mail',
          { to: 'a@quillfern.example', subject: `mail ${String(index)}`, text: 'x' },
          { teamId, about: 'x' },
        )
    })
    await boss.stop({ graceful: false, close: false })
    await until('sixty mails', () => Promise.resolve(mail.mails.length >= 60), 55_000)
    await pause(600)
    expect(mail.mails).toHaveLength(60)
    expect(new Set(mail.mails.map(({ subject }) => subject)).size).toBe(60)
  })

  it('lose nothing they acknowledged when a server, a worker and PostgreSQL are killed under load', async () => {
    const load = startLoad(4)
    await until('pushes', () => Promise.resolve(load.acknowledged.length > 6))
    await kill(servers[0] as ChildProcess)
    await kill(workers[0] as ChildProcess)
    await Promise.all([startServer(0), startWorker(0)])
    const before = load.acknowledged.length
    await until('pushes after the restart', () => Promise.resolve(load.acknowledged.length > before + 6))

    process.kill(postgres.id, 'SIGKILL')
    await pause(300)
    const restarted = await startPostgres({ folder, isLasting: true, port: postgres.port })
    expect(restarted.url).toBe(postgres.url)
    const then = load.acknowledged.length
    await until('pushes after the database is back', () => Promise.resolve(load.acknowledged.length > then + 6))
    await load.stop()
    await expectNothingLost(load.acknowledged)

    await freeJobsOfTheDead()
    await until('every comparison', nothingPending, 50_000)
  }, 150_000)
})
