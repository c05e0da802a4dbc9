import { areaOf } from '../geometry/area.ts'
import { boundsOf, heightOf, widthOf } from '../geometry/bounds.ts'
import { segmentOutside } from '../geometry/clip-segment.ts'
import { containsPoint } from '../geometry/contains-point.ts'
import type { Point, Polygon, Segment } from '../geometry/shapes.ts'
import type { Blank, BlankArea, Score } from '../pieces/blank.ts'
import type { Millimetres, RulerUnit } from '../units/units.ts'
import { line, text, fill, type Drawing, type LayerName, type Mark } from './drawing.ts'
import { freeSpace, overlaps, takenBy, type FreeSpace, type Taken } from './free-space.ts'
import { hatch } from './hatch.ts'
import { leastRepeats, lineStyles, periodOf } from './line-styles.ts'
import { placeMeasures, takenByLine } from './place-measures.ts'
import { textWidth } from './text-width.ts'

export interface BlankDrawingOptions {
  readonly units: RulerUnit
  /** Without names and measures, for a machine. */
  readonly isBare?: boolean
  readonly textSize?: Millimetres
}

const hatchSpacing: Millimetres = 2
/** Parallel to no edge of a sheet that lies upright or stands on a corner. */
const hatchAngle = 60

const middleOf = ({ from, to }: Segment): Point => ({ x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 })
const lengthOf = ({ from, to }: Segment): Millimetres => Math.hypot(to.x - from.x, to.y - from.y)
const angleOf = ({ from, to }: Segment): number => {
  const angle = (Math.atan2(to.y - from.y, to.x - from.x) * 180) / Math.PI
  return angle > 90.5 || angle <= -89.5 ? angle + 180 : angle
}

const layerOfScore = (score: Score): LayerName => (score.fold === 'valley' ? 'valley' : 'mountain')

/** A mark's centre line of text, laid so that its middle is at a point. */
function centred(layer: LayerName, at: Point, content: string, size: Millimetres, angle: number): Mark {
  const down = size * 0.36
  const turn = (angle * Math.PI) / 180
  return text(layer, { x: at.x + down * Math.sin(turn), y: at.y - down * Math.cos(turn) }, content, size, {
    anchor: 'middle',
    angle,
  })
}

interface Room {
  readonly at: Point
  readonly angle: number
  readonly taken: Taken
}

/** Where a word fits into an outline, inside the sheet and clear of what is there: its middle if that will do, else beside it. */
function roomFor(polygon: Polygon, content: string, size: Millimetres, sheet: Polygon, space: FreeSpace): Room | null {
  const bounds = boundsOf(polygon)
  const count = polygon.length
  const centroid = {
    x: polygon.reduce((sum, p) => sum + p.x, 0) / count,
    y: polygon.reduce((sum, p) => sum + p.y, 0) / count,
  }
  const wide = textWidth(content, size) + 1
  const isWide = widthOf(bounds) >= heightOf(bounds)
  for (const angle of isWide ? [0, 90] : [90, 0]) {
    for (const share of [0, 0.25, -0.25, 0.1, -0.1]) {
      const at = isWide
        ? { x: centroid.x + share * widthOf(bounds), y: centroid.y }
        : { x: centroid.x, y: centroid.y + share * heightOf(bounds) }
      const taken = takenBy(at, wide, size * 1.15, angle)
      const isInside = taken.corners.every((corner) => containsPoint(polygon, corner) && containsPoint(sheet, corner))
      // A bite out of the edge may lie between the corners.
      if (isInside && sheet.every((corner) => !overlaps(taken, takenBy(corner, 0.2, 0.2, 0))) && space.isFree(taken))
        return { at, angle, taken }
    }
  }
  return null
}

