import { parseLength, trailingUnit, type ParseOptions } from './parse-length.ts'
import type { Length, LengthUnit, Reading } from './units.ts'

/** Parts of a size, separated by x or ×. */
export const sizeParts = (text: string): readonly string[] => text.split(/\s*[xX×]\s*/).map((part) => part.trim())

/** Whether a text has so many parts. */
export const isCount = (count: number, wanted: 2 | 3 | '2 or 3'): boolean =>
  wanted === '2 or 3' ? count === 2 || count === 3 : count === wanted

const shape = { 2: 'A x B', 3: 'A x B x D', '2 or 3': 'A x B or A x B x D' } as const

/** A size such as `9 x 7 3/4 in`; the last unit holds for those before it that name none. */
export function parseSize(
  text: string,
  defaultUnit: LengthUnit,
  dimensions: 2 | 3 | '2 or 3',
  options: ParseOptions = {},
): Reading<readonly Length[]> {
  const parts = sizeParts(text.trim())
  if (!isCount(parts.length, dimensions) || parts.includes('')) {
    return {
      ok: false,
      code: 'size-parts',
      fact: `“${text.trim()}” is not a size of ${String(dimensions)} lengths`,
      remedy: `write ${shape[dimensions]}, such as ${dimensions === 3 ? '152 x 120 x 38 mm' : '148 x 105 mm'}`,
    }
  }
  const unit = trailingUnit(parts.at(-1) ?? '') ?? defaultUnit
  const lengths: Length[] = []
  for (const part of parts) {
    const reading = parseLength(part, unit, options)
    if (!reading.ok) return reading
    lengths.push(reading.value)
  }
  return { ok: true, value: lengths }
}
