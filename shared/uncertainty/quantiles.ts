import { incompleteBeta, incompleteGamma, logGamma } from './incomplete-functions.ts'
import { normalCumulative } from './normal.ts'

/** Where a rising function reaches a share; the bracket is widened upwards until it does, then halved. */
function solve(rising: (x: number) => number, share: number, low: number, high: number): number {
  let [from, to] = [low, high]
  while (rising(to) < share && to < 1e12) to += to - from
  for (let step = 0; step < 200 && to - from > 1e-14 * Math.abs(to); step += 1) {
    const middle = (from + to) / 2
    if (rising(middle) < share) from = middle
    else to = middle
  }
  return (from + to) / 2
}

/** P(χ² ≤ x) with so many degrees of freedom. */
export const chiSquareBelow = (x: number, freedom: number): number => incompleteGamma(freedom / 2, x / 2)

/** The χ² value below which a share (0..1) lies. */
export const chiSquareQuantile = (share: number, freedom: number): number =>
  share <= 0 ? 0 : solve((x) => chiSquareBelow(x, freedom), share, 0, freedom + 10)

/** P(t ≤ x), Student's distribution. */
export function studentBelow(x: number, freedom: number): number {
  const tail = incompleteBeta(freedom / 2, 0.5, freedom / (freedom + x * x)) / 2
  return x > 0 ? 1 - tail : tail
}

/** Student's t below which a share (0..1, ends excluded) lies. */
export function studentQuantile(share: number, freedom: number): number {
  if (share < 0.5) return -studentQuantile(1 - share, freedom)
  return solve((x) => studentBelow(x, freedom), share, 0, 10)
}

/** The value below which a share of a beta distribution lies. */
export const betaQuantile = (share: number, a: number, b: number): number =>
  solve((x) => incompleteBeta(a, b, x), share, 0, 1)

/** Intervals of Simpson's rule, an even number: errors below 2e-7 with one degree of freedom, 2e-9 from three on. */
const intervals = 800

/**
 * P(T ≤ x) of the noncentral t: the normal with mean `shift` over √(χ²/ν), as ∫ Φ(x·s − shift) dF(s) over s = √(χ²/ν)
 * by Simpson's rule within ten standard deviations of s (derived from the definition).
 */
export function noncentralStudentBelow(x: number, freedom: number, shift: number): number {
  const spread = 10 / Math.sqrt(2 * freedom)
  const from = Math.max(0, 1 - spread)
  const width = (1 + spread - from) / intervals
  const constant = (freedom / 2) * Math.log(freedom / 2) - logGamma(freedom / 2) + Math.log(2)
  let sum = 0
  for (let index = 0; index <= intervals; index += 1) {
    const s = from + index * width
    if (s === 0 && freedom > 1) continue
    const logDensity = constant + (freedom === 1 ? 0 : (freedom - 1) * Math.log(s)) - (freedom * s * s) / 2
    const weight = index === 0 || index === intervals ? 1 : index % 2 === 1 ? 4 : 2
    sum += weight * Math.exp(logDensity) * normalCumulative(x * s - shift)
  }
  return (sum * width) / 3
}

/** The shift of a noncentral t with which P(T ≤ x) is the share: the probability falls as the shift grows. */
export function noncentralShift(share: number, x: number, freedom: number): number {
  const reach = 10 + Math.abs(x)
  return solve((shift) => 1 - noncentralStudentBelow(x, freedom, shift), 1 - share, x - reach, x + reach)
}
