import { existsSync, lstatSync, mkdirSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { basename, join, relative, resolve } from 'node:path'
import { UsageError } from '../io.ts'
import { reasonOf } from './io-reasons.ts'

export interface NewFile {
  readonly name: string
  readonly content: string | Uint8Array
}

/** Refuses names that would leave the folder, and files that are there already unless they may be replaced. */
function checkTargets(folder: string, files: readonly NewFile[], isForced: boolean): void {
  const names = new Set<string>()
  for (const { name } of files) {
    const path = resolve(folder, name)
    if (name !== basename(name) || relative(folder, path).startsWith('..') || name.startsWith('.'))
      throw new UsageError(`“${name}” would leave the folder ${folder}`, 'Nothing was written.')
    if (names.has(name))
      throw new UsageError(
        `two exports would be called ${name}`,
        'Export them into folders of their own. Nothing was written.',
      )
    names.add(name)
    if (!existsSync(path)) continue
    if (lstatSync(path).isDirectory()) throw new UsageError(`${path} is a folder`, 'Nothing was written.')
    if (!isForced)
      throw new UsageError(
        `${path} is there already`,
        'Nothing was written. Use --force to replace it, or another --to.',
      )
  }
}

/**
 * Writes files whole and all of them or none: each beside its place first, moved there once all are written.
 * @throws UsageError with the reason; then nothing was changed
 */
export function writeAll(folder: string, files: readonly NewFile[], isForced: boolean): readonly string[] {
  checkTargets(folder, files, isForced)
  const parts: string[] = []
  let current = folder
  try {
    mkdirSync(folder, { recursive: true })
    for (const { name, content } of files) {
      const part = join(folder, `.${name}.part`)
      parts.push(part)
      current = join(folder, name)
      writeFileSync(part, content)
    }
  } catch (error) {
    for (const part of parts) rmSync(part, { force: true })
    throw new UsageError(`${current} was not written: ${reasonOf(error)}`, 'Nothing was written.')
  }
  files.forEach(({ name }, index) => {
    const part = parts[index]
    if (part !== undefined) renameSync(part, join(folder, name))
  })
  return files.map(({ name }) => join(folder, name))
}
