import { modelDefaults } from '../model-defaults.ts'
import type { Millimetres } from '../../units/units.ts'
import type { BoxGiven, WallsGiven } from './box-given.ts'

export interface BoxSizes {
  readonly blank: { readonly length: Millimetres; readonly width: Millimetres }
  readonly walls: WallsGiven
  readonly scored: { readonly length: Millimetres; readonly width: Millimetres }
}

/** The axis that loses the tabs' layers: tabs of the end walls are glued to the side walls, across the width. */
export const tabbedAxis = (given: BoxGiven): 'length' | 'width' => (given.tabs.at === 'ends' ? 'width' : 'length')

function fromBlank(first: Millimetres, second: Millimetres, walls: WallsGiven): BoxSizes {
  const scoredOf = (length: Millimetres, width: Millimetres) => ({
    length: length - walls.length[0] - walls.length[1],
    width: width - walls.width[0] - walls.width[1],
  })
  const asGiven = scoredOf(first, second)
  // Length is the larger of the folded form, so a blank given short side first is turned; a square stays as given.
  if (asGiven.length >= asGiven.width) return { blank: { length: first, width: second }, walls, scored: asGiven }
  const turned = scoredOf(second, first)
  return { blank: { length: second, width: first }, walls, scored: turned }
}

/** Blank, walls and score distances of a box, from its blank or from the inside it must have. */
export function boxSizes(given: BoxGiven, caliper: Millimetres): BoxSizes {
  if (given.by.given === 'blank') {
    const { blank, wall } = given.by
    if (blank === 'fit' || wall === 'fit') throw new RangeError(`${given.name} has no size yet`)
    return fromBlank(blank.length, blank.width, wall)
  }
  const { inside } = given.by
  if (inside === 'fit') throw new RangeError(`${given.name} has no size yet`)
  const hinge = modelDefaults.hingeFraction.value * caliper
  const depth = inside.depth + hinge
  const doubled = given.walls === 'doubled' ? 2 * caliper : 0
  const scoredFor = (room: Millimetres, axis: 'length' | 'width'): Millimetres => {
    // One caliper either way at the nominal: 2t − 2ω inside, 2ω outside, with ω half a caliper.
    const tabs = axis === tabbedAxis(given) ? caliper : 0
    return room + 2 * hinge + tabs + doubled
  }
  const length = scoredFor(Math.max(inside.length, inside.width), 'length')
  const width = scoredFor(Math.min(inside.length, inside.width), 'width')
  return {
    blank: { length: length + 2 * depth, width: width + 2 * depth },
    walls: { length: [depth, depth], width: [depth, depth] },
    scored: { length, width },
  }
}
