import { spawn, type ChildProcess } from 'node:child_process'
import { createServer } from 'node:net'
import { fileURLToPath } from 'node:url'

const root = fileURLToPath(new URL('../../..', import.meta.url))

export const freePort = (): Promise<number> =>
  new Promise((fulfil) => {
    const probe = createServer()
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address()
      probe.close(() => fulfil(typeof address === 'object' && address !== null ? address.port : 0))
    })
  })

/** Starts `server/main.ts` in a process of its own and waits until it is ready. */
export function startProcess(words: readonly string[], env: Readonly<Record<string, string>>): Promise<ChildProcess> {
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/main.ts', ...words], {
    cwd: root,
    env: { ...process.env, ...env, AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true' },
    stdio: ['ignore', 'ignore', 'pipe', 'ipc'],
  })
  let said = ''
  child.stderr?.on('data', (chunk: Buffer) => (said += chunk.toString()))
  return new Promise((fulfil, reject) => {
    child.once('message', () => fulfil(child))
    child.once('exit', (code) => reject(new Error(`${words.join(' ')} ended with ${String(code)}: ${said}`)))
  })
}

/** Ends a process at once, as a power cut would, and waits for it. */
export const kill = (child: ChildProcess): Promise<void> =>
  new Promise((fulfil) => {
    if (child.exitCode !== null || child.signalCode !== null) {
      fulfil()
      return
    }
    child.removeAllListeners('exit')
    child.once('exit', () => fulfil())
    child.kill('SIGKILL')
  })
