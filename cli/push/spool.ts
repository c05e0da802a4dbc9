import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import type { BodyInput } from '../../shared/api/endpoint.ts'
import type { pushEndpoints } from '../../shared/api/push-endpoints.ts'
import { writeWhole } from '../inputs/write-file.ts'
import type { Io } from '../io.ts'

export type PushBody = BodyInput<(typeof pushEndpoints)['push']>

/** A push that could not be sent, with where it was to go. Never a token. */
export interface Kept {
  readonly file: string
  readonly server: string
  readonly body: PushBody
}

/** XDG: state of a person that outlives a run. */
function spoolFolder(io: Io): string {
  const home = io.env['XDG_STATE_HOME'] ?? join(io.env['HOME'] ?? io.cwd, '.local', 'state')
  return join(home, 'foldgauge', 'spool')
}

/** Keeps a push for `push --resume`. The same one is kept once. @returns where */
export function keepPush(io: Io, server: string, body: PushBody): string {
  const folder = spoolFolder(io)
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  const text = JSON.stringify({ server, body })
  const file = join(folder, `${createHash('sha256').update(text).digest('hex').slice(0, 24)}.json`)
  if (!existsSync(file)) writeWhole(file, text)
  return file
}

/** Pushes that wait for a server. Files that are none are left alone. */
export function keptPushes(io: Io, server: string): readonly Kept[] {
  const folder = spoolFolder(io)
  if (!existsSync(folder)) return []
  return readdirSync(folder)
    .filter((name) => name.endsWith('.json'))
    .toSorted()
    .flatMap((name): Kept[] => {
      const file = join(folder, name)
      try {
        const kept = JSON.parse(readFileSync(file, 'utf8')) as Omit<Kept, 'file'>
        return kept.server === server ? [{ ...kept, file }] : []
      } catch {
        return []
      }
    })
}

export const forgetPush = ({ file }: Kept): void => {
  rmSync(file, { force: true })
}
