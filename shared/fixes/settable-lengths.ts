import type { PieceGiven } from '../pieces/given.ts'
import type { BoxGiven } from '../pieces/box/box-given.ts'
import type { EnvelopeGiven } from '../pieces/envelope/envelope-given.ts'
import type { Millimetres } from '../units/units.ts'

/** One length of a piece that its author could move, and the piece with it moved. */
export interface SettableLength {
  readonly piece: string
  /** Keys of the value that holds it. */
  readonly path: readonly (string | number)[]
  readonly value: Millimetres
  readonly grid: 'cut' | 'score'
  with(value: Millimetres): PieceGiven
  /** Lengths that the value at `path` lists when this one is moved, in the order they are written. */
  listed(value: Millimetres): readonly Millimetres[]
  /** What to do, for a sentence: `score lid` with `shallower` or `deeper`. */
  readonly words: { readonly verb: string; readonly more: string; readonly less: string }
}

type Pair = { readonly length: Millimetres; readonly width: Millimetres }

const sideWords = { length: { more: 'longer', less: 'shorter' }, width: { more: 'wider', less: 'narrower' } } as const

/** The two lengths of a size written as `A x B`. */
function pair(
  piece: PieceGiven,
  key: string,
  size: Pair,
  verb: string,
  put: (size: Pair) => PieceGiven,
): readonly SettableLength[] {
  return (['length', 'width'] as const).map((side) => {
    const moved = (value: Millimetres): Pair => ({ ...size, [side]: value })
    // The larger side is the length whichever way the author wrote it.
    const isLong = side === 'length' ? size.length >= size.width : size.width > size.length
    return {
      piece: piece.name,
      path: ['pieces', piece.name, key],
      value: size[side],
      grid: 'cut',
      with: (value) => put(moved(value)),
      listed: (value) => [moved(value).length, moved(value).width],
      words: { verb, ...sideWords[isLong ? 'length' : 'width'] },
    }
  })
}

function boxLengths(given: BoxGiven): readonly SettableLength[] {
  if (given.by.given === 'inside') {
    const { inside } = given.by
    if (inside === 'fit') return []
    return (['length', 'width', 'depth'] as const).map((side) => {
      const moved = (value: Millimetres) => ({ ...inside, [side]: value })
      const words = side === 'depth' ? { more: 'deeper', less: 'shallower' } : sideWords[side]
      return {
        piece: given.name,
        path: ['pieces', given.name, 'inside'],
        value: inside[side],
        grid: 'cut',
        with: (value) => ({ ...given, by: { given: 'inside', inside: moved(value) } }),
        listed: (value) => [moved(value).length, moved(value).width, moved(value).depth],
        words: { verb: `make ${given.name}`, ...words },
      }
    })
  }
  const { blank, wall } = given.by
  if (blank === 'fit' || wall === 'fit') return []
  const cuts = pair(given, 'blank', blank, `cut ${given.name}`, (size) => ({
    ...given,
    by: { given: 'blank', blank: size, wall },
  }))
  const all = [...wall.length, ...wall.width]
  const first = all[0] ?? 0
  if (!all.every((each) => Math.abs(each - first) < 1e-9)) return cuts
  return [
    ...cuts,
    {
      piece: given.name,
      path: ['pieces', given.name, 'wall'],
      value: first,
      grid: 'score',
      with: (value) => ({
        ...given,
        by: { given: 'blank', blank, wall: { length: [value, value], width: [value, value] } },
      }),
      listed: (value) => [value],
      words: { verb: `score ${given.name}`, more: 'deeper', less: 'shallower' },
    },
  ]
}

function envelopeLengths(given: EnvelopeGiven): readonly SettableLength[] {
  if (given.style === 'baronial' && given.by === 'corners') {
    return [
      {
        piece: given.name,
        path: ['pieces', given.name, 'blank'],
        value: given.square,
        grid: 'cut',
        with: (value) => ({ ...given, square: value }),
        listed: (value) => [value, value],
        words: { verb: `cut the square of ${given.name}`, more: 'larger', less: 'smaller' },
      },
    ]
  }
  const { pocket } = given
  if (pocket === 'fit') return []
  return pair(given, 'pocket', pocket, `make the pocket of ${given.name}`, (size) => ({ ...given, pocket: size }))
}

/** Every length of a piece that can be moved by itself, by kind. A new kind with lengths of its own adds its case here. */
export function settableLengths(given: PieceGiven): readonly SettableLength[] {
  switch (given.kind) {
    case 'box':
    case 'lid':
      return boxLengths(given)
    case 'envelope':
      return envelopeLengths(given)
    case 'insert':
    case 'divider':
      return given.size === 'fit'
        ? []
        : pair(given, 'size', given.size, `cut ${given.name}`, (size) => ({ ...given, size }))
    case 'card':
      return given.folded === 'fit' || given.blank !== null
        ? []
        : pair(given, 'folded', given.folded, `make ${given.name}`, (folded) => ({ ...given, folded }))
    case 'band':
      if (given.blank === 'fit') return []
      return given.blank === null
        ? [
            {
              piece: given.name,
              path: ['pieces', given.name, 'overlap'],
              value: given.overlap,
              grid: 'cut',
              with: (overlap) => ({ ...given, overlap }),
              listed: (value) => [value],
              words: { verb: `give ${given.name} an overlap`, more: 'longer', less: 'shorter' },
            },
          ]
        : []
    case 'bag': {
      const { inside } = given
      if (inside === 'fit' || given.blank !== null) return []
      return (['width', 'depth', 'height'] as const).map((side) => {
        const moved = (value: Millimetres) => ({ ...inside, [side]: value })
        const words =
          side === 'height'
            ? { more: 'taller', less: 'shorter' }
            : side === 'depth'
              ? { more: 'deeper', less: 'shallower' }
              : sideWords.width
        return {
          piece: given.name,
          path: ['pieces', given.name, 'inside'],
          value: inside[side],
          grid: 'cut',
          with: (value) => ({ ...given, inside: moved(value) }),
          listed: (value) => [moved(value).width, moved(value).depth, moved(value).height],
          words: { verb: `make ${given.name}`, ...words },
        }
      })
    }
    case 'sleeve':
    case 'bought':
    case 'custom':
      return []
  }
}
