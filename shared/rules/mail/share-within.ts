import type { Dimension } from '../../uncertainty/dimension.ts'
import { distributionOf } from '../../uncertainty/distribution.ts'
import type { Range } from '../../units/units.ts'

/** One end of a range, and the share of builds beyond it. */
export interface Beyond {
  readonly side: 'below' | 'above'
  readonly limit: number
  readonly share: number
}

/** The end of a range that more builds break; `null` where it has none. */
export function worstBeyond(dimension: Dimension, range: Range, tolerance = 0): Beyond | null {
  const distribution = distributionOf(dimension)
  const ends: Beyond[] = []
  if (range.min !== null)
    ends.push({ side: 'below', limit: range.min, share: distribution.below(range.min - tolerance) })
  if (range.max !== null)
    ends.push({ side: 'above', limit: range.max, share: 1 - distribution.below(range.max + tolerance) })
  return ends.toSorted((a, b) => b.share - a.share)[0] ?? null
}
