import { sha256 } from '@noble/hashes/sha2.js'
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js'

/** Text that stands in JSON as it is. */
const isPlain = /^[ !#-[\]-\ud7ff\ue000-\uffff]*$/

const quoted = (text: string): string => (isPlain.test(text) ? `"${text}"` : JSON.stringify(text))

/** Sorts a few keys where they stand, by code unit as `sort` does; objects here have few. */
function inOrder(keys: string[]): readonly string[] {
  if (keys.length > 24) return keys.sort()
  for (let end = 1; end < keys.length; end += 1) {
    const key = keys[end] ?? ''
    let at = end
    for (let before = keys[at - 1]; at > 0 && before !== undefined && before > key; before = keys[at - 1]) {
      keys[at] = before
      at -= 1
    }
    keys[at] = key
  }
  return keys
}

/** A value as JSON with the keys of every object in order, so that order of writing changes nothing. */
export function canonicalJson(value: unknown): string {
  if (typeof value === 'string') return quoted(value)
  if (typeof value === 'number') return Number.isFinite(value) ? String(value) : 'null'
  if (typeof value === 'boolean') return value ? 'true' : 'false'
  if (value === null || typeof value !== 'object') return 'null'
  if (Array.isArray(value)) {
    let items = ''
    for (const item of value as readonly unknown[])
      items += items === '' ? canonicalJson(item) : `,${canonicalJson(item)}`
    return `[${items}]`
  }
  return value instanceof Map
    ? canonicalMap(value as ReadonlyMap<string, unknown>)
    : canonicalObject(value as Readonly<Record<string, unknown>>)
}

const entry = (key: string, item: unknown, isFirst: boolean): string =>
  `${isFirst ? '' : ','}${quoted(key)}:${canonicalJson(item)}`

function canonicalMap(map: ReadonlyMap<string, unknown>): string {
  let entries = ''
  for (const key of inOrder([...map.keys()])) {
    const item = map.get(key)
    if (item !== undefined) entries += entry(key, item, entries === '')
  }
  return `{${entries}}`
}

function canonicalObject(object: Readonly<Record<string, unknown>>): string {
  let entries = ''
  for (const key of inOrder(Object.keys(object))) {
    const item = object[key]
    if (item !== undefined) entries += entry(key, item, entries === '')
  }
  return `{${entries}}`
}

/** `sha256:` and the hexadecimal digest of a value's canonical JSON. */
export const digestOf = (value: unknown): string => `sha256:${bytesToHex(sha256(utf8ToBytes(canonicalJson(value))))}`
