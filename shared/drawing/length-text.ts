import { formatLength, formatMark, millimetresPerInch } from '../units/format-length.ts'
import type { Millimetres, RulerUnit } from '../units/units.ts'

/** Finest fraction of an inch that is written on a page. */
const thirtySecond = millimetresPerInch / 32

/** Beyond this a fraction of an inch is only near the length, and a tilde says so. */
const worthSaying: Millimetres = 0.1

/** A measure as makers read it, without its unit: millimetres to a tenth, or inches to the nearest thirty-second. */
export function bareLength(length: Millimetres, units: RulerUnit): string {
  if (units === 'mm') return formatLength(length, 'mm', { decimals: 1, bare: true })
  const mark = formatMark(length, thirtySecond, 'in')
  return `${Math.abs(mark.error) > worthSaying ? '~' : ''}${mark.text.replace(/ in$/, '')}`
}

export const lengthText = (length: Millimetres, units: RulerUnit): string => `${bareLength(length, units)} ${units}`

/** Two lengths as a size, the unit once. */
export const sizeText = (length: Millimetres, width: Millimetres, units: RulerUnit): string =>
  `${bareLength(length, units)} × ${bareLength(width, units)} ${units}`
