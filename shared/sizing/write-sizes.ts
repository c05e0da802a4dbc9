import type { PieceGiven } from '../pieces/given.ts'
import { replacePairAt, replaceValueAt, type PairText } from '../template/edit-text.ts'
import { formatLength, formatSize } from '../units/format-length.ts'
import type { RulerUnit } from '../units/units.ts'
import type { OpenPiece } from './open-pieces.ts'

interface Edit {
  readonly key: string
  /** What takes the place of the key; none removes it. */
  readonly pairs: readonly PairText[]
}

/** What is written for a sized piece: the keys that were open, in the words of the language. */
function editsOf(given: PieceGiven, open: OpenPiece, units: RulerUnit): readonly Edit[] {
  const size = (...lengths: readonly number[]): string => formatSize(lengths, units)
  const one = (length: number): string => formatLength(length, units, { decimals: 3 })
  switch (given.kind) {
    case 'box':
    case 'lid': {
      if (given.by.given !== 'blank' || given.by.blank === 'fit' || given.by.wall === 'fit') return []
      const blank: PairText = ['blank', size(given.by.blank.length, given.by.blank.width)]
      const wall: PairText = ['wall', one(given.by.wall.length[0])]
      if (open.keys.has('inside')) return [{ key: 'inside', pairs: [blank, wall] }]
      return [
        ...(open.keys.has('blank') ? [{ key: 'blank', pairs: [blank] }] : []),
        ...(open.keys.has('wall') ? [{ key: 'wall', pairs: [wall] }] : []),
      ]
    }
    case 'envelope': {
      if (given.style === 'baronial' && given.by === 'corners') {
        const { left, bottom, flap } = given.corners
        const corners = `{ sides: ${one(left)}, bottom: ${one(bottom)}, flap: ${one(flap)} }`
        return [
          {
            key: 'pocket',
            pairs: [
              ['blank', size(given.square, given.square)],
              ['corners', corners],
            ],
          },
          // The seams follow from the corners.
          { key: 'seam', pairs: [] },
        ]
      }
      if (given.pocket === 'fit') return []
      return [{ key: 'pocket', pairs: [['pocket', size(given.pocket.length, given.pocket.width)]] }]
    }
    case 'insert':
    case 'divider':
      return given.size === 'fit' ? [] : [{ key: 'size', pairs: [['size', size(given.size.length, given.size.width)]] }]
    case 'bag':
      return given.inside === 'fit'
        ? []
        : [{ key: 'inside', pairs: [['inside', size(given.inside.width, given.inside.depth, given.inside.height)]] }]
    case 'band':
    case 'sleeve':
      // Without a blank it is reckoned from what it goes round.
      return [{ key: 'blank', pairs: [] }]
    case 'card':
    case 'bought':
    case 'custom':
      return []
  }
}

/** The set's text with the open sizes of one piece written in place, comments and layout kept. */
export function writeSizes(text: string, given: PieceGiven, open: OpenPiece, units: RulerUnit): string {
  return editsOf(given, open, units).reduce((written, { key, pairs }) => {
    const path = ['pieces', given.name, key]
    const [only] = pairs
    const edited =
      pairs.length === 1 && only?.[0] === key
        ? replaceValueAt(written, path, only[1])
        : replacePairAt(written, path, pairs)
    return edited ?? written
  }, text)
}
