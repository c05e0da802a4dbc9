import { samePoint } from '../geometry/tolerance.ts'
import type { OpenCondition } from './condition.ts'
import { latticeStep, type LatticeSize, type LatticeStep } from './lattice.ts'
import { privatePartOf, sharedPartsOf, type SharedPart } from './shared-parts.ts'
import { lookUp, slices, tabulate, type Table } from './tabulate.ts'

/** Points worked on together, so that what they need stays in the processor's cache. */
const block = 256
/** Atoms that stand for the distribution of a shared part. */
const atoms = 1024
/** Steps of arithmetic that one integral may take: about a millisecond. */
const budget = 1_200_000

/**
 * How many points are worth it: few where the bounds 1 − Σ and 1 − the largest of the failing shares are close already,
 * more where they are cheap, and fewer for two or three conditions, which leave little to be smoothed (all as measured).
 */
function chooseSize(shared: readonly SharedPart[], conditions: readonly OpenCondition[]): LatticeSize {
  const fails = conditions.map((condition) => condition.fails)
  const apart = fails.reduce((sum, each) => sum + each, 0) - Math.max(...fails)
  if (apart < 0.03) return 2048
  const links = shared.reduce((sum, part) => sum + part.ratios.filter((ratio) => ratio !== 0).length, 0)
  const cost = 2 * shared.length + links + 6 * conditions.length
  if (conditions.length <= 3 || apart < 0.2 || 8192 * cost > budget) return 4096
  return 16384 * cost <= budget ? 16384 : 8192
}

/** Adds ratio·value to each sum. */
function addScaled(sums: Float64Array, values: Float64Array, ratio: number): void {
  for (let point = 0; point < block; point += 1) sums[point] = (sums[point] ?? 0) + ratio * (values[point] ?? 0)
}

/**
 * The values of a shared part at the points from `from` on. The lattice is folded at the middle of each coordinate,
 * which makes the integrand periodic; that is what a lattice integrates best (the baker's transformation, published).
 */
function fillValues(
  values: Float64Array,
  atom: Float64Array,
  { start, step }: LatticeStep,
  size: number,
  from: number,
): void {
  const mask = size - 1
  const perStep = (2 * atoms) / size
  let at = (start + from * step) & mask
  for (let point = 0; point < block; point += 1) {
    const folded = at * 2 < size ? at : mask - at
    values[point] = atom[((folded + 0.5) * perStep) | 0] ?? 0
    at = (at + step) & mask
  }
}

/** Shares of builds failing one condition, given what the shared parts leave: exact by what is private, else a step. */
function countFailing(left: Float64Array, table: Table | null, passes: Float64Array, fails: Float64Array): void {
  for (let point = 0; point < block; point += 1) {
    const margin = left[point] ?? 0
    const share = table === null ? (margin < -samePoint ? 1 : 0) : lookUp(table, -margin)
    passes[point] = (passes[point] ?? 0) * (1 - share)
    fails[point] = (fails[point] ?? 0) + share
  }
}

/** Running sums over all points for the means and the slope of the control. */
interface Sums {
  passes: number
  fails: number
  failsSquared: number
  products: number
}

function addUp(sums: Sums, passes: Float64Array, fails: Float64Array): void {
  let [sumPasses, sumFails, sumSquares, sumProducts] = [0, 0, 0, 0]
  for (let point = 0; point < block; point += 1) {
    const pass = passes[point] ?? 0
    const fail = fails[point] ?? 0
    sumPasses += pass
    sumFails += fail
    sumSquares += fail * fail
    sumProducts += fail * pass
  }
  sums.passes += sumPasses
  sums.fails += sumFails
  sums.failsSquared += sumSquares
  sums.products += sumProducts
}

/** What the points say about passing, corrected by how far they miss the known sum of the single failing shares. */
function correctedMean(sums: Sums, size: number, exactFails: number): number {
  const passes = sums.passes / size
  const fails = sums.fails / size
  const spread = sums.failsSquared / size - fails * fails
  const slope = spread > 1e-12 ? (sums.products / size - fails * passes) / spread : 0
  return passes + slope * (exactFails - fails)
}

/**
 * P(no condition fails), integrated over what conditions share by a lattice, exact in what they do not.
 *
 * The sum of the single failures is known exactly, so what the lattice gets wrong in that sum is taken out of the
 * result in proportion to how the two vary together (a control variate, published and common).
 */
export function integrateJoint(conditions: readonly OpenCondition[]): number {
  const shared = sharedPartsOf(conditions)
  const size = chooseSize(shared, conditions)
  const coordinates = shared.map(({ sum, ratios }, index) => {
    const table = tabulate(sum)
    return {
      ratios,
      step: latticeStep(size, index),
      atom: table === null ? new Float64Array(atoms) : slices(table, atoms),
    }
  })
  const columns = conditions.map((condition) => ({
    margin: condition.dimension.nominal - condition.atLeast,
    table: tabulate(privatePartOf(condition, shared)),
    left: new Float64Array(block),
  }))
  const [values, passes, fails] = [new Float64Array(block), new Float64Array(block), new Float64Array(block)]
  const sums: Sums = { passes: 0, fails: 0, failsSquared: 0, products: 0 }
  for (let from = 0; from < size; from += block) {
    for (const { left, margin } of columns) left.fill(margin)
    for (const { ratios, step, atom } of coordinates) {
      fillValues(values, atom, step, size, from)
      columns.forEach(({ left }, index) => {
        const ratio = ratios[index] ?? 0
        if (ratio !== 0) addScaled(left, values, ratio)
      })
    }
    passes.fill(1)
    fails.fill(0)
    for (const { left, table } of columns) countFailing(left, table, passes, fails)
    addUp(sums, passes, fails)
  }
  return correctedMean(
    sums,
    size,
    conditions.reduce((sum, condition) => sum + condition.fails, 0),
  )
}
