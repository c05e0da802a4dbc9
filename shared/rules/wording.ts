import type { JudgedFit } from '../assembly/judge-fit.ts'
import type { JudgedSet } from '../assembly/judge-set.ts'
import type { AxisName } from '../report/report.ts'
import { formatLength } from '../units/format-length.ts'

/** A length in the units of the set, with decimals enough to tell numbers apart. */
export const inSetUnits = (judged: JudgedSet, mm: number): string => formatLength(mm, judged.set.tokens.units)

/** What is put, in the author's nouns: `lid`, `6 envelope with card`, `4 card and 4 envelope`. */
export function putInWords(judged: JudgedFit): string {
  const { fit } = judged
  const parts = fit.put.map(({ count, piece }) => (count * fit.count > 1 || fit.isStack ? `${String(count * fit.count)} ${piece}` : piece))
  const stack = parts.join(' and ')
  return fit.holding === null ? stack : `${stack} with ${fit.holding}`
}

/** Where along the pieces an axis lies. */
export function acrossInWords(axis: AxisName): string {
  switch (axis) {
    case 'length':
      return 'along the length'
    case 'width':
      return 'across the width'
    case 'depth':
      return 'in the depth'
    case 'headspace':
      return 'in the headspace'
    case 'overlap':
      return 'in the overlap'
  }
}

/** A share as builds out of a hundred; never rounded to none or all where some are left. */
export function outOfHundred(share: number): string {
  const builds = share * 100
  if (builds <= 0.005) return '0'
  if (builds < 0.95) return 'fewer than 1'
  if (builds > 99 && builds < 99.995) return 'more than 99'
  return String(Math.round(builds))
}

/** `home-made`, `studio-made`: whose hands a share speaks of. */
export const madeBy = (judged: JudgedSet, fit: JudgedFit): string =>
  `${judged.options.workmanship ?? fit.fit.workmanship ?? judged.workmanship}-made`
