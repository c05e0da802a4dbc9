// npm start: installs what is missing, builds, checks the demo workspace, then runs server, worker and page with a demo
// team until it is interrupted.
import { spawnSync } from 'node:child_process'
import { join } from 'node:path'
import { parseArgs } from 'node:util'
import { buildCommandLine, buildPage, buildServer } from './build.mjs'
import { installNodePackages } from './node-packages.mjs'
import { requireNode, root } from './steps.mjs'

const usage = `npm start                 checks the demo workspace, then runs everything until Ctrl-C
npm start -- --fresh      the same, but forgets what was kept from the last time
npm start -- --port 5000  the page on another port (or the next free one)
npm start -- --check      only checks the demo workspace`

function readOptions() {
  try {
    const { values } = parseArgs({
      options: {
        fresh: { type: 'boolean', default: false },
        check: { type: 'boolean', default: false },
        port: { type: 'string', default: '4180' },
        help: { type: 'boolean', default: false },
      },
    })
    const port = Number(values.port)
    if (!Number.isInteger(port) || port < 1024 || port > 65000) {
      throw new Error(`--port ${values.port}: a port is a whole number from 1024 to 65000.`)
    }
    return { ...values, port }
  } catch (error) {
    console.error(`${error.message}\n\n${usage}`)
    process.exit(2)
  }
}

const options = readOptions()
if (options.help) {
  console.log(usage)
  process.exit(0)
}

requireNode()
installNodePackages()
buildCommandLine()

const check = spawnSync(process.execPath, [join(root, 'dist/cli/foldgauge.js'), 'check'], {
  cwd: join(root, 'shared', 'demo'),
  stdio: 'inherit',
})
console.error(`
That was the demo workspace in shared/demo. Next, see a lid that no longer clears its box:
  npm run -s foldgauge -- check shared/demo/failing
`)
if (options.check || check.status !== 0) process.exit(check.status ?? 1)

buildServer()
buildPage()

// Loaded only now, for it needs PostgreSQL's programs and packages.
const { demoSignIns, startServices } = await import('./services.mjs')
const say = (what) => console.error(`• ${what}`)

let interrupted = false
let services = null
const waiting = setInterval(() => undefined, 60_000)
async function end(code) {
  if (interrupted) return
  interrupted = true
  clearInterval(waiting)
  if (services !== null) {
    say('Stopping; what was stored is kept for the next start')
    await services.stop()
    process.exit(code)
  }
}
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void end(0))

try {
  services = await startServices({ isFresh: options.fresh, port: options.port, say })
} catch (error) {
  console.error(error instanceof Error ? error.message : String(error))
  process.exit(1)
}
if (interrupted) {
  await services.stop()
  process.exit(0)
}

const widest = Math.max(...demoSignIns.people.map(({ email }) => email.length))
console.log(`
Foldgauge runs at ${services.address}
Mails it sends are kept at ${services.mails}

Sign in with the password ${demoSignIns.password} as
${demoSignIns.people.map(({ role, email }) => `  ${email.padEnd(widest)}  ${role}`).join('\n')}

Ctrl-C stops everything; the next start keeps what is there, and npm start -- --fresh begins anew.`)

for (const child of services.children) {
  child.once('exit', (code) => {
    if (interrupted) return
    console.error(`A part of Foldgauge ended unexpectedly (${code}); stopping the rest.`)
    void end(1)
  })
}
