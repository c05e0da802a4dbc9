/** A text with mistakes, each wrapped in « and », in the order of the file, and the codes that must be reported there. */
export interface MalformedCase {
  readonly says: string
  readonly text: string
  readonly codes: readonly string[]
  /** Words the first message or its hint must hold. */
  readonly words?: readonly string[]
  readonly as?: 'workspace'
}

export const malformed = (
  says: string,
  codes: string | readonly string[],
  text: string,
  ...words: string[]
): MalformedCase => ({
  says,
  codes: typeof codes === 'string' ? [codes] : codes,
  text,
  words,
})

const set = 'foldgauge: 1\nset: trial\nstocks: { smooth: { caliper: 0.3 mm }, thin: { caliper: 0.15 mm } }\n'

/** Pieces, written a line each, in an otherwise sound set. */
export const pieces = (...lines: readonly string[]): string =>
  `${set}pieces:\n${lines.map((line) => `  ${line}\n`).join('')}`

const soundPieces = [
  'card: { kind: card, stock: smooth, folded: 148 x 105 }',
  'cover: { kind: envelope, style: baronial, stock: thin, pocket: 156 x 112 }',
  'base: { kind: box, stock: smooth, blank: 200 x 158, wall: 20 }',
  'lid: { kind: lid, stock: smooth, blank: 190 x 149, wall: 14 }',
]

/** Further keys of a set whose pieces are sound: `card`, `cover`, `base` and `lid`. */
export const below = (...lines: readonly string[]): string =>
  pieces(...soundPieces) + lines.map((line) => `${line}\n`).join('')

/** Fits, written a line each, between those pieces. */
export const fits = (...lines: readonly string[]): string => below('fits:', ...lines.map((line) => `  ${line}`))

/** A stock's keys in an otherwise sound set. */
export const stock = (keys: string): string =>
  `foldgauge: 1\nset: trial\nstocks:\n  smooth: ${keys}\npieces:\n  card: { kind: card, stock: smooth, folded: 148 x 105 }\n`

/** A card's keys in an otherwise sound set. */
export const card = (keys: string): string => pieces(`card: { kind: card, stock: smooth, ${keys} }`)

/** A workspace. */
export const workspace = (...lines: readonly string[]): string =>
  `foldgauge: 1\n${lines.map((line) => `${line}\n`).join('')}`
