import type { Path } from '../pieces/reading/report-problem.ts'

/** Entries of a map in the order of the file; it has no prototype, so that no name is special. */
export interface RawMap {
  readonly [key: string]: RawValue
}

/**
 * What a file says, before it is understood. Numbers stay the text they were written as, so that lengths are read from
 * the source; an empty value is `null`.
 */
export type RawValue = string | boolean | null | readonly RawValue[] | RawMap

export const isRawMap = (value: RawValue | undefined): value is RawMap =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

export const isRawList = (value: RawValue | undefined): value is readonly RawValue[] => Array.isArray(value)

/** The value at a path; `undefined` where nothing is written. */
export function rawValueAt(root: RawValue, path: Path): RawValue | undefined {
  let value: RawValue | undefined = root
  for (const step of path) {
    if (isRawList(value)) value = typeof step === 'number' ? value[step] : undefined
    else if (isRawMap(value)) value = Object.hasOwn(value, String(step)) ? value[String(step)] : undefined
    else return undefined
  }
  return value
}

/** What a value is, in a reader's words. */
export function nameOfValue(value: RawValue): string {
  if (value === null) return 'nothing'
  if (typeof value === 'boolean') return `“${String(value)}”`
  if (typeof value === 'string') return `“${value.length > 40 ? `${value.slice(0, 39)}…` : value}”`
  return Array.isArray(value) ? 'a list' : 'a map'
}
