import { constant, dimension, scale, smaller, source, subtract } from '../../uncertainty/arithmetic.ts'
import type { Dimension } from '../../uncertainty/dimension.ts'
import type { TolerancedLength } from '../../units/units.ts'
import type { FoldedPiece } from '../folded-piece.ts'
import { modelDefaults } from '../model-defaults.ts'
import type { BoughtGiven, BoughtSize } from './bought-given.ts'

function givenDimension(piece: string, what: string, length: TolerancedLength, fallback: number): Dimension {
  const halfWidth = length.halfWidth ?? fallback
  return dimension(length.nominal, halfWidth > 0 ? [source(`given(${piece}, ${what})`, 1, halfWidth)] : [])
}

interface Sizes {
  readonly length: Dimension
  readonly width: Dimension
  readonly depth: Dimension | null
}

/** Sizes in the order length, width: length the larger in the plane. */
function sizesOf(piece: string, size: BoughtSize): Sizes {
  const isTurned = size.width.nominal > size.length.nominal
  const [long, short] = isTurned ? [size.width, size.length] : [size.length, size.width]
  const paperThing = modelDefaults.givenHalfWidth.value
  return {
    length: givenDimension(piece, 'length', long, paperThing),
    width: givenDimension(piece, 'width', short, paperThing),
    depth: size.depth === null ? null : givenDimension(piece, 'depth', size.depth, paperThing),
  }
}

const less = (size: Dimension, walls: Dimension, count: number): Dimension => subtract(size, scale(walls, count))

/** Layers of paper in a bought envelope where only its wall is known: face, back and the usual laps (guess). */
const layersOfBoughtEnvelope = 2.3

/** A thing not made from our sheets: its sizes are believed within their tolerances. */
export function foldBought(given: BoughtGiven): FoldedPiece {
  const thickness = given.thickness === null ? null : givenDimension(given.name, 'thickness', given.thickness, 0)
  const outsideGiven = given.outside === null ? null : sizesOf(given.name, given.outside)
  const insideGiven = given.inside === null ? null : sizesOf(given.name, given.inside)
  const wall = thickness ?? constant(0)
  const isContainer = insideGiven !== null
  const hasDepth = (insideGiven ?? outsideGiven)?.depth != null

  const inside: Sizes | null =
    insideGiven ??
    (outsideGiven === null || outsideGiven.depth === null
      ? outsideGiven === null
        ? null
        : { length: less(outsideGiven.length, wall, 2), width: less(outsideGiven.width, wall, 2), depth: null }
      : {
          length: less(outsideGiven.length, wall, 2),
          width: less(outsideGiven.width, wall, 2),
          depth: smaller(outsideGiven.depth, less(outsideGiven.depth, wall, 1)),
        })
  const outside: Sizes =
    outsideGiven ??
    (insideGiven === null
      ? { length: constant(0), width: constant(0), depth: null }
      : {
          length: less(insideGiven.length, wall, -2),
          width: less(insideGiven.width, wall, -2),
          depth: insideGiven.depth === null ? null : less(insideGiven.depth, wall, -1),
        })
  const height = outside.depth ?? (isContainer ? scale(wall, layersOfBoughtEnvelope) : wall)

  return {
    given,
    blank: null,
    caliper: null,
    outside: { length: outside.length, width: outside.width, height },
    cavity:
      inside === null
        ? null
        : {
            shape: hasDepth ? 'tray' : 'pocket',
            length: inside.length,
            width: inside.width,
            depth: inside.depth,
            open: null,
          },
    raised: null,
    isFolded: !hasDepth && isContainer,
    measures: [],
    form: { kind: 'bought', body: hasDepth ? 'box' : isContainer ? 'flat' : 'solid' },
  }
}
