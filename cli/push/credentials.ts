import { chmodSync, existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { UsageError, type Io } from '../io.ts'

/** What `login` keeps: a token for each server, and which server is meant where none is named. */
interface Credentials {
  readonly usual: string | null
  readonly servers: Readonly<Record<string, { readonly token: string }>>
}

const none: Credentials = { usual: null, servers: {} }

/** XDG: settings of a person, outside of any project. */
export function credentialFile(io: Io): string {
  const home = io.env['XDG_CONFIG_HOME'] ?? join(io.env['HOME'] ?? io.cwd, '.config')
  return join(home, 'foldgauge', 'credentials.json')
}

export function readCredentials(io: Io): Credentials {
  const file = credentialFile(io)
  if (!existsSync(file)) return none
  try {
    const read = JSON.parse(readFileSync(file, 'utf8')) as Partial<Credentials>
    return { usual: read.usual ?? null, servers: read.servers ?? {} }
  } catch {
    throw new UsageError(`${file} cannot be read`, 'Remove it and run foldgauge login again.')
  }
}

/** Keeps a token for a server, readable by its owner alone. @returns where */
export function keepToken(io: Io, server: string, token: string): string {
  const file = credentialFile(io)
  const before = readCredentials(io)
  mkdirSync(dirname(file), { recursive: true, mode: 0o700 })
  const next: Credentials = { usual: server, servers: { ...before.servers, [server]: { token } } }
  writeFileSync(file, `${JSON.stringify(next, null, 2)}\n`, { mode: 0o600 })
  // The mode above is for new files only.
  chmodSync(file, 0o600)
  return file
}

export interface Connection {
  readonly server: string
  readonly token: string
}

/** An address without a slash at its end. @throws UsageError for what is none */
export function readServer(text: string): string {
  try {
    const url = new URL(text)
    if (url.protocol === 'http:' || url.protocol === 'https:') return url.origin + url.pathname.replace(/\/+$/, '')
  } catch {
    // Told below like any other.
  }
  throw new UsageError(`“${text}” is not the address of a server`, 'Write it such as https://foldgauge.example.')
}

/** Server and token: `--server`, then FOLDGAUGE_SERVER, then the last login; the token from FOLDGAUGE_TOKEN or the login. */
export function findConnection(io: Io, given: string | undefined): Connection {
  const credentials = readCredentials(io)
  const named = given ?? io.env['FOLDGAUGE_SERVER'] ?? credentials.usual
  if (named === null || named === undefined)
    throw new UsageError('there is no server to talk to', 'Name it with --server, or run foldgauge login once.')
  const server = readServer(named)
  const token = io.env['FOLDGAUGE_TOKEN'] ?? credentials.servers[server]?.token
  if (token === undefined || token === '')
    throw new UsageError(
      `there is no token for ${server}`,
      'Set FOLDGAUGE_TOKEN, as pipelines do, or run foldgauge login.',
    )
  return { server, token }
}
