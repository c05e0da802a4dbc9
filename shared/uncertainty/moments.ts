import type { Dimension, Source } from './dimension.ts'

/** Half-width over standard deviation of each shape: GUM practice; the half-width of a normal source is three sigma. */
const perSigma = { uniform: Math.sqrt(3), triangular: Math.sqrt(6), normal: 3 } as const

const sigmaOf = (source: Source): number => (Math.abs(source.coefficient) * source.halfWidth) / perSigma[source.shape]

/** Ends of the worst case: nominal ± Σ|a|T; a normal source counts with three sigma. */
export function worstCase(dimension: Dimension): { readonly min: number; readonly max: number } {
  let reach = 0
  for (const source of dimension.sources) reach += Math.abs(source.coefficient) * source.halfWidth
  return { min: dimension.nominal - reach, max: dimension.nominal + reach }
}

export function variance(dimension: Dimension): number {
  let sum = 0
  for (const source of dimension.sources) sum += sigmaOf(source) ** 2
  return sum
}

export const sigma = (dimension: Dimension): number => Math.sqrt(variance(dimension))

/** Share of the variance each source causes, largest first; sources that vary nothing are left out. */
export function shares(dimension: Dimension): readonly { readonly name: string; readonly share: number }[] {
  const total = variance(dimension)
  if (total === 0) return []
  return dimension.sources
    .filter((source) => source.halfWidth !== 0)
    .map((source) => ({ name: source.name, share: sigmaOf(source) ** 2 / total }))
    .toSorted((a, b) => b.share - a.share)
}

/** How far the dimension moves per unit of a source; 0 where it does not depend on it. */
export const coefficientOf = (dimension: Dimension, name: string): number =>
  dimension.sources.find((source) => source.name === name)?.coefficient ?? 0
