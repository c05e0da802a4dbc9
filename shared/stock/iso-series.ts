import type { NamedSize } from '../template/template-model.ts'

/**
 * ISO 216 A, B and C sizes 0 to 10, long side first, in millimetres. Secondary source: tables that quote ISO 216, whose
 * single envelope sizes agree with readings of DIN 476 and DIN 678; the standard itself was not read.
 * A cut sheet may be 1.5 mm off up to 150 mm, 2 mm up to 600 mm and 3 mm above, so a size alone does not fix a fit.
 */
const series = {
  a: [
    [1189, 841],
    [841, 594],
    [594, 420],
    [420, 297],
    [297, 210],
    [210, 148],
    [148, 105],
    [105, 74],
    [74, 52],
    [52, 37],
    [37, 26],
  ],
  b: [
    [1414, 1000],
    [1000, 707],
    [707, 500],
    [500, 353],
    [353, 250],
    [250, 176],
    [176, 125],
    [125, 88],
    [88, 62],
    [62, 44],
    [44, 31],
  ],
  c: [
    [1297, 917],
    [917, 648],
    [648, 458],
    [458, 324],
    [324, 229],
    [229, 162],
    [162, 114],
    [114, 81],
    [81, 57],
    [57, 40],
    [40, 28],
  ],
} as const

export type IsoSeries = keyof typeof series

export const isoSeriesNames = ['a', 'b', 'c'] as const satisfies readonly IsoSeries[]

/** The smallest size of each series that the table holds. */
export const lastIsoNumber = 10

/** A size of a series by its number; `null` for a number it does not have. */
export function isoSize(name: IsoSeries, number: number): NamedSize | null {
  const row = series[name][number]
  return row === undefined ? null : { length: row[0], width: row[1] }
}