function glueMarks(
  areas: readonly BlankArea[],
  sheet: Polygon,
  size: Millimetres,
  isBare: boolean,
  space: FreeSpace,
): readonly Mark[] {
  return areas.flatMap((area) => {
    const room = isBare ? null : roomFor(area.polygon, 'glue', size, sheet, space)
    if (room !== null) space.take(room.taken)
    return [
      ...(room === null ? [] : [centred('glue', room.at, 'glue', size, room.angle)]),
      ...hatch(area.polygon, hatchSpacing, hatchAngle).flatMap((stroke) =>
        (room === null ? [stroke] : segmentOutside(stroke, room.taken.bounds)).map(({ from, to }) =>
          line('glue', [from, to], { weight: 'plain' }),
        ),
      ),
    ]
  })
}

/** The word on a score, or its letter where three repeats of its pattern do not fit or the word does not. */
function scoreMarks(score: Score, size: Millimetres, isBare: boolean, spaces: readonly FreeSpace[]): readonly Mark[] {
  const layer = layerOfScore(score)
  const style = lineStyles[layer]
  const own = line(layer, [score.from, score.to])
  if (isBare) return [own]
  const long = lengthOf(score)
  const angle = angleOf(score)
  const middle = middleOf(score)
  const turn = (angle * Math.PI) / 180
  const isShort = long < leastRepeats * periodOf(style)
  const words = isShort ? [style.tick] : [`${style.word} ${String(score.angle)}°`, style.word, style.tick]
  for (const [content, space] of spaces.flatMap((free) => words.map((word) => [word, free] as const))) {
    const wide = textWidth(content, size)
    if (!isShort && wide > long - 4) continue
    for (const share of isShort ? [0] : [0, -0.3, 0.3]) {
      for (const side of [1, -1]) {
        const off = side * (size * 0.5 + 0.9)
        const at = {
          x: middle.x + Math.cos(turn) * share * long - Math.sin(turn) * off,
          y: middle.y + Math.sin(turn) * share * long + Math.cos(turn) * off,
        }
        const taken = takenBy(at, wide + 0.5, size * 1.05, angle)
        if (!space.isFree(taken)) continue
        space.take(taken)
        return [own, centred(layer, at, content, size, angle)]
      }
    }
  }
  if (!isShort) return [own]
  // Its letter is all that tells a short line apart, so it stands there whatever else does.
  const off = size * 0.5 + 0.9
  return [
    own,
    centred(layer, { x: middle.x - Math.sin(turn) * off, y: middle.y + Math.cos(turn) * off }, style.tick, size, angle),
  ]
}

function nameMarks(blank: Blank, size: Millimetres, space: FreeSpace): readonly Mark[] {
  return blank.areas
    .filter((area) => area.role !== 'glue' && area.role !== 'tab')
    .toSorted((a, b) => areaOf(b.polygon) - areaOf(a.polygon))
    .flatMap((area) => {
      for (const [content, height] of [
        [area.name, size * 1.2],
        [area.name, size],
      ] as const) {
        const room = roomFor(area.polygon, content, height, blank.outline, space)
        if (room !== null) {
          space.take(room.taken)
          return [centred('legend', room.at, content, height, room.angle)]
        }
      }
      return []
    })
}

const centreOf = (polygon: Polygon): Point => {
  const bounds = boundsOf(polygon)
  return { x: (bounds.left + bounds.right) / 2, y: (bounds.bottom + bounds.top) / 2 }
}

const spanOf = (polygon: Polygon): readonly [Millimetres, Millimetres] => {
  const bounds = boundsOf(polygon)
  return [widthOf(bounds) - 0.5, heightOf(bounds) - 0.5]
}

/** The same space with every score taken: names stand beside lines, never on them. */
function clearOfLines(blank: Blank, space: FreeSpace): FreeSpace {
  const lines = blank.scores.map((score) => takenByLine(score, 0.8))
  return { take: space.take, isFree: (taken) => space.isFree(taken) && lines.every((own) => !overlaps(own, taken)) }
}

