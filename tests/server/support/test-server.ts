import { mkdtempSync, rmSync } from 'node:fs'
import { createServer, type Server } from 'node:http'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type PgBoss from 'pg-boss'
import { createApp } from '../../../server/app.ts'
import { readConfig } from '../../../server/config.ts'
import { createDataSource } from '../../../server/db/data-source.ts'
import { startMailFake, type MailFake } from '../../../server/dev/mail-fake.ts'
import { startObjectStoreFake } from '../../../server/dev/object-store-fake.ts'
import type { WorkContext } from '../../../server/jobs/job-handler.ts'
import { createBoss, createJobQueue } from '../../../server/jobs/job-queue.ts'
import { drainJobs } from '../../../server/jobs/run-worker.ts'
import { createLog } from '../../../server/log.ts'
import { createMailer } from '../../../server/mail/mailer.ts'
import { createObjectStore } from '../../../server/storage/object-store.ts'

export interface TestServer {
  readonly url: string
  readonly context: WorkContext
  readonly boss: PgBoss
  readonly mail: MailFake
  /** Lines of the log. */
  readonly lines: readonly string[]
  /** Does every job that waits. */
  work(): Promise<number>
  /** Moves the clock of the server on. */
  later(milliseconds: number): void
  stop(): Promise<void>
}

const listen = (server: Server): Promise<number> =>
  new Promise((fulfil) => {
    server.listen(0, '127.0.0.1', () => {
      const address = server.address()
      fulfil(typeof address === 'object' && address !== null ? address.port : 0)
    })
  })

/** A test file's own database; loaded only inside of tests, for benches bring theirs. */
const ownDatabase = async (): Promise<{ readonly url: string; drop(): Promise<void> }> =>
  (await import('./test-database.ts')).createTestDatabase()

/** A whole server with its own database, mail and files, reached over HTTP. */
export async function startTestServer(
  environment: Readonly<Record<string, string>> = {},
  given: { readonly url: string; drop(): Promise<void> } | null = null,
): Promise<TestServer> {
  const [made, mail] = await Promise.all([given ?? ownDatabase(), startMailFake()])
  const folder = mkdtempSync(join(tmpdir(), 'foldgauge-objects-'))
  const store = await startObjectStoreFake(folder)
  const web = createServer()
  const url = `http://127.0.0.1:${String(await listen(web))}`
  const config = readConfig({
    NODE_ENV: 'test',
    DATABASE_URL: made.url,
    DATABASE_POOL: '6',
    PUBLIC_URL: url,
    FOLDGAUGE_SECRET: 'a secret for tests that is long enough',
    SMTP_URL: mail.url,
    S3_ENDPOINT: store.url,
    S3_ACCESS_KEY: 'test',
    S3_SECRET_KEY: 'test',
    PASSWORD_MEMORY: '64',
    CHECK_ANSWERS: 'true',
    REQUESTS_PER_MINUTE: '100000',
    LOG_LEVEL: 'debug',
    ...environment,
  })
  const lines: string[] = []
  const log = createLog(config.LOG_LEVEL, { write: (line: string) => void lines.push(line) })
  const database = await createDataSource(config.DATABASE_URL, config.DATABASE_POOL).initialize()
  const boss = createBoss(database, { migrate: false, isWorking: false })
  await boss.start()
  const objects = createObjectStore(config)
  await objects.makeReady()
  const mailer = createMailer(config)
  let offset = 0
  const now = (): Date => new Date(Date.now() + offset)
  const context: WorkContext = { config, database, jobs: createJobQueue(boss), objects, log, mailer, now }
  web.on('request', createApp(context))
  return {
    url,
    context,
    boss,
    mail,
    lines,
    work: () => drainJobs(boss, context),
    later: (milliseconds) => {
      offset += milliseconds
    },
    async stop() {
      web.closeAllConnections()
      await new Promise((fulfil) => web.close(fulfil))
      await boss.stop({ graceful: false, close: false })
      mailer.close()
      objects.close()
      await database.destroy()
      store.server.closeAllConnections()
      store.server.close()
      await mail.stop()
      await made.drop()
      rmSync(folder, { recursive: true, force: true })
    },
  }
}
