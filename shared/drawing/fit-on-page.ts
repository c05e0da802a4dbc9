import { boundsOf, heightOf, widthOf, type Bounds } from '../geometry/bounds.ts'
import type { Polygon } from '../geometry/shapes.ts'
import { movePolygon, rotation } from '../geometry/transform.ts'
import type { Placement } from './place-drawing.ts'

/** Turns worth trying: upright, a quarter, and standing a square on or off its corner. */
const turns = [0, 90, 45, 135] as const

/** Where an outline lies true size in the room of a page, its middle in the room's middle, turned only where it must be; `null` where it is too large. */
export function fitOnPage(outline: Polygon, room: Bounds): Placement | null {
  for (const turn of turns) {
    const bounds = boundsOf(turn === 0 ? outline : movePolygon(outline, rotation(turn)))
    if (widthOf(bounds) > widthOf(room) + 1e-6 || heightOf(bounds) > heightOf(room) + 1e-6) continue
    return {
      x: (room.left + room.right) / 2 - (bounds.left + bounds.right) / 2,
      y: (room.bottom + room.top) / 2 - (bounds.bottom + bounds.top) / 2,
      turn,
      scale: 1,
    }
  }
  return null
}

/** The largest scale at which an outline lies in a room, upright or turned, never above true size. */
export function fitScaled(outline: Polygon, room: Bounds): Placement {
  const tried = ([0, 90] as const).map((turn) => {
    const bounds = boundsOf(turn === 0 ? outline : movePolygon(outline, rotation(turn)))
    const scale = Math.min(1, widthOf(room) / widthOf(bounds), heightOf(room) / heightOf(bounds))
    return {
      x: (room.left + room.right) / 2 - (scale * (bounds.left + bounds.right)) / 2,
      y: (room.bottom + room.top) / 2 - (scale * (bounds.bottom + bounds.top)) / 2,
      turn,
      scale,
    }
  })
  const [upright, turned] = tried
  if (upright === undefined || turned === undefined) throw new RangeError('no turn to try')
  return turned.scale > upright.scale * 1.1 ? turned : upright
}
