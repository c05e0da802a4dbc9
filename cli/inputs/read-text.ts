import { readFileSync } from 'node:fs'
import { UsageError } from '../io.ts'

const remedies: Readonly<Record<string, string>> = {
  EACCES: 'Give yourself permission to read it.',
  EISDIR: 'There must be a file here, not a folder.',
}

/** The text of a file. @param shown how the file is called in a message @throws UsageError with the reason */
export function readText(path: string, shown: string): string {
  try {
    return readFileSync(path, 'utf8')
  } catch (error) {
    const { code = 'unknown reason' } = error as NodeJS.ErrnoException
    throw new UsageError(`${shown} cannot be read (${code})`, remedies[code] ?? null)
  }
}
