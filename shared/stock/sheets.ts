import type { NamedSize } from '../template/template-model.ts'
import { inchesToMillimetres } from '../units/inches.ts'
import { isoSize } from './iso-series.ts'

const inches = (length: number, width: number): NamedSize => ({
  length: inchesToMillimetres(length),
  width: inchesToMillimetres(width),
})

/** Sheets of no series. Letter, legal and tabloid: published tables of US sheets; 12 x 12 in: trade custom, from memory. */
const american: Readonly<Record<string, NamedSize>> = {
  letter: inches(11, 8.5),
  legal: inches(14, 8.5),
  tabloid: inches(17, 11),
  '12x12in': inches(12, 12),
}

/** Names of the sheets blanks are cut from, as they are sold. */
export const sheetNames: readonly string[] = ['a0', 'a1', 'a2', 'a3', 'a4', 'a5', 'a6', ...Object.keys(american)]

/** A sheet by name, in millimetres, length the larger; `null` for a name that is none. */
export function sheetByName(name: string): NamedSize | null {
  if (/^a[0-6]$/.test(name)) return isoSize('a', Number(name.slice(1)))
  return Object.hasOwn(american, name) ? (american[name] ?? null) : null
}
