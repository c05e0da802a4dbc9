import type { Dimension } from '../uncertainty/dimension.ts'
import { sigma, worstCase } from '../uncertainty/moments.ts'
import type { Quantity } from './report.ts'

/** A dimension as reported: marks, which vary nothing, are left out. */
export function quantityOf(dimension: Dimension): Quantity {
  const { min, max } = worstCase(dimension)
  return {
    nominal: dimension.nominal,
    min,
    max,
    sigma: sigma(dimension),
    sources: dimension.sources
      .filter((source) => source.halfWidth !== 0)
      .map((source) => ({ name: source.name, effect: source.coefficient * source.halfWidth, shape: source.shape })),
  }
}

/**
 * A reported quantity as a dimension again, for mating pieces of two reports. Effects become coefficients over
 * half-widths of one, so that the same source in two reports is one source only where its half-width is the same.
 */
export function dimensionOf(quantity: Quantity): Dimension {
  return {
    nominal: quantity.nominal,
    sources: quantity.sources.map((source) => ({
      name: source.name,
      coefficient: source.effect,
      halfWidth: 1,
      shape: source.shape,
    })),
  }
}
