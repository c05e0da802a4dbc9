import { millimetresPerInch as inch } from '../units/format-length.ts'
import type { Millimetres, Reading } from '../units/units.ts'

/** A sheet to print on. */
export interface PageSize {
  readonly name: string
  readonly width: Millimetres
  readonly height: Millimetres
}

/** Named sheets, upright. ISO 216 and the North American sizes (published). */
export const pageSizes: Readonly<Record<string, PageSize>> = {
  a3: { name: 'A3', width: 297, height: 420 },
  a4: { name: 'A4', width: 210, height: 297 },
  a5: { name: 'A5', width: 148, height: 210 },
  letter: { name: 'Letter', width: 8.5 * inch, height: 11 * inch },
  legal: { name: 'Legal', width: 8.5 * inch, height: 14 * inch },
  tabloid: { name: 'Tabloid', width: 11 * inch, height: 17 * inch },
  '12x12in': { name: '12 × 12 in', width: 12 * inch, height: 12 * inch },
}

const unitsOf: Readonly<Record<string, number>> = { mm: 1, cm: 10, in: inch }

/** Reads a sheet: a name, or a size such as `330 x 480 mm` or `12x12in`. */
export function readPageSize(written: string): Reading<PageSize> {
  const name = written.trim().toLowerCase()
  const named = pageSizes[name.replace(/\s/g, '')]
  if (named !== undefined) return { ok: true, value: named }
  const match = /^(\d+(?:\.\d+)?)\s*[x×]\s*(\d+(?:\.\d+)?)\s*(mm|cm|in)?$/u.exec(name)
  const remedy = `write ${Object.keys(pageSizes).join(', ')} or a size such as 330x480mm`
  if (match === null) return { ok: false, code: 'unknown-sheet', fact: `there is no sheet called ${written}`, remedy }
  const unit = unitsOf[match[3] ?? 'mm'] ?? 1
  const [width, height] = [Number(match[1]) * unit, Number(match[2]) * unit]
  const isUsable = width >= 90 && height >= 90 && width <= 2000 && height <= 2000
  if (!isUsable)
    return { ok: false, code: 'sheet-size', fact: `a sheet of ${written} is not between 90 and 2000 mm`, remedy }
  return { ok: true, value: { name: `${match[1] ?? ''} × ${match[2] ?? ''} ${match[3] ?? 'mm'}`, width, height } }
}

/** The sheet with its exact size: names are misused, so millimetres always stand beside them. */
export function pageSizeText({ name, width, height }: PageSize): string {
  const mm = (value: Millimetres): string => String(Math.round(value * 10) / 10)
  const size = `${mm(width)} × ${mm(height)} mm`
  return name === size ? size : `${name}, ${size}`
}
