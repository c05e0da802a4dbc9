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

/** Σ of dimensions times factors, coefficients added by source name. */
function combine(terms: readonly (readonly [Dimension, number])[], constantPart = 0): Dimension {
  let merged: Source[] | null = null
  let nominal = constantPart
  for (const [term, factor] of terms) {
    nominal += term.nominal * factor
    if (merged === null) merged = term.sources.map((entry) => times(entry, factor))
    else for (const entry of term.sources) collect(merged, entry, factor)
  }
  return { nominal, sources: alive(merged ?? []) }
}

/** Sum of dimensions; sources of one name are added up. */
export const add = (...dimensions: readonly Dimension[]): Dimension =>
  combine(dimensions.map((term) => [term, 1] as const))

/** One dimension less another; what they share cancels as far as their coefficients agree. */
export const subtract = (from: Dimension, less: Dimension): Dimension =>
  combine([
    [from, 1],
    [less, -1],
  ])

/** A dimension times a number. */
export const scale = (of: Dimension, factor: number): Dimension => combine([[of, factor]])

/** The same dimension with its nominal moved. */
export const shift = (of: Dimension, by: number): Dimension => ({ nominal: of.nominal + by, sources: of.sources })

/** Product of two dimensions, linearised at the nominal: what is of second order in the sources is left out. */
export const multiply = (a: Dimension, b: Dimension): Dimension =>
  combine(
    [
      [a, b.nominal],
      [b, a.nominal],
    ],
    -a.nominal * b.nominal,
  )

/** A function of one dimension, linearised: its value at the nominal and its derivative there. */
export const apply = (of: Dimension, value: number, derivative: number): Dimension =>
  combine([[of, derivative]], value - of.nominal * derivative)

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
