import { parseLength, trailingUnit } from './parse-length.ts'
import { isCount, sizeParts } from './parse-size.ts'
import type { Length, LengthUnit, Reading, TolerancedLength } from './units.ts'

export interface TolerancedOptions {
  /** A stack measured together, `3.2 mm / 10`: for calipers. */
  readonly allowStack?: boolean
  readonly allowZero?: boolean
}

type Failure = Extract<Reading<never>, { ok: false }>
const refuse = (code: string, fact: string, remedy: string): Failure => ({ ok: false, code, fact, remedy })

const centred = (length: Length, halfWidth: number | null, text: string): Reading<TolerancedLength> => ({
  ok: true,
  value: { nominal: length.mm, halfWidth, text },
})

/** `0.37 mm ± 5 %` and `0.37 mm +- 0.02 mm`: the part after the sign. */
function halfWidthOf(text: string, length: Length): Reading<number> {
  const share = /^(\d+(?:\.\d+)?)\s*%$/.exec(text)
  if (share !== null) {
    const part = Number(share[1]) / 100
    return part < 1
      ? { ok: true, value: length.mm * part }
      : refuse('tolerance-too-large', `a tolerance of ${text} leaves nothing`, 'write less than 100 %')
  }
  const reading = parseLength(text, length.unit, { allowZero: true })
  if (!reading.ok) return reading
  return reading.value.mm < length.mm
    ? { ok: true, value: reading.value.mm }
    : refuse(
        'tolerance-too-large',
        `a tolerance of ${text} leaves nothing of ${length.text}`,
        'write a smaller tolerance',
      )
}

/** A length with a tolerance; an uneven one is moved to its middle and taken as uniform. */
export function parseTolerancedLength(
  source: string,
  defaultUnit: LengthUnit,
  options: TolerancedOptions = {},
): Reading<TolerancedLength> {
  const text = source.trim()
  const zero = { allowZero: options.allowZero ?? false }
  const even = /^(.*?)\s*(?:±|\+-|\+\/-)\s*(.*)$/su.exec(text)
  if (even !== null) {
    const [, main = '', spread = ''] = even
    const length = parseLength(main, trailingUnit(main) ?? trailingUnit(spread.replace('%', '')) ?? defaultUnit, zero)
    if (!length.ok) return length
    const half = halfWidthOf(spread.trim(), length.value)
    return half.ok ? centred(length.value, half.value, text) : half
  }
  const uneven = /^(.*?)\s*\+\s*([^/]+?)\s*\/\s*[-−]\s*(.+)$/su.exec(text)
  if (uneven !== null) {
    const [, main = '', up = '', down = ''] = uneven
    const unit = trailingUnit(down) ?? trailingUnit(main) ?? defaultUnit
    const length = parseLength(main, unit, zero)
    if (!length.ok) return length
    const above = parseLength(up, unit, { allowZero: true })
    if (!above.ok) return above
    const below = parseLength(down, unit, { allowZero: true })
    if (!below.ok) return below
    const half = (above.value.mm + below.value.mm) / 2
    const nominal = length.value.mm + (above.value.mm - below.value.mm) / 2
    if (half >= nominal)
      return refuse('tolerance-too-large', `the tolerance of “${text}” leaves nothing`, 'write a smaller tolerance')
    return { ok: true, value: { nominal, halfWidth: half, text } }
  }
  const stack = options.allowStack === true ? /^(.*(?:mm|cm|in|um|µm|μm|mil|pt|["″”]))\s*\/\s*(\d+)$/u.exec(text) : null
  if (stack !== null) {
    const [, main = '', sheets = '1'] = stack
    const count = Number(sheets)
    if (count < 1)
      return refuse(
        'stack-count',
        `a stack of ${sheets} sheets cannot be measured`,
        'write how many sheets were measured together, such as 3.2 mm / 10',
      )
    const length = parseLength(main, defaultUnit)
    return length.ok ? { ok: true, value: { nominal: length.value.mm / count, halfWidth: null, text } } : length
  }
  const length = parseLength(text, defaultUnit, zero)
  return length.ok ? centred(length.value, null, text) : length
}

/** A size with one tolerance for all its lengths, `162 x 114 mm ± 0.8 mm`, or each with its own. */
export function parseTolerancedSize(
  source: string,
  defaultUnit: LengthUnit,
  dimensions: 2 | 3 | '2 or 3',
): Reading<readonly TolerancedLength[]> {
  const text = source.trim()
  const parts = sizeParts(text)
  if (!isCount(parts.length, dimensions) || parts.includes('')) {
    return refuse(
      'size-parts',
      `“${text}” is not a size of ${String(dimensions)} lengths`,
      'write A x B or A x B x D, such as 162 x 114 mm ± 0.8 mm',
    )
  }
  const sign = /\s*(±|\+-|\+\/-)\s*/
  const toleranced = parts.filter((part) => sign.test(part) || /\+.*\//.test(part))
  const last = parts.at(-1) ?? ''
  const isForAll = toleranced.length === 1 && toleranced[0] === last && parts.length > 1
  const [lastMain = last] = last.split(sign)
  const unit = trailingUnit(lastMain) ?? trailingUnit(last) ?? defaultUnit
  const spread = isForAll ? last.slice(lastMain.length) : ''
  const lengths: TolerancedLength[] = []
  for (const part of parts) {
    const reading = parseTolerancedLength(part === last ? part : `${part}${spread}`, unit)
    if (!reading.ok) return reading
    lengths.push(reading.value)
  }
  return { ok: true, value: lengths }
}