/** A double arrow the way the grain should run, in the largest panel below its name. */
function grainMarks(blank: Blank, size: Millimetres, space: FreeSpace): readonly Mark[] {
  if (blank.grain === null) return []
  const panel = blank.areas
    .filter((area) => area.role === 'panel')
    .toSorted((a, b) => areaOf(b.polygon) - areaOf(a.polygon))[0]
  if (panel === undefined) return []
  const bounds = boundsOf(panel.polygon)
  const isAlongX = blank.grain === 'x'
  const long = Math.min(30, (isAlongX ? widthOf(bounds) : heightOf(bounds)) / 3)
  if (long < 6) return []
  const middle = { x: (bounds.left + bounds.right) / 2, y: (bounds.bottom + bounds.top) / 2 }
  for (const step of [-8, 8, -14, 14, -20, 20, -28, 28]) {
    const at = isAlongX ? { x: middle.x, y: middle.y + step } : { x: middle.x + step, y: middle.y }
    const taken = takenBy(at, long, size * 2.6, isAlongX ? 0 : 90)
    if (!space.isFree(taken) || !taken.corners.every((corner) => containsPoint(panel.polygon, corner))) continue
    space.take(taken)
    const [c, s] = isAlongX ? [1, 0] : [0, 1]
    const end = (side: number): Point => ({ x: at.x + (c * side * long) / 2, y: at.y + (s * side * long) / 2 })
    const head = (side: number): Mark => {
      const tip = end(side)
      return fill('legend', [
        tip,
        { x: tip.x - c * side * 2.5 - s, y: tip.y - s * side * 2.5 + c },
        { x: tip.x - c * side * 2.5 + s, y: tip.y - s * side * 2.5 - c },
      ])
    }
    const label = { x: at.x - s * (size * 0.5 + 0.8), y: at.y + c * (size * 0.5 + 0.8) }
    return [
      line('legend', [end(-1), end(1)], { weight: 'plain' }),
      head(-1),
      head(1),
      centred('legend', label, 'grain', size, isAlongX ? 0 : 90),
    ]
  }
  return []
}

/**
 * A blank as layered lines, hatching, names and dimensions, true size, its lower left at the origin. This one
 * description is what every exporter and the page on a screen draw.
 */
export function drawBlank(blank: Blank, options: BlankDrawingOptions): Drawing {
  const size = options.textSize ?? 2.6
  const isBare = options.isBare ?? false
  const space = freeSpace()
  const tabSpace = freeSpace()
  const glue = blank.areas.filter((area) => area.role === 'glue')
  const places = blank.areas.filter((area) => area.name.startsWith('place of'))
  if (!isBare) {
    for (const area of blank.areas.filter((part) => part.role === 'tab')) {
      tabSpace.take(takenBy(centreOf(area.polygon), ...spanOf(area.polygon), 0))
    }
  }
  const glueLines = glueMarks(glue, blank.outline, size, isBare, space)
  const bothFree: FreeSpace = { take: space.take, isFree: (taken) => space.isFree(taken) && tabSpace.isFree(taken) }
  if (!isBare) for (const part of glue) tabSpace.take(takenBy(centreOf(part.polygon), ...spanOf(part.polygon), 0))
  const measures = isBare ? [] : placeMeasures(blank, options.units, size, bothFree)
  return {
    marks: [
      ...glueLines,
      ...places.map((area) => line('position', area.polygon, { isClosed: true })),
      line('cut', blank.outline, { isClosed: true }),
      ...blank.holes.map((hole) => line('cut', hole, { isClosed: true })),
      ...blank.cuts.map(({ from, to }) => line('cut', [from, to])),
      ...blank.perforations.map(({ from, to }) => line('perforate', [from, to])),
      ...blank.scores.flatMap((score) => scoreMarks(score, size, isBare, [bothFree, space])),
      ...measures,
      ...(isBare ? [] : [...nameMarks(blank, size, clearOfLines(blank, bothFree)), ...grainMarks(blank, size, space)]),
    ],
  }
}
