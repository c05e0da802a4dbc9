import { sameLength } from './epsilon.ts'
import { roundToGrid } from './grid.ts'
import type { Millimetres, Range, RulerUnit } from './units.ts'

export const millimetresPerInch = 25.4

/** The finest fraction of an inch that is written as one; what lies between is a decimal. Common practice on rulers. */
const finest = 64

export interface FormatOptions {
  /** Most decimals of a metric or decimal text; trailing zeros are dropped. */
  readonly decimals?: number
  /** Leave the unit out. */
  readonly bare?: boolean
}

const greatestCommonDivisor = (a: number, b: number): number => (b === 0 ? a : greatestCommonDivisor(b, a % b))

const decimalText = (value: number, decimals: number): string => {
  if (Number.isInteger(value) && value !== 0) return String(value)
  const text = String(Number(value.toFixed(decimals)))
  return text === '-0' ? '0' : text
}

/** A whole number of `denominator`ths as a mixed fraction in lowest terms: `5 7/8`. */
function mixedFraction(count: number, denominator: number): string {
  const sign = count < 0 ? '-' : ''
  const all = Math.abs(count)
  const whole = Math.floor(all / denominator)
  const rest = all % denominator
  if (rest === 0) return `${sign}${String(whole)}`
  const divisor = greatestCommonDivisor(rest, denominator)
  const fraction = `${String(rest / divisor)}/${String(denominator / divisor)}`
  return whole === 0 ? `${sign}${fraction}` : `${sign}${String(whole)} ${fraction}`
}

/** A number of millimetres in a unit: metric with just enough decimals, inches as a fraction where they are one. */
export function formatLength(mm: Millimetres, unit: RulerUnit, options: FormatOptions = {}): string {
  const suffix = options.bare === true ? '' : ` ${unit}`
  if (unit === 'mm') return `${decimalText(mm, options.decimals ?? 2)}${suffix}`
  const inches = mm / millimetresPerInch
  const count = Math.round(inches * finest)
  if (Math.abs(count / finest - inches) * millimetresPerInch < sameLength)
    return `${mixedFraction(count, finest)}${suffix}`
  return `${decimalText(inches, options.decimals ?? 3)}${suffix}`
}

/** The mark nearest to a length and how far it is off, signed: mark minus length. */
export interface Mark {
  readonly text: string
  readonly mm: Millimetres
  readonly error: Millimetres
}

/** The ruler mark nearest to a length, halves up, as makers read it. @see physics K (derived) */
export function formatMark(mm: Millimetres, grid: Millimetres, unit: RulerUnit): Mark {
  const marked = roundToGrid(mm, grid)
  return { text: formatLength(marked, unit, { decimals: 3 }), mm: marked, error: marked - mm }
}

/** `0.2..3 mm`, `0.4.. mm`, `..3 mm`. */
export function formatRange(range: Range, unit: RulerUnit): string {
  const end = (value: Millimetres | null): string =>
    value === null ? '' : formatLength(value, unit, { bare: true, decimals: 3 })
  return `${end(range.min)}..${end(range.max)} ${unit}`
}

/** `105 x 148 mm`. */
export function formatSize(sizes: readonly Millimetres[], unit: RulerUnit): string {
  return `${sizes.map((size) => formatLength(size, unit, { bare: true, decimals: 3 })).join(' x ')} ${unit}`
}
