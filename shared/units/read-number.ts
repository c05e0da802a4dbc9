import { mixed, rational, type Rational } from './rational.ts'
import { quoted, refuse, type Failure } from './refuse.ts'

const vulgarFractions: ReadonlyMap<string, Rational> = new Map(
  (
    [
      ['¼', 1n, 4n],
      ['½', 1n, 2n],
      ['¾', 3n, 4n],
      ['⅐', 1n, 7n],
      ['⅑', 1n, 9n],
      ['⅒', 1n, 10n],
      ['⅓', 1n, 3n],
      ['⅔', 2n, 3n],
      ['⅕', 1n, 5n],
      ['⅖', 2n, 5n],
      ['⅗', 3n, 5n],
      ['⅘', 4n, 5n],
      ['⅙', 1n, 6n],
      ['⅚', 5n, 6n],
      ['⅛', 1n, 8n],
      ['⅜', 3n, 8n],
      ['⅝', 5n, 8n],
      ['⅞', 7n, 8n],
    ] as const
  ).map(([glyph, top, bottom]) => [glyph, rational(top, bottom)]),
)

/** Integer, decimal, fraction or mixed number, without a sign, as an exact fraction; `null` where it is none of these. */
export function readNumber(text: string): Rational | null {
  const decimal = /^(\d*)(?:\.(\d+))?$/.exec(text)
  if (decimal !== null && text !== '') {
    const [, whole = '', places = ''] = decimal
    return rational(BigInt(`${whole}${places}`), 10n ** BigInt(places.length))
  }
  // The fraction slash is what some keyboards and word processors write between two numbers.
  const fraction = /^(?:(\d+)(?:\s+|-))?(\d+)\s*[/\u2044]\s*(\d+)$/.exec(text)
  if (fraction !== null) {
    const [, whole = '0', top = '0', bottom = '1'] = fraction
    return mixed(BigInt(whole), rational(BigInt(top), BigInt(bottom)))
  }
  const part = vulgarFractions.get(text.slice(-1))
  const whole = /^(?:(\d+)(?:\s*|-))?$/.exec(text.slice(0, -1))
  return part === undefined || whole === null ? null : mixed(BigInt(whole[1] ?? '0'), part)
}

/** Numbers of other notations, whose letters would pass for a unit; `null` for all others. */
export function otherNotation(text: string): Failure | null {
  const inDigits = (value: number): string =>
    Number.isFinite(value) ? `write it in ordinary digits: ${String(value)}` : 'write it in ordinary digits'
  const hexadecimal = /^0x([0-9a-f]*)/i.exec(text)
  if (hexadecimal !== null)
    return refuse(
      'length-hexadecimal',
      `${quoted(text)} is a hexadecimal number`,
      inDigits(Number.parseInt(hexadecimal[1] ?? '', 16)),
    )
  const octal = /^0o([0-7]*)/i.exec(text)
  if (octal !== null)
    return refuse('length-octal', `${quoted(text)} is an octal number`, inDigits(Number.parseInt(octal[1] ?? '', 8)))
  const exponent = /^(?:\d+\.?\d*|\.\d+)e[+-]?\d+/i.exec(text)
  if (exponent !== null) {
    const value = Number(exponent[0])
    const isShort = value >= 1e-6 && value < 1e7
    return refuse(
      'length-exponent',
      `${quoted(text)} has an exponent`,
      isShort ? `write it out: ${String(value)}` : 'write it out in ordinary digits',
    )
  }
  return null
}

function commaFailure(number: string, text: string): Failure | null {
  if (!/\d,\d|^,\d/.test(number)) return null
  // 1,250 may be a thousand and a quarter of one, or one and a quarter: only its author knows.
  const isEither = /^[1-9]\d{0,2}(,\d{3})+$/.test(number)
  const dotted = number.replaceAll(',', '.').replace(/^\./, '0.')
  return refuse(
    'length-decimal-comma',
    `${quoted(text)} has a decimal comma`,
    isEither
      ? `write a dot for decimals: ${number.replace(',', '.')}; or ${number.replaceAll(',', '')} if the comma parts thousands`
      : `write a dot: ${dotted}`,
  )
}

/**
 * What is wrong with a number that could not be read.
 * @param number the number without sign and unit
 * @param text all that the author wrote
 */
export function numberFailure(number: string, text: string): Failure {
  const comma = commaFailure(number, text)
  if (comma !== null) return comma
  if (/±|\+-|\+\/-|\+.*\//.test(number))
    return refuse(
      'length-tolerance',
      `${quoted(text)} carries a tolerance where none can be`,
      'write the length without its tolerance',
    )
  if (/^\d[\d\s./-]*[xX×]/.test(number))
    return refuse(
      'length-not-understood',
      `${quoted(text)} is a size, not one length`,
      'write one length, such as 148 mm',
    )
  if (number.includes('..'))
    return refuse(
      'length-not-understood',
      `${quoted(text)} is a range, not one length`,
      'write one length, such as 148 mm',
    )
  if (/\/\s*$|^\s*\/|\d\s*-\s*$|-\s*\/|\d\.$/.test(number))
    return refuse(
      'length-missing-operand',
      `${quoted(text)} lacks a part of its number`,
      /\d\.$/.test(number)
        ? `write ${number.slice(0, -1)}, or digits after the dot`
        : 'write both numbers, such as 3/4',
    )
  return notUnderstood(text)
}

export const notUnderstood = (text: string): Failure =>
  refuse(
    'length-not-understood',
    `${quoted(text)} is not a length`,
    'write a number with a unit, such as 148 mm, 8 1/4 in or 0.32 mm',
  )
