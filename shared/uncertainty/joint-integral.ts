import type { Condition } from './joint.ts'
import { latticeStep, type LatticeSize } from './lattice.ts'
import { privatePartOf, sharedPartsOf, type SharedPart } from './shared-parts.ts'
import { lookUp, slices, tabulate, type Table } from './tabulate.ts'
import { samePoint } from '../geometry/tolerance.ts'

/** A condition with the share of builds that fail it. */
export interface OpenCondition extends Condition {
  readonly fails: number
}

/** Points worked on together, so that what they need stays in the processor's cache. */
const block = 256
/** Atoms that stand for the distribution of a shared part. */
const atoms = 1024
/** Steps of arithmetic that one integral may take: about a millisecond. */
const budget = 1_200_000

/** More points where they are cheap; two or three conditions leave little to be smoothed and need fewer. */
function chooseSize(shared: readonly SharedPart[], conditions: number): LatticeSize {
  const links = shared.reduce((sum, part) => sum + part.ratios.filter((ratio) => ratio !== 0).length, 0)
  const cost = 2 * shared.length + links + 6 * conditions
  if (conditions <= 3) return 4096 * cost <= budget ? 4096 : 2048
  if (16384 * cost <= budget) return 16384
  if (8192 * cost <= budget) return 8192
  return 4096 * cost <= 2 * budget ? 4096 : 2048
}

/** Adds ratio·value to each sum. */
function addScaled(sums: Float64Array, values: Float64Array, ratio: number): void {
  for (let index = 0; index < block; index += 1) sums[index] = (sums[index] ?? 0) + ratio * (values[index] ?? 0)
}

/**
 * The values of a shared part at the points from `from` on. The lattice is folded at the middle of each coordinate, which makes the integrand periodic; that is what
 * a lattice integrates best (the baker's transformation, published).
 */
function fillValues(
  values: Float64Array,
  from: number,
  size: LatticeSize,
  coordinate: number,
  atom: Float64Array,
): void {
  const { start, step } = latticeStep(size, coordinate)
  const mask = size - 1
  const perStep = (2 * atoms) / size
  let at = (start + from * step) & mask
  for (let index = 0; index < block; index += 1) {
    const folded = at < size / 2 ? at : mask - at
    values[index] = atom[Math.floor((folded + 0.5) * perStep)] ?? 0
    at = (at + step) & mask
  }
}

/** Share of builds failing, given how much the shared parts leave: exact by what is private, else a step. */
const failing = (table: Table | null, left: number): number =>
  table === null ? (left < -samePoint ? 1 : 0) : lookUp(table, -left)

/**
 * P(no condition fails), integrated over what conditions share by a lattice, exact in what they do not.
 *
 * The sum of the single failures is known exactly, so what the lattice gets wrong in that sum is taken out of the
 * result in proportion to how the two vary together (a control variate, published and common).
 */
export function integrateJoint(conditions: readonly OpenCondition[]): number {
  const shared = sharedPartsOf(conditions)
  const size = chooseSize(shared, conditions.length)
  const atomsOf = shared.map((part) => {
    const table = tabulate(part.sum)
    return table === null ? new Float64Array(atoms) : slices(table, atoms)
  })
  const privateTables = conditions.map((condition) => tabulate(privatePartOf(condition, shared)))
  const values = new Float64Array(block)
  const left = conditions.map(() => new Float64Array(block))
  let [sumPasses, sumFails, sumFailsSquared, sumProducts] = [0, 0, 0, 0]
  for (let from = 0; from < size; from += block) {
    conditions.forEach((condition, index) => left[index]?.fill(condition.dimension.nominal - condition.atLeast))
    shared.forEach((part, coordinate) => {
      fillValues(values, from, size, coordinate, atomsOf[coordinate] ?? values)
      part.ratios.forEach((ratio, index) => {
        const sums = left[index]
        if (ratio !== 0 && sums !== undefined) addScaled(sums, values, ratio)
      })
    })
    for (let point = 0; point < block; point += 1) {
      let passes = 1
      let fails = 0
      for (let index = 0; index < conditions.length; index += 1) {
        const share = failing(privateTables[index] ?? null, left[index]?.[point] ?? 0)
        passes *= 1 - share
        fails += share
      }
      sumPasses += passes
      sumFails += fails
      sumFailsSquared += fails * fails
      sumProducts += fails * passes
    }
  }
  const [passes, fails] = [sumPasses / size, sumFails / size]
  const varies = sumFailsSquared / size - fails * fails
  const slope = varies > 1e-12 ? (sumProducts / size - fails * passes) / varies : 0
  const exactFails = conditions.reduce((sum, condition) => sum + condition.fails, 0)
  return passes + slope * (exactFails - fails)
}
