/*
 * The regularised incomplete gamma and beta functions, for the intervals of measured builds. No library at hand is small,
 * typed and kept up, and this is all that is needed. The expansions are textbook ones (series and continued fractions
 * evaluated by Lentz's method); the tests hold them to published tables.
 */

/** Coefficients of Lanczos's approximation of the gamma function, g = 7 (published; from memory, held by tests). */
const lanczos = [
  0.99999999999980993, 676.5203681218851, -1259.1392167224028, 771.32342877765313, -176.61502916214059,
  12.507343278686905, -0.13857109526572012, 9.9843695780195716e-6, 1.5056327351493116e-7,
]

/** Steps after which an expansion has converged for any degrees of freedom up to some thousands. */
const mostSteps = 10_000
const converged = 1e-15
const tiny = 1e-300

/** ln Γ(x) for x > 0, relative error below 1e-13. */
export function logGamma(x: number): number {
  if (x < 0.5) return Math.log(Math.PI / Math.sin(Math.PI * x)) - logGamma(1 - x)
  const base = x + 6.5
  let sum = lanczos[0] ?? 0
  for (let index = 1; index < lanczos.length; index += 1) sum += (lanczos[index] ?? 0) / (x - 1 + index)
  return Math.log(Math.sqrt(2 * Math.PI) * sum) + (x - 0.5) * Math.log(base) - base
}

/** Value of b₀ + a₁/(b₁ + a₂/(b₂ + …)) by Lentz's method. */
function continuedFraction(first: number, term: (step: number) => readonly [number, number]): number {
  let value = first === 0 ? tiny : first
  let upper = value
  let lower = 0
  for (let step = 1; step <= mostSteps; step += 1) {
    const [a, b] = term(step)
    lower = 1 / (b + a * lower || tiny)
    upper = b + a / upper || tiny
    const change = upper * lower
    value *= change
    if (Math.abs(change - 1) < converged) break
  }
  return value
}

/** P(a, x) = γ(a, x)/Γ(a) for a > 0, x ≥ 0. */
export function incompleteGamma(a: number, x: number): number {
  if (x <= 0) return 0
  const factor = Math.exp(a * Math.log(x) - x - logGamma(a))
  if (x < a + 1) {
    let term = 1 / a
    let sum = term
    for (let n = 1; n <= mostSteps && term > sum * converged; n += 1) {
      term *= x / (a + n)
      sum += term
    }
    return factor * sum
  }
  const fraction = continuedFraction(x + 1 - a, (step) => [-step * (step - a), x + 2 * step + 1 - a])
  return 1 - factor / fraction
}

/** I_x(a, b) for a, b > 0 and 0 ≤ x ≤ 1. */
export function incompleteBeta(a: number, b: number, x: number): number {
  if (x <= 0) return 0
  if (x >= 1) return 1
  if (x > (a + 1) / (a + b + 2)) return 1 - incompleteBeta(b, a, 1 - x)
  const factor = Math.exp(logGamma(a + b) - logGamma(a) - logGamma(b) + a * Math.log(x) + b * Math.log1p(-x))
  const fraction = continuedFraction(1, (step) => {
    const m = Math.floor(step / 2)
    const numerator =
      step % 2 === 0
        ? (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m))
        : (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1))
    return [numerator, 1]
  })
  return factor / (a * fraction)
}
