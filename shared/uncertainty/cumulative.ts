import { normalCumulative } from './normal.ts'
import { normalReach, type Spread } from './spread.ts'

/** Truncation of the Fourier series: what its tail can add to a probability. */
const tailError = 1e-7
/** Only a stop for the loop: a few dozen terms are usual. */
const mostTerms = 4096

/** The part of a sum that is expanded in a series, after the widest uniforms have been taken out. */
interface Remainder {
  readonly widths: readonly number[]
  readonly sigma: number
  /** Farthest it reaches; zero where nothing remains. */
  readonly reach: number
  readonly variance: number
}

function remainderOf(spread: Spread, taken: number): Remainder {
  const widths = spread.widths.slice(taken)
  let reach = normalReach * spread.sigma
  let variance = spread.sigma ** 2
  for (const width of widths) {
    reach += width
    variance += (width * width) / 3
  }
  return { widths, sigma: spread.sigma, reach, variance }
}

/**
 * Coefficients φ(ω)/(πkωʲ) for ω = πk/reach, k = 1, 2, …, with φ the characteristic function of the remainder: a product of sin(rω)/(rω) and
 * a Gaussian. They are taken until the rest is below `tailError`: beyond a term no factor exceeds min(1, 1/(rω)), and
 * the Gaussian falls at least as the power ω^(−σ²ω²), so Σ of the rest ≤ bound · ω^(−j) / (π Πa · (j + powers)) (derived).
 */
function seriesOf(rest: Remainder, taken: readonly number[]): readonly number[] {
  const order = taken.length
  const step = Math.PI / rest.reach
  const spread = taken.reduce((product, width) => product * width, Math.PI)
  const count = rest.widths.length
  const angles = new Float64Array(count)
  const twiceCosines = new Float64Array(count)
  const sines = new Float64Array(count)
  const previousSines = new Float64Array(count)
  rest.widths.forEach((width, index) => {
    angles[index] = width * step
    twiceCosines[index] = 2 * Math.cos(width * step)
    sines[index] = Math.sin(width * step)
  })
  const series: number[] = []
  for (let k = 1; k <= mostTerms; k += 1) {
    const gaussianAt = (k * step * rest.sigma) ** 2
    const gaussian = rest.sigma === 0 ? 1 : Math.exp(-gaussianAt / 2)
    let value = gaussian
    let bound = gaussian
    let powers = order + gaussianAt
    for (let index = 0; index < count; index += 1) {
      const angle = k * (angles[index] ?? 0)
      const sine = sines[index] ?? 0
      value *= sine / angle
      if (angle > 1) {
        bound /= angle
        powers += 1
      }
      sines[index] = (twiceCosines[index] ?? 0) * sine - (previousSines[index] ?? 0)
      previousSines[index] = sine
    }
    const power = order === 0 ? 1 : order === 1 ? k * step : (k * step) ** 2
    series.push(value / (Math.PI * k * power))
    if (bound <= tailError * spread * power * powers) break
  }
  return series
}

/** Σ of coefficients times cos(kθ) (`isEven`) or sin(kθ), by the recurrence of multiples of an angle. */
function sumSeries(series: readonly number[], angle: number, isEven: boolean): number {
  const cosine = Math.cos(angle)
  let previous = isEven ? 1 : 0
  let current = isEven ? cosine : Math.sin(angle)
  let sum = 0
  for (const coefficient of series) {
    sum += coefficient * current
    const next = 2 * cosine * current - previous
    previous = current
    current = next
  }
  return sum
}

/**
 * The distribution of the remainder integrated j = `order` times from far below: E[(y − R)₊ʲ]/j!.
 * Inside its reach L it is the j-fold integral of F(y) = (y + L)/2L + Σ φ/(πk)·sin(ωy), constants fixed by symmetry
 * and by the moments of R at y = L (derived).
 */
function integralOf(rest: Remainder, taken: readonly number[]): (y: number) => number {
  const { reach, variance } = rest
  const order = taken.length
  const series = reach === 0 ? [] : seriesOf(rest, taken)
  return (y) => {
    if (y <= -reach) return 0
    if (y >= reach) return order === 0 ? 1 : order === 1 ? y : (y * y + variance) / 2
    const sum = sumSeries(series, (Math.PI * y) / reach, order === 1)
    if (order === 0) return (y + reach) / (2 * reach) + sum
    const linear = reach / 6 + variance / (4 * reach)
    if (order === 1) return (y * y) / (4 * reach) + y / 2 + linear - sum
    return y ** 3 / (12 * reach) + (y * y + variance) / 4 + linear * y - sum
  }
}

/** Lower half of the distribution: P(sum < x) for x ≤ 0. */
function lowerHalf(spread: Spread): (x: number) => number {
  if (spread.widths.length === 0 && spread.sigma > 0) return (x) => normalCumulative(x / spread.sigma)
  const taken = spread.widths.slice(0, 2).filter((width) => width >= spread.sigma)
  const integral = integralOf(remainderOf(spread, taken.length), taken)
  const [a, b] = taken
  if (a === undefined) return integral
  if (b === undefined) return (x) => (integral(x + a) - integral(x - a)) / (2 * a)
  return (x) => (integral(x + a + b) - integral(x + a - b) - integral(x - a + b) + integral(x - a - b)) / (4 * a * b)
}

/**
 * P(sum < x) of independent uniforms and a normal about zero, as a function of x; the spread must not be empty.
 *
 * The up to two widest uniforms are taken out and put back in closed form, as first and second differences of what
 * remains, so that a sum ruled by one or two parts needs no more terms than any other; what remains is a Fourier series
 * on its bounded support. Without a remainder that is the closed form of one or two uniforms. Derived; the exact sum of
 * uniforms (generalised Irwin–Hall) is the oracle of the tests. Absolute error below 1e-6.
 */
export function cumulativeOf(spread: Spread): (x: number) => number {
  const lower = lowerHalf(spread)
  return (x) => {
    const tail = Math.min(0.5, Math.max(0, lower(-Math.abs(x))))
    return x > 0 ? 1 - tail : tail
  }
}
