import type * as z from 'zod/mini'
import type { ReportProblem } from '../pieces/reading/report-problem.ts'
import { shapeBy, type KeyShapes } from '../pieces/shape/map-spec.ts'
import { checkShape, reportUnknownKeys } from './check-shape.ts'
import { isRawMap, nameOfValue, type RawMap, type RawValue } from './raw-value.ts'
import { checkName } from './read-names.ts'

type Frame<T extends KeyShapes> = { readonly [K in keyof T]?: z.output<ReturnType<T[K]>> }

/**
 * Reads the outermost keys of a file, each by itself, so that a mistake in one hides none in another; shapes are built
 * for the keys that are written only.
 * @param groups further keys, which are read elsewhere
 */
export function readFrame<T extends KeyShapes>(
  data: RawMap,
  keys: T,
  groups: readonly string[],
  whole: string,
  report: ReportProblem,
): Frame<T> {
  const frame: Record<string, unknown> = {}
  const unknown: string[] = []
  for (const [key, value] of Object.entries(data)) {
    const shape = Object.hasOwn(keys, key) ? keys[key] : undefined
    if (shape !== undefined) {
      const read = checkShape(shapeBy(shape), value, [key], whole, report)
      if (read !== null) frame[key] = read
    } else if (!groups.includes(key)) unknown.push(key)
  }
  reportUnknownKeys([], unknown, [...Object.keys(keys), ...groups], data, whole, report)
  return frame as Frame<T>
}

/** Entries of a map of names, with the names checked; empty where the key is not written. */
export function readGroup(
  data: RawMap,
  group: string,
  nouns: string,
  report: ReportProblem,
): readonly (readonly [string, RawValue])[] {
  if (!Object.hasOwn(data, group)) return []
  const value = data[group]
  if (value === undefined || value === null) {
    report(
      [group],
      'empty-value',
      `Nothing is written below “${group}”.`,
      `Write names and ${nouns}, or take the key out.`,
      'key',
    )
    return []
  }
  if (!isRawMap(value)) {
    report(
      [group],
      'wrong-type',
      `“${group}” takes a map of names and ${nouns}, not ${nameOfValue(value)}.`,
      'Write each as a name, a colon and what it is.',
      'value',
    )
    return []
  }
  return Object.entries(value)
}

/** The same, without the entries whose names are none. */
export function readNamedGroup(
  data: RawMap,
  group: string,
  nouns: string,
  report: ReportProblem,
): readonly (readonly [string, RawValue])[] {
  return readGroup(data, group, nouns, report).filter(([name]) => checkName(name, [group, name], 'key', report))
}
