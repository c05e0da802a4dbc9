import { createServer } from 'node:http'
import { createApp } from './app.ts'
import { ConfigError, readConfig, type Config } from './config.ts'
import type { Context } from './context.ts'
import { createDataSource } from './db/data-source.ts'
import { migrate } from './db/migrate.ts'
import { createMetrics, serveMetrics, type Metrics } from './http/metrics.ts'
import { createBoss, createJobQueue } from './jobs/job-queue.ts'
import { runWorker } from './jobs/run-worker.ts'
import { createLog } from './log.ts'
import { createMailer } from './mail/mailer.ts'
import { createObjectStore } from './storage/object-store.ts'

/** Time that work under way gets to end when the process is asked to stop. */
const patience = 15_000

interface Running {
  stop(): Promise<void>
}

async function serve(context: Context, metrics: Metrics): Promise<Running> {
  const { config, log } = context
  const server = createServer({ requestTimeout: 60_000, headersTimeout: 15_000 }, createApp(context, metrics))
  await new Promise<void>((fulfil, reject) => {
    server.once('error', reject)
    server.listen(config.PORT, config.HOST, fulfil)
  })
  log.info({ address: server.address() }, 'server ready')
  return {
    stop: () =>
      new Promise((fulfil) => {
        server.close(() => fulfil())
        server.closeIdleConnections()
        setTimeout(() => server.closeAllConnections(), patience).unref()
      }),
  }
}

async function start(config: Config, parts: ReadonlySet<string>): Promise<void> {
  const log = createLog(config.LOG_LEVEL)
  const database = await createDataSource(config.DATABASE_URL, config.DATABASE_POOL).initialize()
  if (parts.has('migrate')) log.info({ ran: await migrate(database) }, 'database up to date')
  if (!parts.has('server') && !parts.has('worker')) {
    await database.destroy()
    return
  }
  const isWorking = parts.has('worker')
  const boss = createBoss(database, { migrate: false, isWorking })
  boss.on('error', (error) => {
    log.warn({ err: error }, 'the queue complains')
  })
  await boss.start()
  const objects = createObjectStore(config)
  if (isWorking) await objects.makeReady()
  const context: Context = { config, database, log, objects, jobs: createJobQueue(boss), now: () => new Date() }
  const metrics = createMetrics(database)
  const metricsServer =
    config.METRICS_PORT === undefined ? null : await serveMetrics(metrics.registry, config.METRICS_PORT)
  const mailer = isWorking ? createMailer(config) : null
  const worker = mailer === null ? null : await runWorker(boss, { ...context, mailer }, metrics)
  const server = parts.has('server') ? await serve(context, metrics) : null

  let isStopping = false
  const stop = async (): Promise<void> => {
    if (isStopping) return
    isStopping = true
    await server?.stop()
    await Promise.race([worker?.stop(), new Promise((fulfil) => setTimeout(fulfil, patience).unref())])
    await boss.stop({ graceful: false, close: false })
    metricsServer?.close()
    mailer?.close()
    objects.close()
    await database.destroy()
    // The channel to whoever started this process would keep it running.
    if (process.connected) process.disconnect()
  }
  for (const signal of ['SIGINT', 'SIGTERM'] as const) process.once(signal, () => void stop())
  // Started by another program that is gone now.
  process.once('disconnect', () => void stop())
  process.send?.('ready')
}

const words = new Set(process.argv.slice(2))
const known = ['migrate', 'server', 'worker']

if (words.size === 0 || [...words].some((word) => !known.includes(word))) {
  console.error(`Usage: node dist/server/main.js ${known.map((word) => `[${word}]`).join(' ')}`)
  process.exitCode = 2
} else {
  try {
    await start(readConfig(process.env), words)
  } catch (error) {
    console.error(error instanceof ConfigError ? error.message : `The server could not start: ${String(error)}`)
    process.exitCode = error instanceof ConfigError ? 2 : 1
    // What was opened before would keep the process.
    setTimeout(() => process.exit(), 100)
  }
}
