/** Below this the series for the error function is used, above it the continued fraction. */
const seriesUpTo = 2.5

/**
 * 1 − erf(x) for x ≥ 0. Below `seriesUpTo` by erf(x) = (2/√π)·exp(−x²)·Σ 2ⁿx²ⁿ⁺¹/(2n+1)!!, whose terms are all positive;
 * above by the continued fraction exp(−x²)/√π · 1/(x + ½/(x + 1/(x + ³⁄₂/(x + …)))). Both are textbook expansions.
 */
function complementaryError(x: number): number {
  if (x < seriesUpTo) {
    let term = x
    let sum = x
    for (let n = 1; term > sum * 1e-17; n += 1) {
      term *= (2 * x * x) / (2 * n + 1)
      sum += term
    }
    return 1 - (2 / Math.sqrt(Math.PI)) * Math.exp(-x * x) * sum
  }
  let fraction = 0
  for (let k = 60; k >= 1; k -= 1) fraction = k / 2 / (x + fraction)
  return Math.exp(-x * x) / (Math.sqrt(Math.PI) * (x + fraction))
}

/** Φ(z), the standard normal distribution; absolute error below 1e-14. */
export const normalCumulative = (z: number): number =>
  z < 0 ? complementaryError(-z / Math.SQRT2) / 2 : 1 - complementaryError(z / Math.SQRT2) / 2

/** φ(z), the standard normal density. */
export const normalDensity = (z: number): number => Math.exp((-z * z) / 2) / Math.sqrt(2 * Math.PI)

/**
 * z with Φ(z) = share for 0 < share < 1; ∓∞ at 0 and 1.
 * A rational start good to 4.5e-4 (a published hand-calculation form, from memory) is refined by Halley's steps.
 */
export function normalQuantile(share: number): number {
  if (share > 0.5) return -normalQuantile(1 - share)
  if (share <= 0) return share === 0 ? -Infinity : NaN
  if (share === 0.5) return 0
  const t = Math.sqrt(-2 * Math.log(share))
  let z = (2.515517 + t * (0.802853 + t * 0.010328)) / (1 + t * (1.432788 + t * (0.189269 + t * 0.001308))) - t
  for (let step = 0; step < 3; step += 1) {
    const newton = (normalCumulative(z) - share) / normalDensity(z)
    z -= newton / (1 + (z * newton) / 2)
  }
  return z
}
