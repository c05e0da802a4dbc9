import { samePoint } from '../geometry/tolerance.ts'
import { cumulativeOf } from './cumulative.ts'
import type { Dimension } from './dimension.ts'
import { spreadOf } from './spread.ts'

/** The exact distribution of a dimension's sum of sources. */
export interface Distribution {
  /**
   * P(dimension < x), absolute error below 1e-6; exactly 0 or 1 beyond the worst case. A dimension that does not vary
   * is not below a limit that it meets to within rounding.
   */
  readonly below: (x: number) => number
  /**
   * P(dimension > x), likewise; a dimension that does not vary is neither above nor below a limit that it meets to
   * within rounding.
   */
  readonly above: (x: number) => number
  /** The value below which a share of builds lies; the ends of the worst case for shares of 0 and 1. */
  readonly quantile: (share: number) => number
}

/** Distributions made so far: dimensions never change, and rules ask about the same ones again. */
const made = new WeakMap<Dimension, Distribution>()

/** The distribution of a dimension; nothing is computed until a value inside its worst case is asked for. */
export function distributionOf(dimension: Dimension): Distribution {
  const known = made.get(dimension)
  if (known !== undefined) return known
  const distribution = makeDistribution(dimension)
  made.set(dimension, distribution)
  return distribution
}

function makeDistribution(dimension: Dimension): Distribution {
  const { nominal } = dimension
  const spread = spreadOf(dimension)
  const { reach } = spread
  if (reach <= samePoint)
    return {
      below: (x) => (x > nominal + samePoint ? 1 : 0),
      above: (x) => (x < nominal - samePoint ? 1 : 0),
      quantile: () => nominal,
    }
  let cumulative: ((x: number) => number) | null = null
  const below = (x: number): number => {
    const centred = x - nominal
    if (centred <= -reach) return 0
    if (centred >= reach) return 1
    cumulative ??= cumulativeOf(spread)
    return cumulative(centred)
  }
  return {
    below,
    above: (x) => 1 - below(x),
    quantile: (share) => findQuantile(below, share, nominal - reach, nominal + reach),
  }
}

/** Where a rising function reaches a share, to a millionth of a millimetre, by halving. */
function findQuantile(below: (x: number) => number, share: number, from: number, to: number): number {
  if (share <= 0) return from
  if (share >= 1) return to
  let low = from
  let high = to
  while (high - low > samePoint) {
    const middle = (low + high) / 2
    if (below(middle) < share) low = middle
    else high = middle
  }
  return (low + high) / 2
}
