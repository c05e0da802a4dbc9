import { normalCumulative, normalQuantile } from './normal.ts'
import { chiSquareQuantile, noncentralShift } from './quantiles.ts'

/** Limits of a requirement in millimetres; a side that is not limited is null. */
export interface Limits {
  readonly min: number | null
  readonly max: number | null
}

/** What was measured over builds of one version: their number, mean and standard deviation (n − 1). */
export interface Measured {
  readonly count: number
  readonly mean: number
  readonly deviation: number
}

/** Ends of an interval of confidence. */
export interface Interval {
  readonly low: number
  readonly high: number
}

/** Capability indices; those a missing limit leaves undefined are null. All are infinite where nothing varies. */
export interface Capability {
  /** (max − min) / 6s: what the process could do if it were centred. */
  readonly cp: number | null
  /** (mean − min) / 3s. */
  readonly lower: number | null
  /** (max − mean) / 3s. */
  readonly upper: number | null
  /** The worse side. */
  readonly cpk: number | null
  /** (max − min) / 6√(s² + (mean − target)²). */
  readonly cpm: number | null
}

const share = (part: number, whole: number): number => (whole === 0 ? Math.sign(part) * Infinity : part / whole)

/**
 * Capability of measured builds against limits.
 * @param target where builds should lie, for Cpm; the middle of two limits where not given
 * @see NIST/SEMATECH e-Handbook of Statistical Methods, 6.1.6 (published)
 */
export function capabilityOf({ mean, deviation }: Measured, { min, max }: Limits, target?: number): Capability {
  const lower = min === null ? null : share(mean - min, 3 * deviation)
  const upper = max === null ? null : share(max - mean, 3 * deviation)
  const sides = [lower, upper].filter((side) => side !== null)
  const cpk = sides.length === 0 ? null : Math.min(...sides)
  if (min === null || max === null) return { cp: null, lower, upper, cpk, cpm: null }
  const off = mean - (target ?? (min + max) / 2)
  return {
    cp: share(max - min, 6 * deviation),
    lower,
    upper,
    cpk,
    cpm: share(max - min, 6 * Math.hypot(deviation, off)),
  }
}

/** Interval for Cp by the χ² distribution of the variance (published); exact for normal readings. */
export function cpInterval(cp: number, count: number, confidence = 0.95): Interval {
  const freedom = count - 1
  const tail = (1 - confidence) / 2
  return {
    low: cp * Math.sqrt(chiSquareQuantile(tail, freedom) / freedom),
    high: cp * Math.sqrt(chiSquareQuantile(1 - tail, freedom) / freedom),
  }
}

/** Interval for Cpk: Cpk ± z√(1/(9n) + Cpk²/(2(n − 1))), Bissell 1990 (from memory); approximate, for normal readings. */
export function cpkInterval(cpk: number, count: number, confidence = 0.95): Interval {
  const z = normalQuantile((1 + confidence) / 2)
  const half = z * Math.sqrt(1 / (9 * count) + (cpk * cpk) / (2 * (count - 1)))
  return { low: cpk - half, high: cpk + half }
}

/** One-sided lower bound for the index of one side, exact for normal readings by the noncentral t (derived). */
export function sideLowerBound(index: number, count: number, confidence = 0.95): number {
  const scale = 3 * Math.sqrt(count)
  return noncentralShift(confidence, scale * index, count - 1) / scale
}

/** Share of builds that meet one limit at so large an index of its side: Φ(3C), for normal readings. */
export const shareMeeting = (index: number): number => normalCumulative(3 * index)
