import type { Dimension } from './dimension.ts'

/** What the sources of a dimension come to: independent uniforms about zero and one normal. */
export interface Spread {
  /** Half-widths of the uniforms, largest first. */
  readonly widths: readonly number[]
  /** Standard deviation of all normal sources together. */
  readonly sigma: number
  /** Farthest the sum can lie from its nominal, normal sources counted to `normalReach` sigmas. */
  readonly reach: number
}

/** Normal sources are followed this many sigmas out; beyond, on both sides together, lies less than 1e-10. */
export const normalReach = 6.5

/** Largest change of any probability by what is left out of a spread. */
const negligible = 1e-7

/**
 * Leaves out the smallest uniforms and a tiny normal. The density of a sum is nowhere above that of its widest part, so
 * leaving out what moves the sum by at most e changes P(sum < x) by at most e times that density (derived).
 */
function withoutNegligible(widths: number[], sigma: number, reach: number): Spread {
  const allowed = negligible * Math.max(2 * (widths[0] ?? 0), Math.sqrt(2 * Math.PI) * sigma)
  let left = 0
  for (let last = widths.at(-1); last !== undefined && left + last <= allowed; last = widths.at(-1)) {
    left += last
    widths.pop()
  }
  return { widths, sigma: left + sigma * normalReach <= allowed ? 0 : sigma, reach }
}

/** The spread of a dimension about its nominal; a triangular source is two uniforms of half its half-width. */
export function spreadOf(dimension: Dimension): Spread {
  const widths: number[] = []
  let variance = 0
  let reach = 0
  for (const { coefficient, halfWidth, shape } of dimension.sources) {
    const width = Math.abs(coefficient) * halfWidth
    if (!(width > 0)) continue
    if (shape === 'normal') {
      variance += (width / 3) ** 2
      continue
    }
    reach += width
    if (shape === 'uniform') widths.push(width)
    else widths.push(width / 2, width / 2)
  }
  const sigma = Math.sqrt(variance)
  widths.sort((a, b) => b - a)
  return withoutNegligible(widths, sigma, reach + normalReach * sigma)
}
