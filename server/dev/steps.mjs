// Small steps that the start and test commands are made of. No packages: they run on a bare machine.
import { spawnSync } from 'node:child_process'
import { existsSync } from 'node:fs'
import { fileURLToPath } from 'node:url'

export const root = fileURLToPath(new URL('../../', import.meta.url)).replace(/\/$/, '')

const oldest = 20

/** Ends with a plain sentence where Node.js is too old to run anything here. */
export function requireNode() {
  const major = Number(process.versions.node.split('.')[0])
  if (major >= oldest) return
  console.error(`Foldgauge needs Node.js ${oldest} or newer; this is ${process.versions.node}.`)
  process.exit(2)
}

/** Runs a command in the project's folder and ends with its exit code where it fails. */
export function runStep(title, command, words, options = {}) {
  console.error(`• ${title}`)
  const result = spawnSync(command, words, { cwd: root, stdio: ['ignore', 2, 2], ...options })
  if (result.error !== undefined) {
    console.error(`${title}: ${command} could not be started (${result.error.code}).`)
    process.exit(2)
  }
  if (result.status !== 0) {
    console.error(`${title} failed.`)
    process.exit(result.status ?? 1)
  }
}

const isRoot = () => process.getuid?.() === 0
const has = (command) => spawnSync('sh', ['-c', `command -v ${command}`], { stdio: 'ignore' }).status === 0

/** Installs Debian packages whose files are missing; says what to do where it may not. */
export function installDebianPackages(wanted) {
  const missing = wanted.filter(({ files }) => !files.some((file) => existsSync(file)))
  if (missing.length === 0) return
  const names = missing.map(({ name }) => name)
  const mayInstall = isRoot() || (has('sudo') && spawnSync('sudo', ['-n', 'true'], { stdio: 'ignore' }).status === 0)
  if (!has('apt-get') || !mayInstall) {
    console.error(
      `These programs are missing: ${names.join(', ')}. Install them (with Debian, as root: apt-get install ${names.join(' ')}) and start again.`,
    )
    process.exit(2)
  }
  const prefix = isRoot() ? [] : ['sudo', '-n']
  const call = (words) => {
    const [command, ...rest] = [...prefix, 'apt-get', ...words]
    return [command, rest]
  }
  const environment = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' }
  const update = call(['update', '-qq'])
  runStep('Reading the package lists', update[0], update[1], { env: environment })
  const install = call(['install', '-y', '-qq', '--no-install-recommends', ...names])
  runStep(`Installing ${names.join(', ')}`, install[0], install[1], { env: environment })
}
