import { nearestName } from '../../shared/units/did-you-mean.ts'
import { UsageError } from '../io.ts'
import type { Reporter } from './reporter.ts'

/** Every reporter; a new one is a file and a line here. */
const reporters: Readonly<Record<string, () => Promise<Reporter>>> = {
  text: async () => (await import('./text.ts')).textReporter,
  json: async () => (await import('./json.ts')).jsonReporter,
  junit: async () => (await import('./junit.ts')).junitReporter,
  sarif: async () => (await import('./sarif.ts')).sarifReporter,
  github: async () => (await import('./github.ts')).githubReporter,
  markdown: async () => (await import('./markdown.ts')).markdownReporter,
}

export const reporterNames: readonly string[] = Object.keys(reporters)

/** One `--report`: which, and the file it goes to; `null` for standard output. */
export interface ReporterRequest {
  readonly name: string
  readonly file: string | null
  load(): Promise<Reporter>
}

/** Reads `json` or `junit=results.xml`. @throws UsageError with the nearest name */
export function parseReporter(word: string): ReporterRequest {
  const at = word.indexOf('=')
  const name = at === -1 ? word : word.slice(0, at)
  const file = at === -1 ? null : word.slice(at + 1)
  const load = Object.hasOwn(reporters, name) ? reporters[name] : undefined
  if (load === undefined) {
    const near = nearestName(name, reporterNames)
    throw new UsageError(
      `there is no report “${name}”`,
      near === null ? `There are ${reporterNames.join(', ')}.` : `Did you mean ${near}?`,
    )
  }
  if (file === '') throw new UsageError(`--report ${word} names no file`, `Write --report ${name}=FILE.`)
  return { name, file, load }
}
