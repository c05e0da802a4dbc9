import { mkdirSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { basename, dirname, join } from 'node:path'
import { UsageError } from '../io.ts'

const reasons: Readonly<Record<string, string>> = {
  EACCES: 'you may not write there',
  EROFS: 'the folder is read-only',
  ENOSPC: 'the disk is full',
  EISDIR: 'there is a folder of that name',
  ENOTDIR: 'a part of the path is a file',
}

/** Writes a file whole or not at all: beside it first, then in its place. @throws UsageError with the reason */
export function writeWhole(path: string, content: string | Uint8Array): void {
  const folder = dirname(path)
  const beside = join(folder, `.${basename(path)}.part`)
  try {
    mkdirSync(folder, { recursive: true })
    writeFileSync(beside, content)
    renameSync(beside, path)
  } catch (error) {
    rmSync(beside, { force: true })
    const code = (error as NodeJS.ErrnoException).code ?? ''
    throw new UsageError(
      `${path} was not written: ${reasons[code] ?? (code || 'unknown reason')}`,
      'Nothing was changed.',
    )
  }
}
