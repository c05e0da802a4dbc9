import * as z from 'zod/mini'
import { shapeBy, type KeyShapes, type MapSpec, type WrittenBy } from '../pieces/shape/map-spec.ts'
import type { Path, ReportProblem } from '../pieces/reading/report-problem.ts'
import { nearestName } from '../units/did-you-mean.ts'
import { isRawMap, nameOfValue, rawValueAt, type RawValue } from './raw-value.ts'

type Issue = z.core.$ZodIssue

const listed = (words: readonly string[]): string => words.map((word) => `“${word}”`).join(', ')

/** Shapes speak Markdown, for editors; problems speak plain text. */
const plainText = (markdown: string): string => markdown.replace(/`([^`]+)`/g, '“$1”')

/** Words for what is at a path: the whole thing, a key, or an entry of a list. */
function nameOfPlace(path: Path, whole: string, base: Path): string {
  const step = path[path.length - 1]
  if (step === undefined || path.length < base.length) return whole
  if (typeof step === 'string') return `“${step}”`
  const list = path.findLast((part) => typeof part === 'string')
  return list === undefined ? `entry ${String(step + 1)}` : `entry ${String(step + 1)} of “${list}”`
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1)

/** The branch of a choice that the author meant: one whose first mistake lies further in. */
function meantBranch(errors: readonly (readonly Issue[])[]): readonly Issue[] | null {
  const inner = errors.filter((issues) =>
    issues.every(
      (issue) =>
        issue.path.length > 0 ||
        issue.code === 'unrecognized_keys' ||
        issue.code === 'too_small' ||
        issue.code === 'too_big',
    ),
  )
  return inner.length === 1 ? (inner[0] ?? null) : null
}

/** Unknown keys of one map that are looked into. */
const mostUnknown = 60

/** Reports keys that a map has no place for, each with the nearest that it has. */
export function reportUnknownKeys(
  path: Path,
  keys: readonly string[],
  allowed: readonly string[],
  map: RawValue | undefined,
  where: string,
  report: ReportProblem,
): void {
  const unused = allowed.filter((key) => !isRawMap(map) || !Object.hasOwn(map, key))
  for (const key of keys.slice(0, mostUnknown)) {
    const nearest = nearestName(key, unused)
    report(
      [...path, key],
      'unknown-key',
      `“${key}” is no key of ${where}.`,
      nearest === null ? `Take it out; the keys are ${listed(allowed)}.` : `Did you mean “${nearest}”?`,
      'key',
    )
  }
}

/**
 * Holds data against a shape and says in plain words where it differs.
 * @param base path of the data in its file
 * @param whole what the data describes, as in "a card"
 * @returns the data as the shape has it; `null` where it differs
 */
export function checkShape<S extends z.core.$ZodType>(
  shape: S,
  data: RawValue,
  base: Path,
  whole: string,
  report: ReportProblem,
): z.output<S> | null {
  const result = z.safeParse(shape, data, { jitless: true })
  if (result.success) return result.data

  const explain = (issue: Issue, prefix: readonly PropertyKey[]): void => {
    const path = [...prefix, ...issue.path].map((step) => (typeof step === 'symbol' ? String(step) : step))
    const full = [...base, ...path]
    const value = rawValueAt(data, path)
    if (issue.code === 'unrecognized_keys') {
      reportUnknownKeys(full, issue.keys, issue.message.split(' '), value, nameOfPlace(full, whole, base), report)
      return
    }
    const subject = nameOfPlace(full, whole, base)
    const wanted = plainText(issue.message)
    if (value === undefined) {
      const owner = capital(nameOfPlace(full.slice(0, -1), whole, base))
      report(full, 'missing-key', `${owner} needs ${subject}.`, `Write ${subject} with ${wanted}.`, 'key')
      return
    }
    if (issue.code === 'invalid_union') {
      const meant = meantBranch(issue.errors)
      if (meant !== null) {
        for (const inner of meant) explain(inner, path)
        return
      }
    }
    if (value === null) {
      report(
        full,
        'empty-value',
        `Nothing is written after ${subject}.`,
        `Write ${wanted}, or take the key out.`,
        'key',
      )
      return
    }
    if (issue.code === 'invalid_value' && typeof value === 'string') {
      const words = issue.values.map(String)
      const nearest = nearestName(value, words)
      report(
        full,
        'unknown-word',
        `${capital(subject)} cannot be ${nameOfValue(value)}.`,
        nearest === null ? `Write ${wanted}.` : `Did you mean “${nearest}”? It takes ${wanted}.`,
        'value',
      )
      return
    }
    report(
      full,
      'wrong-type',
      `${capital(subject)} takes ${wanted}, not ${nameOfValue(value)}.`,
      `Write ${wanted}.`,
      'value',
    )
  }

  for (const issue of result.error.issues) explain(issue, [])
  return null
}

/** What a shape takes, in words. */
const wantedBy = (shape: z.core.$ZodType): string => {
  const result = z.safeParse(shape, undefined, { jitless: true })
  return result.success ? '' : (result.error.issues[0]?.message ?? '')
}

/**
 * Holds a map against its spec, key by key.
 * @returns what is written; `null` where it differs, which has been reported
 */
export function checkMap<M extends MapSpec<KeyShapes, KeyShapes>>(
  spec: M,
  data: RawValue,
  base: Path,
  whole: string,
  report: ReportProblem,
): WrittenBy<M> | null {
  const wanted = plainText(spec.what)
  if (data === null) {
    const name = String(base[base.length - 1] ?? '')
    report(base, 'empty-value', `Nothing is written after “${name}”.`, `Write ${wanted}, or take it out.`, 'key')
    return null
  }
  if (!isRawMap(data)) {
    report(
      base,
      'wrong-type',
      `${capital(whole)} is a map of keys and values, not ${nameOfValue(data)}.`,
      `Write ${wanted}.`,
      'value',
    )
    return null
  }
  let isSound = true
  const written: Record<string, unknown> = {}
  const unknown: string[] = []
  for (const [key, value] of Object.entries(data)) {
    const build = Object.hasOwn(spec.needed, key)
      ? spec.needed[key]
      : Object.hasOwn(spec.further, key)
        ? spec.further[key]
        : undefined
    if (build === undefined) {
      unknown.push(key)
      continue
    }
    const read = checkShape(shapeBy(build), value, [...base, key], whole, report)
    if (read === null) isSound = false
    else written[key] = read
  }
  for (const [key, build] of Object.entries(spec.needed)) {
    if (Object.hasOwn(data, key)) continue
    isSound = false
    report(
      [...base, key],
      'missing-key',
      `${capital(whole)} needs “${key}”.`,
      `Write “${key}” with ${plainText(wantedBy(shapeBy(build)))}.`,
      'key',
    )
  }
  reportUnknownKeys(base, unknown, [...Object.keys(spec.needed), ...Object.keys(spec.further)], data, whole, report)
  return isSound && unknown.length === 0 ? (written as WrittenBy<M>) : null
}
