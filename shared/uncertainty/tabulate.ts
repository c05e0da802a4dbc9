import { samePoint } from '../geometry/tolerance.ts'
import { cumulativeOf } from './cumulative.ts'
import type { Dimension } from './dimension.ts'
import { spreadOf } from './spread.ts'

/** Cells over the whole reach of a tabulated distribution; straight lines between them err by less than 1e-4. */
const cells = 128

/** P(sum < x) of a dimension's sources about its nominal, at evenly spaced x from −reach to reach. */
export interface Table {
  readonly reach: number
  readonly values: Float64Array
}

/** The distribution of what varies in a dimension, worked out once for many look-ups; null where nothing does. */
export function tabulate(dimension: Dimension): Table | null {
  const spread = spreadOf(dimension)
  const { reach } = spread
  if (reach <= samePoint) return null
  const below = cumulativeOf(spread)
  const values = new Float64Array(cells + 1)
  for (let cell = 1; cell <= cells / 2; cell += 1) {
    const value = below(-reach + (2 * reach * cell) / cells)
    values[cell] = value
    values[cells - cell] = 1 - value
  }
  values[cells] = 1
  return { reach, values }
}

/** P(sum < x) by a straight line between two entries. */
export function lookUp({ reach, values }: Table, x: number): number {
  const position = ((x + reach) / (2 * reach)) * cells
  if (position <= 0) return 0
  if (position >= cells) return 1
  const cell = position | 0
  const from = values[cell] ?? 0
  return from + ((values[cell + 1] ?? 1) - from) * (position - cell)
}

/** Values that stand for equal shares of a distribution: the middle of each of `count` slices of probability, rising. */
export function slices({ reach, values }: Table, count: number): Float64Array {
  const middles = new Float64Array(count)
  let cell = 0
  for (let slice = 0; slice < count; slice += 1) {
    const share = (slice + 0.5) / count
    while (cell < cells - 1 && (values[cell + 1] ?? 1) < share) cell += 1
    const from = values[cell] ?? 0
    const rise = (values[cell + 1] ?? 1) - from
    middles[slice] = -reach + ((2 * reach) / cells) * (cell + (rise > 0 ? (share - from) / rise : 0))
  }
  return middles
}
