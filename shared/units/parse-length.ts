import { nearestName } from './did-you-mean.ts'
import type { Length, LengthUnit, Millimetres, Reading } from './units.ts'

export interface ParseOptions {
  /** Negative lengths make sense in clearance ranges only. */
  readonly allowNegative?: boolean
  readonly allowZero?: boolean
}

/** Millimetres per unit as a fraction: an inch is exactly 127/5 mm. */
const perUnit: Readonly<Record<LengthUnit, readonly [bigint, bigint]>> = {
  mm: [1n, 1n],
  cm: [10n, 1n],
  in: [127n, 5n],
  um: [1n, 1000n],
  mil: [127n, 5000n],
  pt: [127n, 5000n],
}

const unitNames: Readonly<Record<string, LengthUnit>> = {
  mm: 'mm',
  cm: 'cm',
  in: 'in',
  '"': 'in',
  '″': 'in',
  '”': 'in',
  um: 'um',
  µm: 'um',
  μm: 'um',
  mil: 'mil',
  pt: 'pt',
}

const vulgar: Readonly<Record<string, readonly [bigint, bigint]>> = {
  '¼': [1n, 4n],
  '½': [1n, 2n],
  '¾': [3n, 4n],
  '⅓': [1n, 3n],
  '⅔': [2n, 3n],
  '⅕': [1n, 5n],
  '⅖': [2n, 5n],
  '⅗': [3n, 5n],
  '⅘': [4n, 5n],
  '⅙': [1n, 6n],
  '⅚': [5n, 6n],
  '⅐': [1n, 7n],
  '⅛': [1n, 8n],
  '⅜': [3n, 8n],
  '⅝': [5n, 8n],
  '⅞': [7n, 8n],
  '⅑': [1n, 9n],
  '⅒': [1n, 10n],
}
const vulgarClass = `[${Object.keys(vulgar).join('')}]`

const longest: Millimetres = 10_000

type Failure = Extract<Reading<never>, { ok: false }>
const refuse = (code: string, fact: string, remedy: string): Failure => ({ ok: false, code, fact, remedy })

type Fraction = readonly [bigint, bigint]

const digits = (text: string): bigint => BigInt(text)

/** Integer, decimal, fraction or mixed number as an exact fraction; `null` where it is none of these. */
function exactNumber(text: string): Fraction | null {
  const decimal = /^(\d+)?(?:\.(\d+))?$/.exec(text)
  if (decimal !== null && text !== '') {
    const [, whole = '0', places = ''] = decimal
    return [digits(`${whole}${places}`), 10n ** BigInt(places.length)]
  }
  const mixed = /^(?:(\d+)(?:\s+|-))?(\d+)\s*\/\s*(\d+)$/.exec(text)
  if (mixed !== null) {
    const [, whole = '0', top = '0', bottom = '1'] = mixed
    return [digits(whole) * digits(bottom) + digits(top), digits(bottom)]
  }
  const glyph = new RegExp(`^(\\d+)?[\\s-]?(${vulgarClass})$`).exec(text)
  const part = vulgar[glyph?.[2] ?? '']
  if (glyph !== null && part !== undefined) return [digits(glyph[1] ?? '0') * part[1] + part[0], part[1]]
  return null
}

/** The double nearest to a fraction: scaled so that the integer quotient carries more bits than a double keeps. */
function nearestDouble([top, bottom]: Fraction): number {
  const direct = Number(top) / Number(bottom)
  if (top < 2n ** 53n && bottom < 2n ** 53n) return direct
  const scale = 10n ** 20n
  return Number((top * scale) / bottom) / 1e20
}

