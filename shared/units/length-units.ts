import { nearestName } from './did-you-mean.ts'
import type { LengthUnit } from './units.ts'

/** Millimetres per unit, top over bottom: an inch is exactly 127/5 mm by definition, mil and pt its thousandth. */
export const millimetresPerUnit: Readonly<Record<LengthUnit, readonly [number, number]>> = {
  mm: [1, 1],
  cm: [10, 1],
  in: [127, 5],
  um: [1, 1000],
  mil: [127, 5000],
  pt: [127, 5000],
}

const unitByWord: ReadonlyMap<string, LengthUnit> = new Map([
  ['mm', 'mm'],
  ['cm', 'cm'],
  ['in', 'in'],
  ['"', 'in'],
  ['″', 'in'],
  ['”', 'in'],
  ['um', 'um'],
  // The micro sign and the Greek letter are different characters that look alike.
  ['\u00b5m', 'um'],
  ['\u03bcm', 'um'],
  ['mil', 'mil'],
  ['pt', 'pt'],
])

/** Words for the same units that the language does not take, and what to write for them. */
const meantByWord: ReadonlyMap<string, LengthUnit> = new Map([
  ['inch', 'in'],
  ['inches', 'in'],
  ['ins', 'in'],
  ['millimetre', 'mm'],
  ['millimetres', 'mm'],
  ['millimeter', 'mm'],
  ['millimeters', 'mm'],
  ['centimetre', 'cm'],
  ['centimetres', 'cm'],
  ['centimeter', 'cm'],
  ['centimeters', 'cm'],
  ['micron', 'um'],
  ['microns', 'um'],
  ['mils', 'mil'],
  ['thou', 'mil'],
  ['pts', 'pt'],
  ['point', 'pt'],
  ['points', 'pt'],
])

/** The unit a word names, `null` where it names none. */
export const unitNamed = (word: string): LengthUnit | null => unitByWord.get(word) ?? null

/** The unit that was probably meant by a word that names none. A metre is none: no near name is offered for it. */
export function unitMeant(word: string): LengthUnit | null {
  const lower = word.toLowerCase()
  if (lower === 'm') return null
  const near = nearestName(lower, Object.keys(millimetresPerUnit))
  return meantByWord.get(lower) ?? unitNamed(lower) ?? (near === null ? null : unitNamed(near))
}

/** Number and unit of a text such as `8 1/4 in`; the unit may be empty or no unit at all. */
export function splitUnit(text: string): { readonly number: string; readonly unit: string } {
  const match = /([a-zA-Z\u00b5\u03bc]+|["″”])$/u.exec(text)
  if (match === null) return { number: text, unit: '' }
  return { number: text.slice(0, match.index).trim(), unit: match[0] }
}

/** The unit a text ends with, if it names one. */
export const trailingUnit = (text: string): LengthUnit | null => unitNamed(splitUnit(text.trim()).unit)
