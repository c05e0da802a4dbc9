import type { Condition } from './condition.ts'
import type { Dimension, Source } from './dimension.ts'
import { variance } from './moments.ts'

/** Ratios nearer than this are one ratio. */
const sameRatio = 1e-9

/**
 * Sources that several conditions share and that move them all in the same proportion: for the conditions they are one
 * source, distributed as their sum.
 */
export interface SharedPart {
  /** The sources with their coefficients in the first condition that has them. */
  readonly sum: Dimension
  /** Movement of each condition per movement of that sum, in the order of the conditions; zero where it has no part. */
  readonly ratios: readonly number[]
}

interface Use {
  readonly source: Source
  readonly coefficients: number[]
}

function usesOf(conditions: readonly Condition[]): readonly Use[] {
  const byName = new Map<string, Use>()
  conditions.forEach(({ dimension }, index) => {
    for (const source of dimension.sources) {
      if (source.halfWidth === 0) continue
      let use = byName.get(source.name)
      if (use === undefined) {
        use = { source, coefficients: conditions.map(() => 0) }
        byName.set(source.name, use)
      }
      use.coefficients[index] = source.coefficient
    }
  })
  return [...byName.values()].filter((use) => use.coefficients.filter((each) => each !== 0).length > 1)
}

const hasRatios = (one: readonly number[], other: readonly number[]): boolean =>
  one.every((ratio, index) => Math.abs(ratio - (other[index] ?? 0)) <= sameRatio)

/** Share of the conditions' variances that a part accounts for, added up over the conditions. */
function weightOf(part: SharedPart, variances: readonly number[]): number {
  const own = variance(part.sum)
  return part.ratios.reduce((sum, ratio, index) => sum + (ratio * ratio * own) / (variances[index] ?? 1), 0)
}

/** What conditions share, the weightiest part first. */
export function sharedPartsOf(conditions: readonly Condition[]): readonly SharedPart[] {
  const parts: { readonly sources: Source[]; readonly ratios: readonly number[] }[] = []
  for (const { source, coefficients } of usesOf(conditions)) {
    const first = coefficients.find((each) => each !== 0) ?? 1
    const ratios = coefficients.map((each) => each / first)
    const entry = { ...source, coefficient: first }
    const known = parts.find((part) => hasRatios(part.ratios, ratios))
    if (known === undefined) parts.push({ sources: [entry], ratios })
    else known.sources.push(entry)
  }
  const variances = conditions.map((condition) => variance(condition.dimension))
  return parts
    .map(({ sources, ratios }) => ({ sum: { nominal: 0, sources }, ratios }))
    .map((part) => ({ part, weight: weightOf(part, variances) }))
    .toSorted((a, b) => b.weight - a.weight)
    .map(({ part }) => part)
}

/** What only one condition has, about zero. */
export function privatePartOf(condition: Condition, shared: readonly SharedPart[]): Dimension {
  const names = new Set(shared.flatMap((part) => part.sum.sources.map((source) => source.name)))
  return { nominal: 0, sources: condition.dimension.sources.filter((source) => !names.has(source.name)) }
}
