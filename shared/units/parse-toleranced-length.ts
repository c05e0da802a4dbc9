import { trailingUnit } from './length-units.ts'
import { parseLength } from './parse-length.ts'
import { readSizeParts, type SizeDimensions } from './parse-size.ts'
import { longestMeasure, quoted, refuse, type Failure } from './refuse.ts'
import type { Length, LengthUnit, Millimetres, Reading, TolerancedLength } from './units.ts'

export interface TolerancedOptions {
  /** A stack measured together, `3.2 mm / 10`: for calipers. */
  readonly allowStack?: boolean
  readonly allowZero?: boolean
}

interface Split {
  readonly main: string
  /** What follows ±. */
  readonly even: string | null
  /** What follows + and -, where they differ. */
  readonly uneven: readonly [string, string] | null
}

const leavesNothing = (text: string): Failure =>
  refuse('tolerance-too-large', `the tolerance of ${quoted(text)} leaves nothing`, 'write a smaller tolerance')

/** Parts a text where its tolerance begins; `null` where a tolerance begins and cannot be read. */
function splitTolerance(text: string): Split | null {
  const at = text.search(/±|(?<!^)\+/)
  if (at === -1) return { main: text, even: null, uneven: null }
  const main = text.slice(0, at).trim()
  const spread = text.slice(at)
  const even = /^(?:±|\+-|\+\/-)\s*([^±+]*)$/.exec(spread)
  if (even !== null) return { main, even: (even[1] ?? '').trim(), uneven: null }
  const uneven = /^\+\s*([^±+-]+?)\s*\/\s*[-−]\s*([^±+]+)$/.exec(spread)
  return uneven === null ? null : { main, even: null, uneven: [uneven[1] ?? '', uneven[2] ?? ''] }
}

/** A measured stack divided by its sheets; `null` where the text is none. A lone `3/10` is a fraction and means the same. */
function parseStack(text: string, defaultUnit: LengthUnit): Reading<Length> | null {
  const at = text.lastIndexOf('/')
  const whole = text.slice(0, at).trim()
  const sheets = /^\d{1,6}$/.exec(text.slice(at + 1).trim())?.[0]
  if (at === -1 || sheets === undefined) return null
  if (trailingUnit(whole) === null && !/^\d+\.\d+$/.test(whole)) return null
  if (Number(sheets) < 1)
    return refuse(
      'stack-count',
      `a stack of ${sheets} sheets cannot be measured`,
      'write how many sheets were measured together, such as 3.2 mm / 10',
    )
  const stack = parseLength(whole, defaultUnit)
  if (!stack.ok) return stack
  return { ok: true, value: { ...stack.value, mm: stack.value.mm / Number(sheets), text } }
}

const stackTolerance = (text: string): Failure =>
  refuse(
    'stack-tolerance',
    `the tolerance ${quoted(text)} could be meant for the stack or for one sheet`,
    'write it in per cent, such as 3.2 mm / 10 ± 5 %',
  )

/** What follows ±: a share of the length in per cent, or a length. */
function readHalfWidth(spread: string, length: Length, isStack: boolean): Reading<Millimetres> {
  if (spread === '')
    return refuse(
      'tolerance-missing',
      `no tolerance follows the ± of ${quoted(length.text)}`,
      'write one, such as ± 5 %',
    )
  if (spread.endsWith('%')) {
    const share = /^(\d+(?:\.\d+)?)\s*%$/.exec(spread)?.[1]
    if (share !== undefined) return { ok: true, value: (length.mm * Number(share)) / 100 }
    return refuse(
      'tolerance-not-understood',
      `${quoted(spread)} is not a share`,
      `write it such as ${/^\d+,\d+\s*%$/.test(spread) ? spread.replace(',', '.') : '5 % or 2.5 %'}`,
    )
  }
  if (isStack) return stackTolerance(spread)
  const reading = parseLength(spread, length.unit, { allowZero: true })
  return reading.ok ? { ok: true, value: reading.value.mm } : reading
}

/** A length with a tolerance; an uneven one is moved to its middle and taken as uniform. */
export function parseTolerancedLength(
  source: string,
  defaultUnit: LengthUnit,
  options: TolerancedOptions = {},
): Reading<TolerancedLength> {
  const text = source.trim()
  const split = text.length > longestMeasure ? null : splitTolerance(text)
  if (split === null)
    return refuse(
      'tolerance-not-understood',
      `${quoted(text)} has a tolerance that cannot be read`,
      'write it such as 0.37 mm ± 5 %, 0.37 mm +- 0.02 mm or 0.37 +0.03/-0.01 mm',
    )
  const { main, even, uneven } = split
  const unit = trailingUnit(main) ?? trailingUnit(uneven?.[1] ?? even ?? '') ?? defaultUnit
  const stack = options.allowStack === true ? parseStack(main, unit) : null
  const length = stack ?? parseLength(main, unit, { allowZero: options.allowZero ?? false })
  if (!length.ok) return length
  if (uneven !== null) return stack === null ? recentred(length.value, uneven, text) : stackTolerance(text)
  if (even === null) return { ok: true, value: { nominal: length.value.mm, halfWidth: null, text } }
  const halfWidth = readHalfWidth(even, length.value, stack !== null)
  if (!halfWidth.ok) return halfWidth
  return halfWidth.value < length.value.mm
    ? { ok: true, value: { nominal: length.value.mm, halfWidth: halfWidth.value, text } }
    : leavesNothing(text)
}

function recentred(length: Length, [up, down]: readonly [string, string], text: string): Reading<TolerancedLength> {
  const unit = trailingUnit(down) ?? length.unit
  const above = parseLength(up, unit, { allowZero: true })
  if (!above.ok) return above
  const below = parseLength(down, unit, { allowZero: true })
  if (!below.ok) return below
  const halfWidth = (above.value.mm + below.value.mm) / 2
  const nominal = length.mm + (above.value.mm - below.value.mm) / 2
  return halfWidth < nominal ? { ok: true, value: { nominal, halfWidth, text } } : leavesNothing(text)
}

/** A size with one tolerance for all its lengths, `162 x 114 mm ± 0.8 mm`, or each with its own. */
export function parseTolerancedSize(
  source: string,
  defaultUnit: LengthUnit,
  dimensions: SizeDimensions,
): Reading<readonly TolerancedLength[]> {
  const parts = readSizeParts(source.trim(), dimensions)
  if (!parts.ok) return parts
  const last = parts.value.at(-1) ?? ''
  const at = last.search(/\s*[±+]/)
  const unit = trailingUnit(at === -1 ? last : last.slice(0, at)) ?? trailingUnit(last) ?? defaultUnit
  const isForAll = at > 0 && !parts.value.slice(0, -1).some((part) => /[±+]/.test(part))
  const lengths: TolerancedLength[] = []
  for (const [index, part] of parts.value.entries()) {
    const isLast = index === parts.value.length - 1
    const reading = parseTolerancedLength(isForAll && !isLast ? `${part}${last.slice(at)}` : part, unit)
    if (!reading.ok) return reading
    lengths.push(reading.value)
  }
  return { ok: true, value: lengths }
}
