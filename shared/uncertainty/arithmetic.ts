import type { Dimension, Source, SourceShape } from './dimension.ts'

/** Coefficients below this are what is left when a shared source cancels. */
const cancelled = 1e-12

/** A dimension that does not vary. */
export const constant = (nominal: number): Dimension => ({ nominal, sources: [] })

/** One named source with its coefficient and half-width. */
export const source = (
  name: string,
  coefficient: number,
  halfWidth: number,
  shape: SourceShape = 'uniform',
): Source => ({
  name,
  coefficient,
  halfWidth,
  shape,
})

const times = (of: Source, factor: number): Source =>
  factor === 1 ? of : { name: of.name, coefficient: of.coefficient * factor, halfWidth: of.halfWidth, shape: of.shape }

const describe = ({ shape, halfWidth }: Source): string => `${shape} ±${String(halfWidth)}`

/** Adds a source to a list in which every name stands once. @throws where the same name carries another half-width or shape */
function collect(into: Source[], next: Source, factor: number): void {
  for (let index = 0; index < into.length; index += 1) {
    const known = into[index]
    if (known === undefined || known.name !== next.name) continue
    if (known.shape !== next.shape || Math.abs(known.halfWidth - next.halfWidth) > 1e-9) {
      throw new Error(
        `source ${next.name} is given as ${describe(known)} and as ${describe(next)}; one name is one source`,
      )
    }
    into[index] = {
      name: known.name,
      coefficient: known.coefficient + next.coefficient * factor,
      halfWidth: known.halfWidth,
      shape: known.shape,
    }
    return
  }
  into.push(times(next, factor))
}

const alive = (sources: readonly Source[]): readonly Source[] =>
  sources.some((entry) => Math.abs(entry.coefficient) < cancelled)
    ? sources.filter((entry) => Math.abs(entry.coefficient) >= cancelled)
    : sources

/** A nominal value with its sources; sources of one name are added up. */
export function dimension(nominal: number, sources: readonly Source[]): Dimension {
  const merged: Source[] = []
  for (const entry of sources) collect(merged, entry, 1)
  return { nominal, sources: alive(merged) }
}

const firstOf = (term: Dimension, factor: number): Source[] => {
  const merged: Source[] = []
  for (const entry of term.sources) merged.push(times(entry, factor))
  return merged
}

/** Adds a dimension times a factor to a list of sources. */
function collectAll(into: Source[], term: Dimension, factor: number): void {
  for (const entry of term.sources) collect(into, entry, factor)
}

/** Sum of dimensions; sources of one name are added up. */
export function add(...dimensions: readonly Dimension[]): Dimension {
  let merged: Source[] | null = null
  let nominal = 0
  for (const term of dimensions) {
    nominal += term.nominal
    if (merged === null) merged = firstOf(term, 1)
    else collectAll(merged, term, 1)
  }
  return { nominal, sources: alive(merged ?? []) }
}

/** Two dimensions times a factor each, and a constant; what they share adds up or cancels by name. */
function combine(a: Dimension, factorA: number, b: Dimension, factorB: number, constantPart = 0): Dimension {
  const merged = firstOf(a, factorA)
  collectAll(merged, b, factorB)
  return { nominal: constantPart + a.nominal * factorA + b.nominal * factorB, sources: alive(merged) }
}

/** One dimension less another; what they share cancels as far as their coefficients agree. */
export const subtract = (from: Dimension, less: Dimension): Dimension => combine(from, 1, less, -1)

/** A dimension times a number. */
export const scale = (of: Dimension, factor: number): Dimension => ({
  // Adding nothing turns the minus zero of −2 × 0 into zero.
  nominal: 0 + of.nominal * factor,
  sources: alive(firstOf(of, factor)),
})

/** The same dimension with its nominal moved. */
export const shift = (of: Dimension, by: number): Dimension => ({ nominal: of.nominal + by, sources: of.sources })

/** Product of two dimensions, linearised at the nominal: what is of second order in the sources is left out. */
export const multiply = (a: Dimension, b: Dimension): Dimension =>
  combine(a, b.nominal, b, a.nominal, -a.nominal * b.nominal)

/** A function of one dimension, linearised: its value at the nominal and its derivative there. */
export const apply = (of: Dimension, value: number, derivative: number): Dimension => ({
  nominal: value - of.nominal * derivative + of.nominal * derivative,
  sources: alive(firstOf(of, derivative)),
})

/** The nominally larger of two, with its sources; the first where they are equal. */
export const larger = (a: Dimension, b: Dimension): Dimension => (b.nominal > a.nominal ? b : a)

/** The nominally smaller of two, with its sources; the first where they are equal. */
export const smaller = (a: Dimension, b: Dimension): Dimension => (b.nominal < a.nominal ? b : a)

/** The same dimension with the half-widths of some sources scaled. */
export const withScaledHalfWidths = (
  of: Dimension,
  factor: number,
  isScaled: (name: string) => boolean,
): Dimension => ({
  nominal: of.nominal,
  sources: of.sources.map((entry) =>
    isScaled(entry.name) ? { ...entry, halfWidth: entry.halfWidth * factor } : entry,
  ),
})
