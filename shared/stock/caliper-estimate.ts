/** Density assumed where only the weight is known, g/cm³: from memory; weight does not determine thickness. */
export const assumedDensity = 0.8

/** Spread of a caliper estimated from the weight: guess, half of what published tables of one weight show. */
export const estimatedCaliperShare = 0.15

/** Spread of a given caliper without its own tolerance: ±10 % up to 300 g/m², ±5 % above (published: a conservation board maker). */
export const defaultCaliperShare = (grammage: number | null): number =>
  grammage !== null && grammage > 300 ? 0.05 : 0.1

/** Caliper in millimetres estimated from g/m²: grammage ÷ density ÷ 1000. */
export const estimateCaliper = (grammage: number): number => grammage / assumedDensity / 1000

/** Apparent density in g/cm³: grammage divided by thickness, as ISO 534 defines it. */
export const apparentDensity = (grammage: number, caliper: number): number => grammage / caliper / 1000
