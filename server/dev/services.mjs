// Everything that `npm start` runs: PostgreSQL, stand-ins for mail and files, the demo team, server and worker.
import { spawn } from 'node:child_process'
import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { createServer } from 'node:net'
import { join } from 'node:path'
import { startPostgres, stopPostgres } from './postgres.mjs'
import { root } from './steps.mjs'

/** Who can sign in to the demo team; the same list as in seed-people.ts. */
export const demoSignIns = {
  password: 'fold-score-crease',
  people: [
    { role: 'owner', email: 'olive@quillfern.example' },
    { role: 'author', email: 'arlo@quillfern.example' },
    { role: 'reviewer', email: 'rhea@quillfern.example' },
    { role: 'tester', email: 'tess@quillfern.example' },
    { role: 'viewer', email: 'vito@quillfern.example' },
  ],
}

const isFree = (port) =>
  new Promise((fulfil) => {
    const probe = createServer()
    probe.once('error', () => fulfil(false))
    probe.listen(port, '127.0.0.1', () => probe.close(() => fulfil(true)))
  })

async function firstFreePort(from) {
  for (let port = from; port < from + 50; port += 1) if (await isFree(port)) return port
  throw new Error(`No port between ${from} and ${from + 50} is free.`)
}

/** Sessions and webhooks outlive a restart only with the same secret. */
function keptSecret(folder) {
  const file = join(folder, 'secret')
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('hex'), { mode: 0o600 })
  return readFileSync(file, 'utf8').trim()
}

/** Starts a program of ours and waits for its first word over the channel between both. */
function start(name, words, env, children, quiet) {
  const child = spawn(process.execPath, words, {
    cwd: root,
    env: { ...process.env, AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true', ...env },
    stdio: ['ignore', quiet ? 'ignore' : 'inherit', 'inherit', 'ipc'],
  })
  children.push(child)
  return new Promise((fulfil, reject) => {
    child.once('message', fulfil)
    child.once('error', reject)
    child.once('exit', (code) => reject(new Error(`${name} ended with ${code} before it was ready.`)))
  })
}

/** Runs a program of ours to its end. */
function run(name, words, env) {
  const child = spawn(process.execPath, words, {
    cwd: root,
    env: { ...process.env, AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true', ...env },
    stdio: ['ignore', 'inherit', 'inherit'],
  })
  return new Promise((fulfil, reject) => {
    child.once('error', reject)
    child.once('exit', (code) => (code === 0 ? fulfil() : reject(new Error(`${name} ended with ${code}.`))))
  })
}

/**
 * Starts everything and waits until it answers. Needs packages, `dist/server/main.js`, and `dist/page` where the page
 * is wanted.
 * @param options.isFresh forgets what was kept
 * @param options.folder where everything is kept
 * @param options.say told what is being done
 * @returns address of the page, of the kept mail, and `stop`
 */
export async function startServices({
  isFresh = false,
  folder = join(root, '.data', 'demo'),
  port = 4180,
  say = () => undefined,
  isSeeded = true,
} = {}) {
  const postgresFolder = join(folder, 'postgres')
  const children = []
  const stop = async () => {
    const ended = children.map((child) =>
      child.exitCode !== null || child.signalCode !== null
        ? undefined
        : new Promise((fulfil) => {
            const timer = setTimeout(() => child.kill('SIGKILL'), 20_000)
            child.once('exit', () => {
              clearTimeout(timer)
              fulfil()
            })
            child.kill('SIGTERM')
          }),
    )
    await Promise.all(ended)
    await stopPostgres(postgresFolder)
  }
  try {
    if (isFresh) {
      await stopPostgres(postgresFolder)
      rmSync(folder, { recursive: true, force: true })
    }
    mkdirSync(folder, { recursive: true })
    say('Starting PostgreSQL')
    const postgres = await startPostgres({ folder: postgresFolder })
    say('Starting stand-ins for mail and files')
    const mailPort = await firstFreePort(port + 100)
    const fakes = await start(
      'the stand-ins',
      ['--import', 'tsx', 'server/dev/fakes.ts', folder, String(mailPort)],
      {},
      children,
    )
    const webPort = await firstFreePort(port)
    const address = `http://localhost:${webPort}`
    const env = {
      NODE_ENV: 'development',
      DATABASE_URL: postgres.url,
      PUBLIC_URL: address,
      HOST: '127.0.0.1',
      PORT: String(webPort),
      FOLDGAUGE_SECRET: keptSecret(folder),
      SMTP_URL: fakes.smtp,
      S3_ENDPOINT: fakes.objects,
      S3_ACCESS_KEY: 'development',
      S3_SECRET_KEY: 'development',
      PAGE_FOLDER: join(root, 'dist', 'page'),
      LOG_LEVEL: process.env.LOG_LEVEL ?? 'warn',
      CHECK_ANSWERS: 'true',
    }
    if (isSeeded) {
      say('Filling the database with the demo team (only the first time)')
      await run('the seed', ['--import', 'tsx', 'server/dev/seed.ts'], env)
    }
    say('Starting server and worker')
    await start('the server', ['dist/server/main.js', 'migrate', 'server'], env, children)
    await start('the worker', ['dist/server/main.js', 'worker'], env, children)
    return { address, mails: fakes.mails, database: postgres.url, environment: env, children, stop }
  } catch (error) {
    await stop()
    throw error
  }
}
