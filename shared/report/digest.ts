import { sha256 } from '@noble/hashes/sha2.js'
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js'

/** A value as JSON with the keys of every object in order, so that order of writing changes nothing. */
export function canonicalJson(value: unknown): string {
  if (value instanceof Map) return canonicalJson(Object.fromEntries(value))
  if (Array.isArray(value)) return `[${value.map(canonicalJson).join(',')}]`
  if (value !== null && typeof value === 'object') {
    const entries = Object.entries(value).filter(([, item]) => item !== undefined)
    entries.sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0))
    return `{${entries.map(([key, item]) => `${JSON.stringify(key)}:${canonicalJson(item)}`).join(',')}}`
  }
  return JSON.stringify(value) ?? 'null'
}

/** `sha256:` and the hexadecimal digest of a value's canonical JSON. */
export const digestOf = (value: unknown): string => `sha256:${bytesToHex(sha256(utf8ToBytes(canonicalJson(value))))}`
