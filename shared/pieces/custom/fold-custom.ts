import { add, dimension } from '../../uncertainty/arithmetic.ts'
import type { Dimension } from '../../uncertainty/dimension.ts'
import type { Millimetres } from '../../units/units.ts'
import type { FoldContext } from '../fold-context.ts'
import type { FoldedPiece } from '../folded-piece.ts'
import { cutExtent, cutSource, scoreSource, type PlaneAxis } from '../making.ts'
import type { CustomGiven } from './custom-given.ts'

function extent(given: CustomGiven, along: 'x' | 'y'): Millimetres {
  const values = given.outline.map((point) => point[along])
  return Math.max(...values) - Math.min(...values)
}

/** A declared size: believed, but made by hand, so with the maker's cut or, where it is folded, two scores. */
function declared(given: CustomGiven, context: FoldContext, axis: PlaneAxis, nominal: Millimetres): Dimension {
  return given.scores.length === 0
    ? cutExtent(given, context, axis, nominal, [])
    : dimension(nominal, [
        cutSource(given, context, axis, 0.5),
        scoreSource(given, context, axis, 1, 1),
        scoreSource(given, context, axis, 2, 1),
      ])
}

/** A custom piece: what is declared is believed; what is not is the flat outline. */
export function foldCustom(given: CustomGiven, context: FoldContext): FoldedPiece {
  const spans = [extent(given, 'x'), extent(given, 'y')] as const
  const blank = { length: Math.max(...spans), width: Math.min(...spans) }
  const caliper = context.caliper(given.stock)
  const size = given.outside ?? { length: blank.length, width: blank.width, height: null }
  const sides = [size.length, size.width] as const
  return {
    given,
    blank,
    caliper,
    outside: {
      length: declared(given, context, 'length', Math.max(...sides)),
      width: declared(given, context, 'width', Math.min(...sides)),
      height:
        size.height === null ? caliper : add(dimension(size.height, [scoreSource(given, context, 'height', 1, 1)])),
    },
    cavity:
      given.inside === null
        ? null
        : {
            shape: given.inside.depth === null ? 'pocket' : 'tray',
            length: declared(given, context, 'length', Math.max(given.inside.length, given.inside.width)),
            width: declared(given, context, 'width', Math.min(given.inside.length, given.inside.width)),
            depth:
              given.inside.depth === null
                ? null
                : dimension(given.inside.depth, [scoreSource(given, context, 'height', 1, 1)]),
            open: null,
          },
    raised: null,
    isFolded: given.scores.length > 0,
    measures: [],
    form: { kind: 'custom' },
  }
}
