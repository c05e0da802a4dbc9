import type { JudgedFit } from '../assembly/judge-fit.ts'
import type { JudgedSet } from '../assembly/judge-set.ts'
import type { AxisName } from '../report/report.ts'
import { formatLength, formatSize } from '../units/format-length.ts'

/** A length in the units of the set, with decimals enough to tell numbers apart. */
export const inSetUnits = (judged: JudgedSet, mm: number): string => formatLength(mm, judged.set.tokens.units)

/** A size in the units of the set: `200 x 158 mm`. */
export const sizeInSetUnits = (judged: JudgedSet, sizes: readonly number[]): string =>
  formatSize(sizes, judged.set.tokens.units)

/** Things in a sentence: `a`, `a and b`, `a, b and c`; beyond `most` only how many more there are. */
export function listInWords(things: readonly string[], most = things.length): string {
  const shown = things.length > most ? things.slice(0, most) : things
  const rest = things.length - shown.length
  const all = rest > 0 ? [...shown, `${String(rest)} more`] : shown
  const last = all.at(-1) ?? ''
  return all.length < 2 ? last : `${all.slice(0, -1).join(', ')} and ${last}`
}

/** What is put, in the author's nouns: `lid`, `6 envelope with card`, `4 card and 4 envelope`. */
export function putInWords(judged: JudgedFit): string {
  const { fit } = judged
  const parts = fit.put.map(({ count, piece }) =>
    count * fit.count > 1 || fit.isStack ? `${String(count * fit.count)} ${piece}` : piece,
  )
  const stack = listInWords(parts)
  return fit.holding === null ? stack : `${stack} with ${fit.holding}`
}

const preposition = { in: 'in', over: 'on', around: 'around' } as const

/** A fit in the author's nouns: `lid on base`, `6 envelope with card in base`; `does` says what goes on there. */
export const fitInWords = (judged: JudgedFit, does?: string): string =>
  `${putInWords(judged)} ${does === undefined ? '' : `${does} `}${preposition[judged.fit.relation]} ${judged.fit.to}`

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

/** A share as people say it: half-widths are guesses, so nothing finer than one build in twenty. */
export function aboutInWords(share: number): string {
  if (share > 0.995) return 'nearly all'
  const twentieths = Math.round(share * 20)
  return twentieths < 1 ? 'hardly any' : `about ${String(Math.min(19, twentieths))} in 20`
}

/** `home-made`, `studio-made`: whose hands a share speaks of. */
export const madeBy = (judged: JudgedSet, fit: JudgedFit): string =>
  `${judged.options.workmanship ?? fit.fit.workmanship ?? judged.workmanship}-made`
