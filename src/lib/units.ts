import { formatLength, formatMark, millimetresPerInch } from '../../shared/units/format-length.ts'
import type { RulerUnit } from '../../shared/units/units.ts'
import { unitWords } from '../words/unit-words.ts'
import { store, useStored } from './stored.ts'

const key = 'foldgauge-units'

/** Units the reader has chosen for every figure. */
export const useUnits = (): RulerUnit => (useStored(key) === 'in' ? 'in' : 'mm')

export const chooseUnits = (units: RulerUnit): void => store(key, units)

/** A computed length: hundredths of a millimetre, thousandths of an inch. */
export const lengthIn = (mm: number, units: RulerUnit): string =>
  (units === 'mm' ? formatLength(mm, 'mm', { decimals: 2 }) : `${(mm / millimetresPerInch).toFixed(3)} in`).replace(
    '-',
    '−',
  )

/** The same without its unit. */
export const bareIn = (mm: number, units: RulerUnit): string => lengthIn(mm, units).replace(/ (mm|in)$/, '')

/** A length that somebody marks, on the mark nearest to it. */
export const markIn = (mm: number, units: RulerUnit): string =>
  units === 'mm' ? formatLength(mm, 'mm', { decimals: 2 }) : formatMark(mm, millimetresPerInch / 32, 'in').text

/** A length with its sign: `+0.5 mm`. */
export const signedIn = (mm: number, units: RulerUnit): string =>
  `${mm > 0 ? '+' : mm < 0 ? '−' : ''}${lengthIn(Math.abs(mm), units)}`

/** A band of lengths in words: `0.2 to 3 mm`, `10 mm or more`. */
export function bandIn(band: { readonly min: number | null; readonly max: number | null }, units: RulerUnit): string {
  if (band.min === null) return band.max === null ? unitWords.any : unitWords.upTo(lengthIn(band.max, units))
  if (band.max === null) return unitWords.from(lengthIn(band.min, units))
  return unitWords.between(bareIn(band.min, units), lengthIn(band.max, units))
}

/** What somebody typed in the chosen units as millimetres; null where it is no length. Fractions and either decimal mark. */
export function readLength(text: string, units: RulerUnit): number | null {
  const trimmed = text.trim().replace(',', '.')
  const mixed = /^(?:(\d+)[ -])?(\d+)\/(\d+)$/.exec(trimmed)
  const value =
    mixed === null
      ? /^\d*\.?\d+$|^\d+\.$/.test(trimmed)
        ? Number(trimmed)
        : Number.NaN
      : Number(mixed[1] ?? 0) + Number(mixed[2]) / Number(mixed[3])
  if (!Number.isFinite(value)) return null
  return units === 'mm' ? value : value * millimetresPerInch
}
