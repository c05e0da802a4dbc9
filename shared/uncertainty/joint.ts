import type { Dimension, Source } from './dimension.ts'
import { distributionOf, type Distribution } from './distribution.ts'
import { worstCase } from './moments.ts'
import { normalQuantile } from './normal.ts'

/** A dimension that must be at least so much. */
export interface Condition {
  readonly dimension: Dimension
  readonly atLeast: number
}

/** Failure probabilities below this are nothing. */
const negligible = 1e-7
/** Bounds closer than this need no integration. */
const closeEnough = 1e-4
/** Points of the even spread; more where a condition shares all its sources and is a step, not a slope. */
const smoothPoints = 1024
const steppedPoints = 8192
const tableSize = 129

interface Open {
  readonly condition: Condition
  readonly fails: number
}

/** Fractional parts of k·√p for the first primes: an even spread over many dimensions without chance (Richtmyer). */
const primes = [
  2, 3, 5, 7, 11, 13, 17, 19, 23, 29, 31, 37, 41, 43, 47, 53, 59, 61, 67, 71, 73, 79, 83, 89, 97, 101, 103, 107, 109,
  113,
]
const stepOf = (dimension: number): number => {
  const root =
    Math.sqrt(primes[dimension % primes.length] ?? 2) * (1 + Math.floor(dimension / primes.length) * 0.7548776662466927)
  return root - Math.floor(root)
}

/** A value of a source from a number between 0 and 1, by the inverse of its distribution. */
function draw(source: Source, u: number): number {
  switch (source.shape) {
    case 'uniform':
      return (2 * u - 1) * source.halfWidth
    case 'triangular':
      return (u < 0.5 ? Math.sqrt(2 * u) - 1 : 1 - Math.sqrt(2 * (1 - u))) * source.halfWidth
    case 'normal':
      return normalQuantile(Math.min(1 - 1e-12, Math.max(1e-12, u))) * (source.halfWidth / 3)
  }
}

/** Distribution of what one condition does not share, as a table that is quick to look up. */
function tabulate(distribution: Distribution, low: number, high: number): (x: number) => number {
  if (high - low < 1e-12) return (x) => (x > low ? 1 : 0)
  const step = (high - low) / (tableSize - 1)
  const values = Float64Array.from({ length: tableSize }, (_, index) => distribution.below(low + index * step))
  return (x) => {
    if (x <= low) return 0
    if (x >= high) return 1
    const position = (x - low) / step
    const index = Math.min(tableSize - 2, Math.floor(position))
    const from = values[index] ?? 0
    return from + ((values[index + 1] ?? 1) - from) * (position - index)
  }
}

interface Prepared {
  /** Coefficients over the shared sources, in their order. */
  readonly coefficients: Float64Array
  /** P(private part < x). */
  readonly privateBelow: (x: number) => number
  readonly atLeast: number
  readonly nominal: number
}

function integrate(open: readonly Condition[]): number {
  const uses = new Map<string, { readonly source: Source; count: number }>()
  for (const { dimension } of open) {
    for (const source of dimension.sources) {
      if (source.halfWidth === 0) continue
      const known = uses.get(source.name)
      if (known === undefined) uses.set(source.name, { source, count: 1 })
      else known.count += 1
    }
  }
  // In the order of their names, so that the order of conditions changes nothing.
  const shared = [...uses.values()]
    .filter((use) => use.count > 1)
    .map((use) => use.source)
    .toSorted((a, b) => (a.name < b.name ? -1 : 1))
  const isShared = new Set(shared.map((source) => source.name))
  const prepared: readonly Prepared[] = open.map(({ dimension, atLeast }) => {
    const own = { nominal: 0, sources: dimension.sources.filter((source) => !isShared.has(source.name)) }
    const { min, max } = worstCase(own)
    return {
      coefficients: Float64Array.from(
        shared,
        (source) => dimension.sources.find((entry) => entry.name === source.name)?.coefficient ?? 0,
      ),
      privateBelow: tabulate(distributionOf(own), min, max),
      atLeast,
      nominal: dimension.nominal,
    }
  })
  const hasStep = open.some(({ dimension }) =>
    dimension.sources.every((source) => source.halfWidth === 0 || isShared.has(source.name)),
  )
  const points = hasStep ? steppedPoints : smoothPoints
  const steps = shared.map((_, index) => stepOf(index))
  const values = new Float64Array(shared.length)
  let total = 0
  for (let point = 1; point <= points; point += 1) {
    for (let index = 0; index < shared.length; index += 1) {
      const source = shared[index]
      if (source === undefined) continue
      const turned = point * (steps[index] ?? 0)
      const u = turned - Math.floor(turned)
      // Folding the spread at the middle makes it periodic, which is what an even spread integrates best.
      values[index] = draw(source, u < 0.5 ? 2 * u : 2 - 2 * u)
    }
    let all = 1
    for (const condition of prepared) {
      let base = condition.nominal
      for (let index = 0; index < values.length; index += 1)
        base += (condition.coefficients[index] ?? 0) * (values[index] ?? 0)
      all *= 1 - condition.privateBelow(condition.atLeast - base)
      if (all === 0) break
    }
    total += all
  }
  return total / points
}

/**
 * P(every dimension is at least so much), where sources of one name are the same chance in all of them.
 * Certain conditions drop out; where the bounds 1 − Σq and 1 − max q agree no more is done; else what is shared is
 * integrated over an even spread of points and what is not is exact. Deterministic; error about 1e-3 at most.
 */
export function jointProbability(conditions: readonly Condition[]): number {
  const open: Open[] = []
  for (const condition of conditions) {
    const fails = distributionOf(condition.dimension).below(condition.atLeast)
    if (fails >= 1 - 1e-12) return 0
    if (fails > negligible) open.push({ condition, fails })
  }
  const [first] = open
  if (first === undefined) return 1
  if (open.length === 1) return 1 - first.fails
  const most = Math.max(...open.map((entry) => entry.fails))
  const sum = open.reduce((total, entry) => total + entry.fails, 0)
  if (sum - most < closeEnough) return 1 - (sum + most) / 2
  const joint = integrate(open.map((entry) => entry.condition))
  return Math.min(1 - most, Math.max(0, 1 - sum, joint))
}
