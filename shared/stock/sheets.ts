import type { NamedSize } from '../template/template-model.ts'

/** Millimetres of whole and half inches, exact: 127 fifths each. */
const inches = (length: number, width: number): NamedSize => ({ length: (length * 127) / 5, width: (width * 127) / 5 })

/** Sheets by the names they are sold under. ISO 216 sizes (secondary source); US sheets published; 12 x 12 in trade custom. */
const sheets: Readonly<Record<string, NamedSize>> = {
  a2: { length: 594, width: 420 },
  a3: { length: 420, width: 297 },
  a4: { length: 297, width: 210 },
  a5: { length: 210, width: 148 },
  letter: inches(11, 8.5),
  legal: inches(14, 8.5),
  tabloid: inches(17, 11),
  '12x12in': inches(12, 12),
}

export const sheetNames: readonly string[] = Object.keys(sheets)

/** A sheet by name, length the larger; `null` for a name that is none. */
export const sheetByName = (name: string): NamedSize | null =>
  Object.hasOwn(sheets, name) ? (sheets[name] ?? null) : null
