import { millimetresPerUnit, splitUnit, unitMeant, unitNamed } from './length-units.ts'
import { multiplied, nearestDouble, rational } from './rational.ts'
import { notUnderstood, numberFailure, otherNotation, readNumber } from './read-number.ts'
import { longestMeasure, quoted, refuse } from './refuse.ts'
import type { Length, LengthUnit, Millimetres, Reading } from './units.ts'

export interface ParseOptions {
  /** Negative lengths make sense in clearance ranges only. */
  readonly allowNegative?: boolean
  readonly allowZero?: boolean
}

const longest: Millimetres = 10_000

/** Integers and decimals, which nearly all lengths are: their digits are read without exact fractions. */
const plain = /^(\d+)(?:\.(\d+))?(?:\s*(mm|cm|in|um|mil|pt))?$/

/** With no more digits than this, digits × 127 and every power of ten needed are doubles exactly. */
const mostPlainDigits = 13
const powersOfTen = [1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13] as const

/** Reads a plain number: one division of two exact doubles, so correctly rounded; `null` where it is not plain. */
function readPlain(text: string, defaultUnit: LengthUnit): Length | null {
  const match = plain.exec(text)
  if (match === null) return null
  const [, whole = '', places = ''] = match
  const scale = powersOfTen[places.length]
  if ((whole.length > 1 && whole.startsWith('0')) || scale === undefined) return null
  if (whole.length + places.length > mostPlainDigits) return null
  const unit = (match[3] ?? defaultUnit) as LengthUnit
  const [top, bottom] = millimetresPerUnit[unit]
  return { mm: (Number(`${whole}${places}`) * top) / (scale * bottom), unit, text }
}

/**
 * Reads a length as its author wrote it: integer, decimal, fraction or mixed number, with or without a unit.
 * @param defaultUnit unit where none is written
 * @returns millimetres, correctly rounded from the exact fraction; or the fact and what to write instead
 */
export function parseLength(source: string, defaultUnit: LengthUnit, options: ParseOptions = {}): Reading<Length> {
  const text = source.trim()
  const quick = readPlain(text, defaultUnit)
  return quick === null ? readExactly(text, defaultUnit, options) : withinBounds(quick, options)
}

function readExactly(text: string, defaultUnit: LengthUnit, options: ParseOptions): Reading<Length> {
  if (text === '') return refuse('length-empty', 'there is no length', 'write a number with a unit, such as 148 mm')
  if (text.length > longestMeasure) return notUnderstood(text)
  const isNegative = /^[-−]/.test(text)
  const unsigned = text.replace(/^[-−+]\s*/, '')
  const other = otherNotation(unsigned)
  if (other !== null) return other
  const { number, unit: word } = splitUnit(unsigned)
  const unit = word === '' ? defaultUnit : unitNamed(word)
  if (unit === null) return /\d/.test(number) || readNumber(number) !== null ? unknownUnit(word) : notUnderstood(text)
  if (number === '')
    return refuse(
      'length-missing-operand',
      `${quoted(text)} has no number`,
      `write one before the unit, such as 12 ${unit}`,
    )
  if (/^0\d/.test(number))
    return refuse(
      'length-octal',
      `${quoted(text)} begins with a nought, which some programs read as octal`,
      `write ${number.replace(/^0+(?=\d)/, '')}`,
    )
  const exact = readNumber(number)
  if (exact === null) return numberFailure(number, text)
  if (exact.bottom === 0n)
    return refuse('length-zero-denominator', `${quoted(text)} divides by nought`, 'write a fraction such as 3/4')
  const [top, bottom] = millimetresPerUnit[unit]
  const mm = nearestDouble(multiplied(exact, rational(BigInt(top), BigInt(bottom))))
  return withinBounds({ mm: isNegative && mm !== 0 ? -mm : mm, unit, text }, options)
}

function unknownUnit(word: string): Reading<never> {
  const meant = unitMeant(word)
  return refuse(
    'length-unknown-unit',
    `${quoted(word)} is not a unit`,
    meant === null ? 'units are mm, cm, in, and for thickness um, mil, pt' : `did you mean ${meant}?`,
  )
}

function withinBounds(length: Length, options: ParseOptions): Reading<Length> {
  if (length.mm < 0 && options.allowNegative !== true)
    return refuse(
      'length-negative',
      `${quoted(length.text)} is negative`,
      'only a clearance may be; write the length without the sign',
    )
  if (length.mm === 0 && options.allowZero !== true)
    return refuse('length-zero', `${quoted(length.text)} is nothing`, 'write a length larger than nought')
  if (Math.abs(length.mm) > longest)
    return refuse(
      'length-too-long',
      `${quoted(length.text)} is more than 10 m`,
      'check the unit; templates are made of sheets a hand can turn',
    )
  return { ok: true, value: length }
}
