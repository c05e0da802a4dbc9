import { arcPoints } from '../../geometry/round-corner.ts'
import { point } from '../../geometry/rectangle.ts'
import type { Point, Polygon, Segment } from '../../geometry/shapes.ts'
import { samePoint } from '../../geometry/tolerance.ts'
import { withoutRepeats } from '../../geometry/without-repeats.ts'
import type { Millimetres } from '../../units/units.ts'
import type { TabsGiven, WallsGiven } from './box-given.ts'

/** Half a thumb notch: room for a thumb (guess). */
const thumbRadius: Millimetres = 10

/** What the flat shape of a tray depends on: its sheet, its walls, its tabs. Length along x. */
export interface TrayShape {
  readonly length: Millimetres
  readonly width: Millimetres
  readonly walls: WallsGiven
  readonly tabs: TabsGiven
  readonly thumbNotch: boolean
}

/** One of the four corner squares with its tab. */
export interface TrayTab {
  /** From the floor's corner out to the wall's rim; the tab is scored along it, less the trim. */
  readonly hinge: Segment
  readonly score: Segment
  /** Free outline from the rim end of the hinge round to the trimmed floor end. */
  readonly polygon: Polygon
  /** How long the tab is, out from its hinge: as deep as the wall it is glued to. */
  readonly reach: Millimetres
  /** The slit to cut where neither trim nor taper opens one. */
  readonly slit: Segment | null
  /** Which wall it belongs to and which it is glued to: `length` walls face each other along the length. */
  readonly of: 'length' | 'width'
}

const along = (from: Point, to: Point, share: number): Point =>
  point(from.x + share * (to.x - from.x), from.y + share * (to.y - from.y))

interface Corner {
  readonly floor: Point
  /** Rim ends, counter-clockwise: of the wall that is left, then of the wall that is reached. */
  readonly before: Point
  readonly after: Point
  readonly beforeAxis: 'length' | 'width'
}

/** The floor's corners counter-clockwise from the lower left. */
function cornersOf({ length, width, walls }: TrayShape): readonly Corner[] {
  const [left, right] = walls.length
  const [bottom, top] = walls.width
  const x1 = length - right
  const y1 = width - top
  return [
    { floor: point(left, bottom), before: point(0, bottom), after: point(left, 0), beforeAxis: 'length' },
    { floor: point(x1, bottom), before: point(x1, 0), after: point(length, bottom), beforeAxis: 'width' },
    { floor: point(x1, y1), before: point(length, y1), after: point(x1, width), beforeAxis: 'length' },
    { floor: point(left, y1), before: point(left, width), after: point(0, y1), beforeAxis: 'width' },
  ]
}

const distance = (a: Point, b: Point): Millimetres => Math.hypot(a.x - b.x, a.y - b.y)

function tabAt(corner: Corner, shape: TrayShape): { readonly tab: TrayTab; readonly isBefore: boolean } {
  const owner = shape.tabs.at === 'ends' ? 'length' : 'width'
  const isBefore = corner.beforeAxis === owner
  const rim = isBefore ? corner.before : corner.after
  const other = isBefore ? corner.after : corner.before
  const deep = distance(corner.floor, rim)
  const reach = distance(corner.floor, other)
  const trim = Math.min(shape.tabs.trim, deep)
  const lean = Math.min(reach * Math.tan((shape.tabs.taper * Math.PI) / 180), (deep - trim) / 2)
  const outwards = point(other.x - corner.floor.x, other.y - corner.floor.y)
  const foot = along(corner.floor, rim, trim / deep)
  const freeFoot = along(corner.floor, rim, (trim + lean) / deep)
  const freeRim = along(corner.floor, rim, (deep - lean) / deep)
  const out = (p: Point): Point => point(p.x + outwards.x, p.y + outwards.y)
  const isSlit = trim <= samePoint && lean <= samePoint
  return {
    isBefore,
    tab: {
      hinge: { from: corner.floor, to: rim },
      score: { from: foot, to: rim },
      polygon: [rim, out(freeRim), out(freeFoot), foot],
      reach,
      slit: isSlit ? { from: corner.floor, to: other } : null,
      of: owner,
    },
  }
}

/** The four tabs, counter-clockwise from the lower left. */
export const trayTabs = (shape: TrayShape): readonly TrayTab[] =>
  cornersOf(shape).map((corner) => tabAt(corner, shape).tab)

/** Radius of the thumb notches: what a wall and its length leave room for. */
const notchRadius = (wall: Millimetres, scored: Millimetres): Millimetres =>
  Math.min(thumbRadius, 0.6 * wall, scored / 6)

/** Radius of the thumb notches of a tray, which lie in the two walls that tabs are glued to. */
export function thumbNotchRadius(
  form: { readonly walls: WallsGiven; readonly scored: { readonly length: Millimetres; readonly width: Millimetres } },
  at: TabsGiven['at'],
): Millimetres {
  return at === 'ends'
    ? notchRadius(Math.min(...form.walls.width), form.scored.length)
    : notchRadius(Math.min(...form.walls.length), form.scored.width)
}

/** A half-round bite out of a wall's rim, in the middle between its two ends; the rim runs counter-clockwise. */
function notchIn(from: Point, to: Point, radius: Millimetres): readonly Point[] {
  const middle = along(from, to, 0.5)
  const direction = Math.atan2(to.y - from.y, to.x - from.x)
  return arcPoints(middle, radius, direction + Math.PI, direction)
}

/** The cut outline counter-clockwise from the lower left corner; a corner without trim or taper is a slit, not a notch. */
export function trayOutline(shape: TrayShape): Polygon {
  const corners = cornersOf(shape)
  const scored = {
    length: shape.length - shape.walls.length[0] - shape.walls.length[1],
    width: shape.width - shape.walls.width[0] - shape.walls.width[1],
  }
  const radius = thumbNotchRadius({ walls: shape.walls, scored }, shape.tabs.at)
  const points = corners.flatMap((corner, index) => {
    const { tab, isBefore } = tabAt(corner, shape)
    const round =
      distance(tab.polygon[3] ?? corner.floor, corner.floor) > samePoint ? [...tab.polygon, corner.floor] : tab.polygon
    const other = isBefore ? corner.after : corner.before
    const withTab =
      tab.slit !== null ? tab.polygon.slice(0, 2) : isBefore ? [...round, other] : [other, ...[...round].reverse()]
    const path = tab.slit !== null ? (isBefore ? [...withTab] : [...withTab].reverse()) : withTab
    const next = corners[(index + 1) % 4]
    // Notches lie in the walls the tabs are glued to, which are the ones a thumb finds from the side.
    const isGluedWall = corner.beforeAxis === (shape.tabs.at === 'ends' ? 'length' : 'width')
    if (!shape.thumbNotch || !isGluedWall || next === undefined) return path
    return [...path, ...notchIn(corner.after, next.before, radius)]
  })
  return withoutRepeats(points)
}
