/** Area of a grade's basic size in square inches: common to the published tables (mills and equipment makers agree). */
export const basicSizeArea = {
  bond: 17 * 22,
  ledger: 17 * 22,
  writing: 17 * 22,
  text: 25 * 38,
  book: 25 * 38,
  offset: 25 * 38,
  cover: 20 * 26,
  index: 25.5 * 30.5,
  bristol: 22.5 * 28.5,
  tag: 24 * 36,
  newsprint: 24 * 36,
} as const

export type PaperGrade = keyof typeof basicSizeArea

/** Pounds per 500 basic sheets to g/m²: lb × 1406.139 ÷ area (derived: 453.59237 g × 1550.0031 in²/m² ÷ 500). */
export const basisWeightToGrammage = (pounds: number, grade: PaperGrade): number =>
  (pounds * ((453.59237 * (1_000_000 / 645.16)) / 500)) / basicSizeArea[grade]
