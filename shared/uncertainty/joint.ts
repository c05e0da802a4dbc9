import type { Condition, OpenCondition } from './condition.ts'
import type { Dimension } from './dimension.ts'
import { distributionOf } from './distribution.ts'
import { integrateJoint } from './joint-integral.ts'

/** Failing shares below this are nothing. */
const negligible = 1e-7
/** What may be added or left out without working it out: half of it is the largest error from that. */
const closeEnough = 1e-4
/** Coefficients that agree this well in proportion are the same form. */
const sameForm = 1e-9

/** Order that does not depend on how the conditions were listed. */
function compareConditions(a: OpenCondition, b: OpenCondition): number {
  if (Math.abs(a.fails - b.fails) > 1e-12) return b.fails - a.fails
  const [one, other] = [namesOf(a), namesOf(b)]
  return one < other ? -1 : one > other ? 1 : 0
}

const namesOf = ({ dimension }: OpenCondition): string =>
  dimension.sources
    .map((source) => `${source.name} ${source.coefficient.toFixed(9)}`)
    .toSorted()
    .join()

/** True where two dimensions move together in every build, in a fixed positive proportion. */
function moveAsOne(a: Dimension, b: Dimension): boolean {
  const ofA = a.sources.filter((source) => source.halfWidth !== 0)
  const ofB = b.sources.filter((source) => source.halfWidth !== 0)
  if (ofA.length !== ofB.length) return false
  let proportion: number | null = null
  return ofA.every((source) => {
    const twin = ofB.find((entry) => entry.name === source.name)
    if (twin === undefined) return false
    const ratio = twin.coefficient / source.coefficient
    proportion ??= ratio
    return ratio > 0 && Math.abs(ratio - proportion) <= sameForm * proportion
  })
}

/** Keeps the harder of conditions that move as one; the list has the hardest first. */
function withoutTwins(conditions: readonly OpenCondition[]): readonly OpenCondition[] {
  const kept: OpenCondition[] = []
  for (const condition of conditions)
    if (!kept.some((other) => moveAsOne(other.dimension, condition.dimension))) kept.push(condition)
  return kept
}

/**
 * Leaves the rarest failures out as long as they come to less than `closeEnough` together.
 * @returns the others, and half of what was left out, to be taken off: that is off by no more than the other half
 */
function withoutRarest(conditions: readonly OpenCondition[]): readonly [readonly OpenCondition[], number] {
  let left = 0
  let count = conditions.length
  for (let rarest = conditions[count - 1]; rarest !== undefined; rarest = conditions[count - 1]) {
    if (left + rarest.fails > closeEnough) break
    left += rarest.fails
    count -= 1
  }
  return [conditions.slice(0, count), left / 2]
}

/**
 * P(every dimension is at least so much), where sources of one name are the same chance in all of them.
 *
 * Certain conditions drop out, of those that move as one the hardest counts, the rarest failures are bounded; one left
 * is exact. Otherwise what conditions share is integrated over a lattice of points and what they do not is exact.
 * Measured against long quasi-random integrations: within 1e-3 for sets as sets are (ten clearances of pieces in one
 * another) of which nine in ten work, 1.5e-3 where only half do, and up to 6e-3 where ten conditions share twenty
 * sources and none has one of its own. Deterministic, and no matter in which order; always within 1 − Σ of the failing shares and 1 − the largest.
 */
export function jointProbability(conditions: readonly Condition[]): number {
  const open: OpenCondition[] = []
  for (const { dimension, atLeast } of conditions) {
    const fails = distributionOf(dimension).below(atLeast)
    if (fails >= 1) return 0
    if (fails > negligible) open.push({ dimension, atLeast, fails })
  }
  const distinct = withoutTwins(open.toSorted(compareConditions))
  const most = distinct[0]?.fails ?? 0
  const all = distinct.reduce((sum, condition) => sum + condition.fails, 0)
  const [counted, off] = withoutRarest(distinct)
  const joint = counted.length > 1 ? integrateJoint(counted) : 1 - (counted[0]?.fails ?? 0)
  return Math.min(1 - most, Math.max(0, 1 - all, joint - off))
}
