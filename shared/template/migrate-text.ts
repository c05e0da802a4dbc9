import { formatNumber } from '../edition.ts'
import { valueTextAt } from './edit-text.ts'

/** One step from a format to the next: a text of the older format as one of the newer. Comments and layout stay. */
export interface MigrationStep {
  readonly from: number
  migrate(text: string): string
}

/** Every step there is, oldest first. Format 1 is the first, so there is none yet; format 2 adds a line here. */
export const migrationSteps: readonly MigrationStep[] = []

export type Migration =
  | { readonly outcome: 'current'; readonly format: number }
  | { readonly outcome: 'migrated'; readonly format: number; readonly text: string }
  | { readonly outcome: 'newer'; readonly format: number }
  | { readonly outcome: 'none' }

/** The format a text names behind `foldgauge:`; `null` where it names none, as sets inside a workspace do. */
export function formatOf(text: string): number | null {
  const value = valueTextAt(text, ['foldgauge'])
  return value !== null && /^\d+$/.test(value.trim()) ? Number(value) : null
}

/** Brings a text to a format, one step after the other, all in one go. @param target the format to reach */
export function migrateText(
  text: string,
  steps: readonly MigrationStep[] = migrationSteps,
  target = formatNumber,
): Migration {
  const format = formatOf(text)
  if (format === null) return { outcome: 'none' }
  if (format > target) return { outcome: 'newer', format }
  if (format === target) return { outcome: 'current', format }
  let current = text
  for (let at = format; at < target; at += 1) {
    const step = steps.find((candidate) => candidate.from === at)
    if (step === undefined) throw new RangeError(`there is no step from format ${String(at)}`)
    current = step.migrate(current)
  }
  return { outcome: 'migrated', format, text: current }
}
