import { parseLength, trailingUnit } from './parse-length.ts'
import type { LengthUnit, Range, Reading } from './units.ts'

/** A range such as `0.4.. mm`, `..3 mm` or `-0.3..4 mm`; ends may be negative or open, not both open. */
export function parseRange(source: string, defaultUnit: LengthUnit): Reading<Range> {
  const text = source.trim()
  const at = text.indexOf('..')
  if (at === -1) {
    return {
      ok: false,
      code: 'range-not-understood',
      fact: `“${text}” is not a range`,
      remedy: 'write two ends with two dots between, such as 0.2..3 mm, 0.4.. mm or ..3 mm',
    }
  }
  const unit = trailingUnit(text) ?? defaultUnit
  const before = text.slice(0, at).trim()
  const after = text.slice(at + 2).trim()
  const isOpen = (end: string): boolean => end === '' || /^(mm|cm|in|um|µm|μm|mil|pt|["″”])$/.test(end)
  if (isOpen(before) && isOpen(after)) {
    return {
      ok: false,
      code: 'range-empty',
      fact: `“${text}” has no end`,
      remedy: 'write at least one end, such as 0.4.. mm',
    }
  }
  const end = (part: string): Reading<number | null> => {
    if (isOpen(part)) return { ok: true, value: null }
    const reading = parseLength(part, unit, { allowNegative: true, allowZero: true })
    return reading.ok ? { ok: true, value: reading.value.mm } : reading
  }
  const min = end(before)
  if (!min.ok) return min
  const max = end(after)
  if (!max.ok) return max
  if (min.value !== null && max.value !== null && min.value > max.value) {
    return {
      ok: false,
      code: 'range-reversed',
      fact: `“${text}” ends before it begins`,
      remedy: `write the smaller end first: ${after.replace(/\s*[a-z"″”µμ]+$/i, '')}..${before}`,
    }
  }
  return { ok: true, value: { min: min.value, max: max.value } }
}
