import type { Dimension } from './dimension.ts'
import { normalCumulative } from './normal.ts'

/** The exact distribution of a dimension's sum of sources. */
export interface Distribution {
  /** P(dimension < x), absolute error at most 1e-4 (about 1e-6 in practice). */
  below(x: number): number
  /** The value below which a share of builds lies, for 0 < share < 1. */
  quantile(share: number): number
}

/** Truncation of the Fourier series: its tail is bounded by this. */
const tailError = 2e-6
const mostTerms = 20_000
/** Normal sources are followed this many sigmas out; beyond lies less than 1e-10. */
const normalReach = 6.5

interface Part {
  readonly width: number
  readonly shape: 'uniform' | 'triangular' | 'normal'
}

function partsOf(dimension: Dimension): readonly Part[] {
  const parts: Part[] = []
  for (const source of dimension.sources) {
    const width = Math.abs(source.coefficient) * source.halfWidth
    if (width > 0) parts.push({ width, shape: source.shape })
  }
  return parts
}

const reachOf = (part: Part): number => (part.shape === 'normal' ? (part.width / 3) * normalReach : part.width)

/** Two uniforms of half-widths a ≥ b: a trapezoid, integrated in closed form. */
function trapezoidBelow(a: number, b: number, x: number): number {
  const outer = a + b
  if (x <= -outer) return 0
  if (x >= outer) return 1
  if (x > 0) return 1 - trapezoidBelow(a, b, -x)
  const inner = a - b
  if (x <= -inner) return (x + outer) ** 2 / (8 * a * b)
  return 0.5 + x / (2 * a)
}

/** Characteristic function of one part at t: sinc, sinc² of half the width, or a Gaussian. */
function characteristic(part: Part, t: number): number {
  const x = part.width * t
  if (part.shape === 'normal') return Math.exp(-((x / 3) ** 2) / 2)
  const y = part.shape === 'uniform' ? x : x / 2
  const sinc = Math.abs(y) < 1e-6 ? 1 - (y * y) / 6 : Math.sin(y) / y
  return part.shape === 'uniform' ? sinc : sinc * sinc
}

/** Bound of |characteristic| beyond t. */
function envelope(part: Part, t: number): number {
  const x = part.width * t
  if (part.shape === 'normal') return Math.exp(-((x / 3) ** 2) / 2)
  const y = part.shape === 'uniform' ? x : x / 2
  const bound = Math.min(1, 1 / y)
  return part.shape === 'uniform' ? bound : bound * bound
}

interface Series {
  readonly half: number
  /** φ(πk/L)/(πk) for k = 1, 2, … */
  readonly weights: Float64Array
}

/**
 * The sum is bounded, so its density on [−L, L] is its Fourier series with the characteristic function as coefficients:
 * F(x) = (x + L)/2L + Σ φ(πk/L)/(πk) · sin(πkx/L). Terms are taken until their bound says the rest is below `tailError`.
 */
function seriesOf(parts: readonly Part[]): Series {
  const reach = parts.reduce((sum, part) => sum + reachOf(part), 0)
  const half = reach * 1.02
  const step = Math.PI / half
  const weights: number[] = []
  for (let k = 1; k <= mostTerms; k += 1) {
    let value = 1
    let bound = 1
    for (const part of parts) {
      value *= characteristic(part, step * k)
      bound *= envelope(part, step * k)
    }
    weights.push(value / (Math.PI * k))
    // Σ beyond k of bound/(πk), with bound falling at least as 1/k where any part has begun to fall.
    if (bound / Math.PI < tailError) break
  }
  return { half, weights: Float64Array.from(weights) }
}

function seriesBelow({ half, weights }: Series, x: number): number {
  const angle = (Math.PI * x) / half
  const twiceCosine = 2 * Math.cos(angle)
  let previous = 0
  let current = Math.sin(angle)
  let sum = 0
  for (let index = 0; index < weights.length; index += 1) {
    sum += (weights[index] ?? 0) * current
    const next = twiceCosine * current - previous
    previous = current
    current = next
  }
  return Math.min(1, Math.max(0, (x + half) / (2 * half) + sum))
}

/** Cumulative distribution of the centred sum, by the cheapest exact way. */
function cumulativeOf(parts: readonly Part[]): (x: number) => number {
  const [first, second] = parts.toSorted((a, b) => b.width - a.width)
  if (first === undefined) return (x) => (x > 0 ? 1 : 0)
  if (parts.every((part) => part.shape === 'normal')) {
    const sigma = Math.sqrt(parts.reduce((sum, part) => sum + (part.width / 3) ** 2, 0))
    return (x) => normalCumulative(x / sigma)
  }
  if (second === undefined)
    return first.shape === 'uniform'
      ? (x) => Math.min(1, Math.max(0, (x + first.width) / (2 * first.width)))
      : (x) => trapezoidBelow(first.width / 2, first.width / 2, x)
  if (parts.length === 2 && first.shape === 'uniform' && second.shape === 'uniform')
    return (x) => trapezoidBelow(first.width, second.width, x)
  const series = seriesOf(parts)
  return (x) => seriesBelow(series, x)
}

/** The distribution of a dimension; nothing is computed until a value inside its worst case is asked for. */
export function distributionOf(dimension: Dimension): Distribution {
  const parts = partsOf(dimension)
  const reach = parts.reduce((sum, part) => sum + reachOf(part), 0)
  let cumulative: ((x: number) => number) | null = null
  const below = (x: number): number => {
    const centred = x - dimension.nominal
    if (centred <= -reach) return 0
    if (centred > reach || (centred >= reach && reach > 0)) return 1
    cumulative ??= cumulativeOf(parts)
    return cumulative(centred)
  }
  return {
    below,
    quantile(share) {
      let low = dimension.nominal - reach
      let high = dimension.nominal + reach
      for (let step = 0; step < 60 && high - low > 1e-9; step += 1) {
        const middle = (low + high) / 2
        if (below(middle) < share) low = middle
        else high = middle
      }
      return (low + high) / 2
    },
  }
}
