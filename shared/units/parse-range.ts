import { splitUnit, trailingUnit, unitNamed } from './length-units.ts'
import { parseLength } from './parse-length.ts'
import { longestMeasure, quoted, refuse } from './refuse.ts'
import type { LengthUnit, Range, Reading } from './units.ts'

const isOpen = (end: string): boolean => end === '' || unitNamed(end) !== null

/** The same two ends the other way round, each in the unit it was meant in. */
function turnedRound(before: string, after: string): string {
  const last = splitUnit(after)
  if (trailingUnit(before) !== null || last.unit === '') return `${after}..${before}`
  return `${last.number}..${before} ${last.unit}`
}

/** A range such as `0.4.. mm`, `..3 mm` or `-0.3..4 mm`; ends may be negative, and one of them open. */
export function parseRange(source: string, defaultUnit: LengthUnit): Reading<Range> {
  const text = source.trim()
  const at = text.indexOf('..')
  // A third dot would pass for the decimal point of the far end: 0.2...3 is not 0.2 to 0.3.
  if (at === -1 || text.includes('...') || text.length > longestMeasure) {
    return refuse(
      'range-not-understood',
      `${quoted(text)} is not a range`,
      'write two ends with two dots between, such as 0.2..3 mm, 0.4.. mm or ..3 mm',
    )
  }
  const unit = trailingUnit(text) ?? defaultUnit
  const before = text.slice(0, at).trim()
  const after = text.slice(at + 2).trim()
  if (isOpen(before) && isOpen(after))
    return refuse('range-empty', `${quoted(text)} has no end`, 'write at least one end, such as 0.4.. mm')
  const end = (part: string): Reading<number | null> => {
    if (isOpen(part)) return { ok: true, value: null }
    const reading = parseLength(part, unit, { allowNegative: true, allowZero: true })
    return reading.ok ? { ok: true, value: reading.value.mm } : reading
  }
  const min = end(before)
  if (!min.ok) return min
  const max = end(after)
  if (!max.ok) return max
  if (min.value !== null && max.value !== null && min.value > max.value)
    return refuse(
      'range-reversed',
      `${quoted(text)} ends before it begins`,
      `write the smaller end first: ${turnedRound(before, after)}`,
    )
  return { ok: true, value: { min: min.value, max: max.value } }
}
