import { sha256 } from '@noble/hashes/sha2.js'
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js'

/** A value as JSON with the keys of every object in order, so that order of writing changes nothing. */
export function canonicalJson(value: unknown): string {
  if (typeof value === 'string') return JSON.stringify(value)
  if (typeof value === 'number') return Number.isFinite(value) ? String(value) : 'null'
  if (typeof value === 'boolean') return value ? 'true' : 'false'
  if (value === null || typeof value !== 'object') return 'null'
  if (Array.isArray(value)) {
    let items = ''
    for (const item of value as readonly unknown[])
      items += items === '' ? canonicalJson(item) : `,${canonicalJson(item)}`
    return `[${items}]`
  }
  if (value instanceof Map)
    return canonicalObject([...(value as ReadonlyMap<string, unknown>).keys()], (key) =>
      (value as ReadonlyMap<string, unknown>).get(key),
    )
  return canonicalObject(Object.keys(value), (key) => (value as Readonly<Record<string, unknown>>)[key])
}

function canonicalObject(keys: string[], valueOf: (key: string) => unknown): string {
  let entries = ''
  for (const key of keys.sort()) {
    const item = valueOf(key)
    if (item === undefined) continue
    entries += `${entries === '' ? '' : ','}${JSON.stringify(key)}:${canonicalJson(item)}`
  }
  return `{${entries}}`
}

/** `sha256:` and the hexadecimal digest of a value's canonical JSON. */
export const digestOf = (value: unknown): string => `sha256:${bytesToHex(sha256(utf8ToBytes(canonicalJson(value))))}`
