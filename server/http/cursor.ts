import { Refusal } from './refusal.ts'

type Key = string | number

/** A place in a list as one opaque word. */
export const writeCursor = (keys: readonly Key[]): string => Buffer.from(JSON.stringify(keys)).toString('base64url')

/** The place that a cursor names; null without one. @throws Refusal for one that is not ours */
export function readCursor<T extends readonly Key[]>(
  cursor: string | undefined,
  kinds: { readonly [I in keyof T]: 'string' | 'number' },
): T | null {
  if (cursor === undefined) return null
  try {
    const keys: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'))
    const isOurs =
      Array.isArray(keys) &&
      keys.length === kinds.length &&
      keys.every((key, index) => typeof key === (kinds as readonly string[])[index])
    if (isOurs) return keys as unknown as T
  } catch {
    // Not ours: answered below like any other.
  }
  throw new Refusal(422, 'bad-cursor', 'This cursor is none that a list here gave.', 'Begin with the first page.')
}

/** Cuts rows that were asked for with one more than the page holds into a page. */
export function pageOfRows<Row, Item>(
  rows: readonly Row[],
  limit: number,
  present: (row: Row) => Item,
  keysOf: (row: Row) => readonly Key[],
): { items: Item[]; next: string | null } {
  const shown = rows.slice(0, limit)
  const last = shown.at(-1)
  return {
    items: shown.map(present),
    next: rows.length > limit && last !== undefined ? writeCursor(keysOf(last)) : null,
  }
}
