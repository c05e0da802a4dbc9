import {
  chmodSync,
  lstatSync,
  mkdirSync,
  mkdtempSync,
  realpathSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs'
import { basename, dirname, join } from 'node:path'
import { UsageError } from '../io.ts'
import { reasonOf } from './io-reasons.ts'

interface Standing {
  /** The file there or behind a link. `null` for a pipe or a device, which is written into and never replaced. */
  readonly file: { readonly path: string; readonly mode: number } | null
}

/** What is there already; `null` where there is nothing. */
function standingAt(path: string): Standing | null {
  if (lstatSync(path, { throwIfNoEntry: false }) === undefined) return null
  const stats = statSync(path, { throwIfNoEntry: false })
  // Asked of the link itself, for the way to what it names may be no path at all.
  if (stats === undefined || !(stats.isFile() || stats.isDirectory())) return { file: null }
  return { file: { path: realpathSync(path), mode: stats.mode & 0o777 } }
}

/** Writes beside the place first and then into it, so that a reader finds the old content or the new one. */
function replace(path: string, content: string | Uint8Array, mode: number | null): void {
  const folder = dirname(path)
  mkdirSync(folder, { recursive: true })
  const aside = mkdtempSync(join(folder, `.${basename(path)}-`))
  try {
    const whole = join(aside, basename(path))
    writeFileSync(whole, content)
    if (mode !== null) chmodSync(whole, mode)
    renameSync(whole, path)
  } finally {
    rmSync(aside, { recursive: true, force: true })
  }
}

/**
 * Writes a file whole or not at all. A link is followed, permissions are kept; pipes and devices, such as `/dev/stdout`,
 * are written into.
 * @throws UsageError with the reason
 */
export function writeWhole(path: string, content: string | Uint8Array): void {
  try {
    const standing = standingAt(path)
    if (standing === null) replace(path, content, null)
    else if (standing.file === null) writeFileSync(path, content)
    else replace(standing.file.path, content, standing.file.mode)
  } catch (error) {
    throw new UsageError(`${path} was not written: ${reasonOf(error)}`, 'Nothing was changed.')
  }
}
