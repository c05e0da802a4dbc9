import type { NamedSize } from '../template/template-model.ts'
import { inchesToMillimetres } from '../units/inches.ts'
import { americanSizes } from './american-sizes.ts'
import { isoSeriesNames, isoSize, lastIsoNumber } from './iso-series.ts'

/** Metric sizes of no ISO 216 series, long side first, in millimetres. */
const furtherMetric: readonly (readonly [name: string, length: number, width: number])[] = [
  ['iso-dl', 220, 110], // reading of DIN 678-1
  ['iso-c6-c5', 229, 114], // reading of DIN 678-1
  ['iso-c7-c6', 162, 81], // from memory
  ['iso-a4-in-three', 210, 99], // derived: A4 folded in three
  ['din-e4', 400, 280], // reading of DIN 680
  ['metric-invitation', 220, 220], // one list of printers' media
  ['metric-italy', 230, 110], // one list of printers' media
]

let table: ReadonlyMap<string, NamedSize> | null = null

/** Built when first asked for, since most templates name no size. */
function sizes(): ReadonlyMap<string, NamedSize> {
  if (table !== null) return table
  const built = new Map<string, NamedSize>()
  for (const series of isoSeriesNames) {
    for (let number = 0; number <= lastIsoNumber; number += 1) {
      const size = isoSize(series, number)
      if (size !== null) built.set(`iso-${series}${String(number)}`, size)
    }
  }
  for (const [name, length, width] of furtherMetric) built.set(name, { length, width })
  for (const [name, length, width] of americanSizes)
    built.set(name, { length: inchesToMillimetres(length), width: inchesToMillimetres(width) })
  table = built
  return built
}

/** A finished size every workspace knows, such as `iso-a6` or `us-a2-card`, in millimetres; `null` for other names. */
export const builtInSize = (name: string): NamedSize | null => sizes().get(name) ?? null

export const builtInSizeNames = (): readonly string[] => [...sizes().keys()]

/**
 * The built-in sizes a name without its system could stand for: `a6` is an ISO sheet and a US card.
 * @returns their full names, to offer; `null` where there are none
 */
export function ambiguousSize(name: string): readonly string[] | null {
  const offers = [`iso-${name}`, `us-${name}-card`, `us-${name}`].filter((candidate) => sizes().has(candidate))
  return offers.length > 0 ? offers : null
}
