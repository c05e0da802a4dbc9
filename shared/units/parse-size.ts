import { trailingUnit } from './length-units.ts'
import { parseLength, type ParseOptions } from './parse-length.ts'
import { longestMeasure, quoted, refuse } from './refuse.ts'
import type { Length, LengthUnit, Reading } from './units.ts'

const shapes = { 2: 'A x B', 3: 'A x B x D', '2 or 3': 'A x B or A x B x D' } as const

export type SizeDimensions = keyof typeof shapes

/** The parts of a size, two or three of them, separated by x or ×. */
export function readSizeParts(text: string, dimensions: SizeDimensions): Reading<readonly string[]> {
  const parts = text.length > longestMeasure ? [] : text.split(/[xX×]/).map((part) => part.trim())
  const isWanted = dimensions === '2 or 3' ? parts.length === 2 || parts.length === 3 : parts.length === dimensions
  if (isWanted && !parts.includes('')) return { ok: true, value: parts }
  return refuse(
    'size-parts',
    `${quoted(text)} is not a size of ${String(dimensions)} lengths`,
    `write ${shapes[dimensions]}, such as ${dimensions === 3 ? '152 x 120 x 38 mm' : '148 x 105 mm'}`,
  )
}

/** A size such as `9 x 7 3/4 in`; the last unit holds for those before it that name none. */
export function parseSize(
  source: string,
  defaultUnit: LengthUnit,
  dimensions: SizeDimensions,
  options: ParseOptions = {},
): Reading<readonly Length[]> {
  const parts = readSizeParts(source.trim(), dimensions)
  if (!parts.ok) return parts
  const unit = trailingUnit(parts.value.at(-1) ?? '') ?? defaultUnit
  const lengths: Length[] = []
  for (const part of parts.value) {
    const reading = parseLength(part, unit, options)
    if (!reading.ok) return reading
    lengths.push(reading.value)
  }
  return { ok: true, value: lengths }
}
