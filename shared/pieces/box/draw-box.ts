import { point, rectangle } from '../../geometry/rectangle.ts'
import type { Millimetres } from '../../units/units.ts'
import { area, grainAlong, makeBlank, measure, score, segment, type DrawContext } from '../blank-parts.ts'
import type { Blank, BlankArea, BlankMeasure, Score } from '../blank.ts'
import { drawLayer } from '../card/draw-card.ts'
import type { BoxForm, FoldedPiece } from '../folded-piece.ts'
import { drawFlatSheet, flatRectangle } from '../insert/draw-insert.ts'
import type { BoxGiven } from './box-given.ts'
import { trayOutline, trayTabs, type TrayShape, type TrayTab } from './box-outline.ts'

/** Covering paper turned over the rim, and how far a wall's lining stays below it (common practice). */
const turnIn: Millimetres = 15
const liningBelowRim: Millimetres = 1

interface Lines {
  readonly left: Millimetres
  readonly right: Millimetres
  readonly bottom: Millimetres
  readonly top: Millimetres
}

const scoreLines = ({ length, width, walls }: TrayShape): Lines => ({
  left: walls.length[0],
  right: length - walls.length[1],
  bottom: walls.width[0],
  top: width - walls.width[1],
})

/** Scores along the floor's four sides, then along the tabs. */
function trayScores(shape: TrayShape, tabs: readonly TrayTab[]): readonly Score[] {
  const { left, right, bottom, top } = scoreLines(shape)
  return [
    score('end wall 1', segment(left, bottom, left, top), 90),
    score('end wall 2', segment(right, bottom, right, top), 90),
    score('side wall 1', segment(left, bottom, right, bottom), 90),
    score('side wall 2', segment(left, top, right, top), 90),
    ...tabs.map((tab, index) => score(`tab ${String(index + 1)}`, tab.score, 90)),
  ]
}

function trayAreas(shape: TrayShape, tabs: readonly TrayTab[], floor: string): readonly BlankArea[] {
  const { left, right, bottom, top } = scoreLines(shape)
  return [
    area('panel', floor, rectangle(left, bottom, right, top)),
    area('wall', 'end wall', rectangle(0, bottom, left, top)),
    area('wall', 'end wall', rectangle(right, bottom, shape.length, top)),
    area('wall', 'side wall', rectangle(left, 0, right, bottom)),
    area('wall', 'side wall', rectangle(left, top, right, shape.width)),
    ...tabs.flatMap((tab) => [area('tab', 'tab', tab.polygon), area('glue', 'tab', tab.polygon)]),
  ]
}

function trayMeasures(shape: TrayShape): readonly BlankMeasure[] {
  const { left, right, bottom, top } = scoreLines(shape)
  const { length, width } = shape
  return [
    measure('blank length', point(0, width), point(length, width)),
    measure('blank width', point(0, 0), point(0, width)),
    measure('end wall 1', point(0, bottom), point(left, bottom)),
    measure('between scores, length', point(left, bottom), point(right, bottom)),
    measure('end wall 2', point(right, bottom), point(length, bottom)),
    measure('side wall 1', point(left, 0), point(left, bottom)),
    measure('between scores, width', point(left, bottom), point(left, top)),
    measure('side wall 2', point(left, top), point(left, width)),
  ]
}

/** Four strips that double the walls, glued inside between the corners. */
function drawLinings(context: DrawContext, given: BoxGiven, piece: FoldedPiece): readonly Blank[] {
  if (given.walls !== 'doubled' || piece.cavity === null) return []
  const deep = Math.max(1, (piece.cavity.depth?.nominal ?? 0) - liningBelowRim)
  return (['length', 'width'] as const).flatMap((axis) => {
    const long = piece.cavity?.[axis].nominal ?? 0
    return [1, 2].map((index) =>
      drawFlatSheet(context, {
        name: `${context.name}/${axis === 'length' ? 'side' : 'end'} wall lining ${String(index)}`,
        stock: given.stock,
        part: 'wall lining',
        outline: flatRectangle(Math.max(long, deep), Math.min(long, deep), 0),
      }),
    )
  })
}

/** Covering paper: floor, four walls and a strip to turn over the rim; corners cut out, so no layer lies twice. */
function drawCover(context: DrawContext, given: BoxGiven, piece: FoldedPiece, form: BoxForm): readonly Blank[] {
  if (given.covered === null) return []
  const caliper = piece.caliper?.nominal ?? 0
  const wall = Math.max(...form.walls.length, ...form.walls.width) + caliper
  const over = wall + turnIn
  const long = form.scored.length + caliper
  const wide = form.scored.width + caliper
  const [x1, x2, y1, y2] = [over, over + long, over, over + wide]
  const [right, top] = [x2 + over, y2 + over]
  return [
    makeBlank({
      name: `${context.name}/cover`,
      stock: given.covered,
      outline: [
        point(x1, 0),
        point(x2, 0),
        point(x2, y1),
        point(right, y1),
        point(right, y2),
        point(x2, y2),
        point(x2, top),
        point(x1, top),
        point(x1, y2),
        point(0, y2),
        point(0, y1),
        point(x1, y1),
      ],
      scores: [
        score('floor edge', segment(x1, y1, x2, y1), 90),
        score('floor edge', segment(x1, y2, x2, y2), 90),
        score('floor edge', segment(x1, y1, x1, y2), 90),
        score('floor edge', segment(x2, y1, x2, y2), 90),
        score('turned over the rim', segment(x1, turnIn, x2, turnIn), 180),
        score('turned over the rim', segment(x1, top - turnIn, x2, top - turnIn), 180),
        score('turned over the rim', segment(turnIn, y1, turnIn, y2), 180),
        score('turned over the rim', segment(right - turnIn, y1, right - turnIn, y2), 180),
      ],
      areas: () => [area('panel', 'cover', rectangle(x1, y1, x2, y2))],
      measures: () => [
        measure('length', point(0, top), point(right, top)),
        measure('width', point(0, 0), point(0, top)),
        measure('wall and turn-in', point(x1, 0), point(x1, y1)),
        measure('turn-in', point(x2, 0), point(x2, turnIn)),
      ],
      grain: grainAlong(context, given.covered, 'x'),
    }),
  ]
}

/** The flat shape of a box or lid. */
export function trayShape(given: BoxGiven, piece: FoldedPiece, form: BoxForm): TrayShape {
  const { length, width } = piece.blank ?? { length: 0, width: 0 }
  return { length, width, walls: form.walls, tabs: given.tabs, thumbNotch: given.thumbNotch }
}

/** A box or lid, inside up: its tray, then linings, covering paper and layers stuck on. */
export function drawBox(piece: FoldedPiece, given: BoxGiven, context: DrawContext): readonly Blank[] {
  const { form } = piece
  if (form.kind !== 'box') return []
  const shape = trayShape(given, piece, form)
  const tabs = trayTabs(shape)
  return [
    makeBlank({
      name: context.name,
      stock: given.stock,
      outline: trayOutline(shape),
      cuts: tabs.flatMap((tab) => (tab.slit === null ? [] : [tab.slit])),
      scores: trayScores(shape, tabs),
      areas: () => trayAreas(shape, tabs, given.kind === 'lid' ? 'top' : 'floor'),
      measures: () => trayMeasures(shape),
      grain: grainAlong(context, given.stock, 'x'),
    }),
    ...drawLinings(context, given, piece),
    ...drawCover(context, given, piece, form),
    ...given.layers.map((layer, index) => drawLayer(context, layer, `layer ${String(index + 1)}`)),
  ]
}
