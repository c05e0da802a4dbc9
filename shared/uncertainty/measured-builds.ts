import type { Interval, Measured } from './capability.ts'
import { normalQuantile } from './normal.ts'
import { betaQuantile, chiSquareQuantile, studentQuantile } from './quantiles.ts'

/** Number, mean and standard deviation (n − 1) of readings; null without readings, deviation 0 for one. */
export function measure(readings: readonly number[]): Measured | null {
  const count = readings.length
  if (count === 0) return null
  const mean = readings.reduce((sum, reading) => sum + reading, 0) / count
  const squares = readings.reduce((sum, reading) => sum + (reading - mean) ** 2, 0)
  return { count, mean, deviation: count > 1 ? Math.sqrt(squares / (count - 1)) : 0 }
}

/** Interval for the mean of all builds by Student's t; needs at least two. */
export function meanInterval({ count, mean, deviation }: Measured, confidence = 0.95): Interval {
  const half = (studentQuantile((1 + confidence) / 2, count - 1) * deviation) / Math.sqrt(count)
  return { low: mean - half, high: mean + half }
}

/** Interval for the standard deviation of all builds by χ²; needs at least two. */
export function deviationInterval({ count, deviation }: Measured, confidence = 0.95): Interval {
  const freedom = count - 1
  const tail = (1 - confidence) / 2
  return {
    low: deviation * Math.sqrt(freedom / chiSquareQuantile(1 - tail, freedom)),
    high: deviation * Math.sqrt(freedom / chiSquareQuantile(tail, freedom)),
  }
}

/**
 * Factor k of a two-sided tolerance interval mean ± k·s that holds `coverage` of builds: z√(ν(1 + 1/n)/χ²), Howe 1969
 * (from memory; a published approximation good to a few per mille). Needs at least two builds.
 */
export function toleranceFactor(count: number, coverage = 0.95, confidence = 0.95): number {
  const freedom = count - 1
  const z = normalQuantile((1 + coverage) / 2)
  return z * Math.sqrt((freedom * (1 + 1 / count)) / chiSquareQuantile(1 - confidence, freedom))
}

/** Interval for the share of builds that fit where so many of so many did: Clopper and Pearson (published), never too short. */
export function fittingInterval(fitted: number, count: number, confidence = 0.95): Interval {
  const tail = (1 - confidence) / 2
  return {
    low: fitted === 0 ? 0 : betaQuantile(tail, fitted, count - fitted + 1),
    high: fitted === count ? 1 : betaQuantile(1 - tail, fitted + 1, count - fitted),
  }
}

/** Largest share of builds that may fail although none of so many did: 1 − (1 − confidence)^(1/n) (published). */
export const failingBound = (count: number, confidence = 0.95): number => 1 - (1 - confidence) ** (1 / count)

/** Builds without a failure that show, with confidence, that no more than a share fail. */
export const buildsNeeded = (failing: number, confidence = 0.95): number =>
  Math.ceil(Math.log(1 - confidence) / Math.log(1 - failing) - 1e-9)
