import { sameLength } from '../../units/epsilon.ts'
import type { Rectangle } from './sheet-of.ts'

/** Sums of sides up to a length: the only places at which a cut need be tried (normal positions). */
function positions(a: number, b: number, most: number): readonly number[] {
  const all: number[] = []
  for (let i = 0; i * a <= most + sameLength; i += 1)
    for (let j = 0; i * a + j * b <= most + sameLength; j += 1) all.push(i * a + j * b)
  all.sort((x, y) => x - y)
  return all.filter((value, index) => index === 0 || value - (all[index - 1] ?? 0) > sameLength)
}

/** Index of the largest position that is not beyond a length. */
function floorIndex(of: readonly number[], length: number): number {
  let low = 0
  let high = of.length - 1
  while (low < high) {
    const middle = (low + high + 1) >> 1
    if ((of[middle] ?? 0) <= length + sameLength) low = middle
    else high = middle - 1
  }
  return low
}

/** For each pair of positions, the index of what is left when the second is cut off the first. */
const remainders = (of: readonly number[]): readonly (readonly number[])[] =>
  of.map((length, index) => of.slice(0, index + 1).map((cut) => floorIndex(of, length - cut)))

interface Table {
  readonly xs: readonly number[]
  readonly ys: readonly number[]
  /** Most pieces out of xs[i] × ys[j] by cuts from edge to edge. */
  readonly counts: readonly (readonly number[])[]
}

/** Best number by guillotine for every rectangle of normal positions. @see physics J (equals exhaustive search in trials) */
function guillotineTable(piece: Rectangle, long: number, short: number): Table {
  const xs = positions(piece.length, piece.width, long)
  const ys = positions(piece.length, piece.width, short)
  const restX = remainders(xs)
  const restY = remainders(ys)
  const counts = xs.map(() => ys.map(() => 0))
  for (let i = 0; i < xs.length; i += 1) {
    for (let j = 0; j < ys.length; j += 1) {
      const x = (xs[i] ?? 0) + sameLength
      const y = (ys[j] ?? 0) + sameLength
      const isOne = Math.max(x, y) >= piece.length && Math.min(x, y) >= piece.width
      let best = isOne ? 1 : 0
      for (let k = 1; k <= i && 2 * (xs[k] ?? 0) <= x; k += 1)
        best = Math.max(best, (counts[k]?.[j] ?? 0) + (counts[restX[i]?.[k] ?? 0]?.[j] ?? 0))
      for (let k = 1; k <= j && 2 * (ys[k] ?? 0) <= y; k += 1)
        best = Math.max(best, (counts[i]?.[k] ?? 0) + (counts[i]?.[restY[j]?.[k] ?? 0] ?? 0))
      const row = counts[i]
      if (row !== undefined) row[j] = best
    }
  }
  return { xs, ys, counts }
}

/** Four blocks turned round a fifth in the middle, which no cut from edge to edge can make. */
function pinwheel({ xs, ys, counts }: Table, long: number, short: number, enough: number): number {
  const at = (x: number, y: number): number => counts[floorIndex(xs, x)]?.[floorIndex(ys, y)] ?? 0
  let best = 0
  for (let i = 1; i < xs.length; i += 1) {
    for (let j = i + 1; j < xs.length; j += 1) {
      const left = xs[i] ?? 0
      const right = xs[j] ?? 0
      for (let k = 1; k < ys.length; k += 1) {
        const low = ys[k] ?? 0
        const below = at(long - left, low)
        for (let l = k + 1; l < ys.length; l += 1) {
          const high = ys[l] ?? 0
          best = Math.max(
            best,
            below +
              (counts[i]?.[l] ?? 0) +
              at(right, short - high) +
              at(long - right, short - low) +
              at(right - left, high - low),
          )
          if (best >= enough) return best
        }
      }
    }
  }
  return best
}

/** Strips of pieces laid one way, the rest the other way: what a stack cutter does without a search. */
function inTwoStages(piece: Rectangle, long: number, short: number): number {
  const { length: a, width: b } = piece
  const strips = (along: number, across: number): number => {
    let best = 0
    for (let count = 0; count * a <= along + sameLength; count += 1) {
      const rest = Math.floor((along - count * a) / b + 1e-9)
      best = Math.max(best, count * Math.floor(across / b + 1e-9) + rest * Math.floor(across / a + 1e-9))
    }
    return best
  }
  return Math.max(strips(long, short), strips(short, long))
}

export interface NumberUp {
  /** By cuts from edge to edge. */
  readonly guillotine: number
  /** By knife, which may leave a block in the middle; never fewer. */
  readonly knife: number
  /** Whether the best way was searched for, or the best in two stages taken. */
  readonly isSearched: boolean
}

/** Most pieces by area up to which a way is looked for. */
export interface Effort {
  readonly guillotine: number
  readonly knife: number
}

/**
 * How many pieces a sheet yields, each turned as suits.
 * @param effort how far the best way is searched for
 * @see physics J (derived; a 5 × 7 in piece on 12 × 12 in: guillotine 3, knife 4)
 */
export function numberUp(piece: Rectangle, sheet: Rectangle, effort: Effort): NumberUp {
  const long = Math.max(sheet.length, sheet.width)
  const short = Math.min(sheet.length, sheet.width)
  const byArea = Math.floor((long * short) / (piece.length * piece.width) + 1e-9)
  if (byArea > effort.guillotine) {
    const count = inTwoStages(piece, long, short)
    return { guillotine: count, knife: count, isSearched: false }
  }
  const table = guillotineTable(piece, long, short)
  const guillotine = table.counts.at(-1)?.at(-1) ?? 0
  const isSettled = guillotine >= byArea || byArea > effort.knife
  const knife = isSettled ? guillotine : Math.max(guillotine, pinwheel(table, long, short, byArea))
  return { guillotine, knife, isSearched: true }
}