/** What is wrong with a number that could not be read, in the author's words. */
function numberFailure(text: string): Failure {
  if (/^\d+,\d+$/.test(text))
    return refuse('length-decimal-comma', `“${text}” has a decimal comma`, `write a dot: ${text.replace(',', '.')}`)
  if (/^0x[0-9a-f]+$/i.test(text))
    return refuse(
      'length-hexadecimal',
      `“${text}” is a hexadecimal number`,
      `write it in ordinary digits: ${String(Number.parseInt(text, 16))}`,
    )
  if (/^0o[0-7]+$/i.test(text))
    return refuse(
      'length-octal',
      `“${text}” is an octal number`,
      `write it in ordinary digits: ${String(Number.parseInt(text.slice(2), 8))}`,
    )
  if (/^[\d.]+e[+-]?\d+$/i.test(text))
    return refuse('length-exponent', `“${text}” has an exponent`, `write it out: ${String(Number(text))}`)
  if (/\/\s*$|^\s*\/|\d\s*-\s*$/.test(text))
    return refuse('length-missing-operand', `“${text}” lacks a part of its fraction`, 'write both numbers, such as 3/4')
  return refuse(
    'length-not-understood',
    `“${text}” is not a length`,
    'write a number with a unit, such as 148 mm, 8 1/4 in or 0.32 mm',
  )
}

/** Number and unit of a text such as `8 1/4 in`; the unit may be missing. */
function split(text: string): { readonly number: string; readonly unit: string } {
  const match = /^(.*?)\s*([a-zA-Zµμ]+|["″”])?$/su.exec(text)
  const number = match?.[1] ?? text
  const unit = match?.[2] ?? ''
  // 1e3 and 0x1f end in letters or digits that are no unit.
  if (/^\d+e$/i.test(`${number}${unit}`) || /^0[xo]/i.test(text)) return { number: text, unit: '' }
  return { number: number.trim(), unit }
}

const plain = /^(\d+(?:\.\d+)?)(?:\s*(mm|in|cm))?$/

/**
 * Reads a length as its author wrote it.
 * @param defaultUnit unit where none is written
 * @returns millimetres, correctly rounded from the exact fraction; or the fact and what to write instead
 */
export function parseLength(source: string, defaultUnit: LengthUnit, options: ParseOptions = {}): Reading<Length> {
  const text = source.trim()
  const quick = plain.exec(text)
  if (quick !== null && !/^0\d/.test(text)) {
    const unit = (quick[2] ?? defaultUnit) as LengthUnit
    if (unit === 'mm') return bounded({ mm: Number(quick[1]), unit, text }, options)
  }
  if (text === '') return refuse('length-empty', 'there is no length', 'write a number with a unit, such as 148 mm')
  const isNegative = /^[-−]/.test(text)
  const { number, unit: unitText } = split(isNegative ? text.slice(1).trim() : text.replace(/^\+/, ''))
  const unit = unitText === '' ? defaultUnit : unitNames[unitText]
  if (unit === undefined) {
    const near = nearestName(unitText.toLowerCase(), Object.keys(unitNames))
    return refuse(
      'length-unknown-unit',
      `“${unitText}” is not a unit`,
      near === null ? 'units are mm, cm, in, and for thickness um, mil, pt' : `did you mean ${near}?`,
    )
  }
  if (number === '')
    return refuse('length-missing-operand', `“${text}” has no number`, `write one before the unit, such as 12 ${unit}`)
  if (/^0\d/.test(number))
    return refuse(
      'length-octal',
      `“${text}” begins with a nought, which some programs read as octal`,
      `write ${number.replace(/^0+(?=\d)/, '')}`,
    )
  const exact = exactNumber(number)
  if (exact === null) return numberFailure(number)
  if (exact[1] === 0n)
    return refuse('length-zero-denominator', `“${text}” divides by nought`, 'write a fraction such as 3/4')
  const [top, bottom] = perUnit[unit]
  const mm = nearestDouble([exact[0] * top, exact[1] * bottom])
  return bounded({ mm: isNegative ? -mm : mm, unit, text }, options)
}

function bounded(length: Length, options: ParseOptions): Reading<Length> {
  if (length.mm < 0 && options.allowNegative !== true)
    return refuse(
      'length-negative',
      `“${length.text}” is negative`,
      'only a clearance may be; write the length without the sign',
    )
  if (length.mm === 0 && options.allowZero !== true)
    return refuse('length-zero', `“${length.text}” is nothing`, 'write a length larger than nought')
  if (Math.abs(length.mm) > longest)
    return refuse(
      'length-too-long',
      `“${length.text}” is more than 10 m`,
      'check the unit; templates are made of sheets a hand can turn',
    )
  return { ok: true, value: length }
}

/** The unit a text ends with, if it names one. */
export function trailingUnit(text: string): LengthUnit | null {
  const { unit } = split(text.trim())
  return unitNames[unit] ?? null
}
