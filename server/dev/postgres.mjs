// A PostgreSQL of our own on loopback, as root or as an ordinary user. No packages: it runs before they are installed.
// Usable from other scripts (startPostgres, stopPostgres) and by hand: node server/dev/postgres.mjs start|stop|url [FOLDER]
import { spawn, spawnSync } from 'node:child_process'
import { existsSync, mkdirSync, openSync, closeSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { createServer } from 'node:net'
import { join, resolve } from 'node:path'
import { fileURLToPath } from 'node:url'
import { installDebianPackages, root } from './steps.mjs'

const usualFolder = join(root, '.data', 'postgres')
const isRoot = () => process.getuid?.() === 0

/** Folder of the newest PostgreSQL's programs. */
function findPrograms() {
  if (process.env.PG_BIN !== undefined) return process.env.PG_BIN
  const versions = existsSync('/usr/lib/postgresql')
    ? readdirSync('/usr/lib/postgresql').filter((name) => existsSync(`/usr/lib/postgresql/${name}/bin/initdb`))
    : []
  const newest = versions.sort((a, b) => Number(b) - Number(a))[0]
  if (newest !== undefined) return `/usr/lib/postgresql/${newest}/bin`
  const found = spawnSync('sh', ['-c', 'command -v initdb'], { encoding: 'utf8' }).stdout?.trim()
  return found ? found.replace(/\/initdb$/, '') : null
}

/** PostgreSQL's programs, installed where they are missing. */
export function postgresPrograms() {
  const found = findPrograms()
  if (found !== null) return found
  // Debian would otherwise make and start a cluster of its own.
  if (isRoot() && !existsSync('/etc/postgresql-common/createcluster.conf')) {
    mkdirSync('/etc/postgresql-common', { recursive: true })
    writeFileSync('/etc/postgresql-common/createcluster.conf', 'create_main_cluster = false\n')
  }
  installDebianPackages([{ name: 'postgresql', files: [] }])
  const installed = findPrograms()
  if (installed !== null) return installed
  console.error(
    'PostgreSQL was installed but its programs are not where they were expected; set PG_BIN to their folder.',
  )
  process.exit(2)
}

const accountId = (kind) => {
  const line = readFileSync(kind === 'user' ? '/etc/passwd' : '/etc/group', 'utf8')
    .split('\n')
    .find((entry) => entry.startsWith('postgres:'))
  return line === undefined ? null : Number(line.split(':')[2])
}

/** PostgreSQL refuses to run as root. A user namespace makes it another user whose files stay root's own. */
function asOrdinaryUser(command, words, mode) {
  if (mode === 'direct') return [command, words]
  if (mode === 'namespace') {
    const user = accountId('user')
    const group = accountId('group')
    return ['unshare', ['-U', `--map-user=${user}`, `--map-group=${group}`, '--', command, ...words]]
  }
  return ['setpriv', ['--reuid=postgres', '--regid=postgres', '--clear-groups', '--', command, ...words]]
}

/** How the cluster is run; one that exists is opened in the mode that made it. */
function chooseMode(folder) {
  if (!isRoot()) return 'direct'
  const note = join(folder, 'run-mode')
  if (existsSync(note)) return readFileSync(note, 'utf8').trim()
  const user = accountId('user')
  const test = spawnSync('unshare', ['-U', `--map-user=${user}`, `--map-group=${accountId('group')}`, '--', 'true'])
  return test.status === 0 ? 'namespace' : 'setpriv'
}

const freePort = () =>
  new Promise((fulfil, reject) => {
    const probe = createServer()
    probe.once('error', reject)
    probe.listen(0, '127.0.0.1', () => {
      const { port } = probe.address()
      probe.close(() => fulfil(port))
    })
  })

const pause = (milliseconds) => new Promise((fulfil) => setTimeout(fulfil, milliseconds))

/** Whether a process runs; one that has ended but was not waited for does not. */
function isRunning(id) {
  try {
    const stat = readFileSync(`/proc/${id}/stat`, 'utf8')
    return stat.slice(stat.lastIndexOf(')') + 2, stat.lastIndexOf(')') + 3) !== 'Z'
  } catch {
    return false
  }
}

const pidFile = (folder) => join(folder, 'cluster', 'postmaster.pid')

/** Where the cluster of a folder runs; null where it does not. */
export function runningPostgres(folder = usualFolder) {
  if (!existsSync(pidFile(folder))) return null
  const [id, , , port, , , , state] = readFileSync(pidFile(folder), 'utf8').split('\n')
  if (!isRunning(Number(id)) || state?.trim() !== 'ready') return null
  return { id: Number(id), port: Number(port), url: `postgres://foldgauge@127.0.0.1:${port}/foldgauge` }
}

function initialise(folder, mode, programs) {
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  if (mode === 'setpriv') spawnSync('chown', ['postgres', folder])
  const [command, words] = asOrdinaryUser(
    join(programs, 'initdb'),
    ['-D', join(folder, 'cluster'), '-U', 'foldgauge', '-A', 'trust', '-E', 'UTF8', '--locale=C.UTF-8', '--no-sync'],
    mode,
  )
  const made = spawnSync(command, words, { encoding: 'utf8' })
  if (made.status !== 0) throw new Error(`PostgreSQL could not be set up in ${folder}: ${made.stderr || made.error}`)
  writeFileSync(join(folder, 'run-mode'), mode)
}

/** Makes the database `foldgauge` where it is missing. */
function makeDatabase(programs, port) {
  const psql = (words) =>
    spawnSync(join(programs, 'psql'), ['-h', '127.0.0.1', '-p', String(port), '-U', 'foldgauge', '-qAt', ...words], {
      encoding: 'utf8',
    })
  const known = psql(['-d', 'postgres', '-c', "select 1 from pg_database where datname = 'foldgauge'"])
  if (known.stdout.trim() === '1') return
  const made = psql(['-d', 'postgres', '-c', 'create database foldgauge'])
  if (made.status !== 0) throw new Error(`the database could not be made: ${made.stderr}`)
}

/**
 * Starts PostgreSQL and waits until it answers.
 * @param options.folder where it keeps its files
 * @param options.port a port to keep; else a free one
 * @param options.isLasting false gives up safety of the disk for speed: tests
 * @returns its url, port, process id, and `stop`
 */
export async function startPostgres({ folder = usualFolder, isLasting = true, port: wanted } = {}) {
  const programs = postgresPrograms()
  const already = runningPostgres(folder)
  if (already !== null) return { ...already, folder, stop: () => stopPostgres(folder) }
  const mode = chooseMode(folder)
  if (!existsSync(join(folder, 'cluster', 'PG_VERSION'))) initialise(folder, mode, programs)
  for (let attempt = 1; ; attempt += 1) {
    const port = wanted ?? (await freePort())
    const settings = {
      listen_addresses: '127.0.0.1',
      port: String(port),
      unix_socket_directories: '',
      jit: 'off',
      max_connections: '120',
      ...(isLasting ? {} : { fsync: 'off', synchronous_commit: 'off', full_page_writes: 'off', autovacuum: 'off' }),
    }
    const [command, words] = asOrdinaryUser(
      join(programs, 'postgres'),
      [
        '-D',
        join(folder, 'cluster'),
        ...Object.entries(settings).flatMap(([name, value]) => ['-c', `${name}=${value}`]),
      ],
      mode,
    )
    const log = openSync(join(folder, 'log'), 'a')
    const server = spawn(command, words, { stdio: ['ignore', log, log], detached: true })
    closeSync(log)
    server.unref()
    let ended = false
    server.once('exit', () => (ended = true))
    server.once('error', () => (ended = true))
    const until = Date.now() + 20_000
    while (!ended && Date.now() < until) {
      const running = runningPostgres(folder)
      if (running !== null) {
        makeDatabase(programs, running.port)
        return { ...running, folder, stop: () => stopPostgres(folder) }
      }
      await pause(15)
    }
    if (attempt === 3) {
      const tail = readFileSync(join(folder, 'log'), 'utf8').trim().split('\n').slice(-5).join('\n')
      throw new Error(`PostgreSQL did not start. Its log ends:\n${tail}`)
    }
  }
}

/** Stops the cluster of a folder at once but cleanly, and waits for it. */
export async function stopPostgres(folder = usualFolder) {
  if (!existsSync(pidFile(folder))) return
  const id = Number(readFileSync(pidFile(folder), 'utf8').split('\n')[0])
  if (!isRunning(id)) return
  process.kill(id, 'SIGINT')
  const until = Date.now() + 10_000
  while (isRunning(id)) {
    if (Date.now() > until) throw new Error(`PostgreSQL (process ${id}) did not stop.`)
    await pause(10)
  }
}

/** Forgets everything a cluster kept. It must not run. */
export function removePostgres(folder = usualFolder) {
  if (runningPostgres(folder) !== null) throw new Error('PostgreSQL still runs there; stop it first.')
  rmSync(folder, { recursive: true, force: true })
}

if (process.argv[1] !== undefined && resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  const [word, folder = usualFolder] = process.argv.slice(2)
  if (word === 'start') console.log((await startPostgres({ folder })).url)
  else if (word === 'stop') await stopPostgres(folder)
  else if (word === 'url' && runningPostgres(folder) !== null) console.log(runningPostgres(folder).url)
  else {
    console.error(word === 'url' ? 'PostgreSQL does not run.' : 'Usage: postgres.mjs start|stop|url [FOLDER]')
    process.exitCode = 2
  }
}
