import { point, rectangle } from '../../geometry/rectangle.ts'
import { roundCorners } from '../../geometry/round-corner.ts'
import type { Point, Polygon } from '../../geometry/shapes.ts'
import { withoutRepeats } from '../../geometry/without-repeats.ts'
import type { Millimetres } from '../../units/units.ts'
import { area, grainAlong, makeBlank, measure, score, segment, type DrawContext } from '../blank-parts.ts'
import type { Blank, BlankArea, Score } from '../blank.ts'
import type { FoldedPiece } from '../folded-piece.ts'
import type { CardGiven, CardLayer } from './card-given.ts'
import { foldedSize } from './card-panels.ts'

/** How far an insert sheet keeps inside the card all round (common practice). */
const insertInset: Millimetres = 3

interface Panel {
  readonly name: string
  readonly from: Millimetres
  readonly to: Millimetres
}

/** Panels side by side, inside up: the front leftmost, a gate's two leaves on either side of its back. */
function panelsInOrder(given: CardGiven, widths: readonly Millimetres[]): readonly Panel[] {
  const isGate = given.style === 'gate' && widths.length === 3
  const order = isGate ? [1, 0, 2] : widths.map((_, index) => index)
  const names = isGate
    ? ['left leaf', 'back', 'right leaf']
    : widths.map((_, index) =>
        widths.length === 1 ? 'card' : index === 0 ? 'front' : index === 1 ? 'back' : `panel ${String(index + 1)}`,
      )
  let from = 0
  return order.map((index, place) => {
    const to = from + (widths[index] ?? 0)
    const panel = { name: names[place] ?? 'panel', from, to }
    from = to
    return panel
  })
}

function foldScores(
  given: CardGiven,
  panels: readonly Panel[],
  high: Millimetres,
  shown: Millimetres,
): readonly Score[] {
  return panels.slice(0, -1).map((panel, index) => {
    const isMountain = given.style === 'accordion' && index % 2 === 1
    const name = panels.length === 2 ? 'fold' : `fold ${String(index + 1)}`
    return score(name, segment(panel.to, shown, panel.to, shown + high), 180, isMountain ? 'mountain' : 'valley')
  })
}

/** A layer seen upright, its banner end at the bottom; symmetric about its middle by construction. */
export function layerOutline(layer: Pick<CardLayer, 'size' | 'banner'>): Polygon {
  const wide = layer.size.width
  const high = layer.size.length
  if (layer.banner === null) return rectangle(0, 0, wide, high)
  const depth = layer.banner.depth
  const middle = wide / 2
  const end: readonly Point[] =
    layer.banner.point === 'in'
      ? [point(0, 0), point(middle, depth), point(wide, 0)]
      : [point(0, depth), point(middle, 0), point(wide, depth)]
  return [...end, point(wide, high), point(0, high)]
}

/** A glued-on layer as a sheet of its own. */
export function drawLayer(
  context: DrawContext,
  layer: Pick<CardLayer, 'stock' | 'size' | 'banner'>,
  part: string,
): Blank {
  const outline = layerOutline(layer)
  const { length, width } = layer.size
  return makeBlank({
    name: `${context.name}/${part}`,
    stock: layer.stock,
    outline,
    areas: () => [area('panel', part, outline)],
    measures: () => [
      measure('width', point(0, 0), point(width, 0)),
      measure('length', point(0, 0), point(0, length)),
      ...(layer.banner === null
        ? []
        : [measure('banner depth', point(width / 2, 0), point(width / 2, layer.banner.depth))]),
    ],
    grain: grainAlong(context, layer.stock, 'y'),
  })
}

/** Where inside layers are glued: on the panel that holds, placed from its middle. */
function insideLayers(
  given: CardGiven,
  panel: Panel,
  high: Millimetres,
  bottom: Millimetres,
  lengthRuns: 'x' | 'y',
): readonly BlankArea[] {
  const middle = point((panel.from + panel.to) / 2, bottom + high / 2)
  return given.layers.flatMap((layer, index) => {
    if (layer.side !== 'inside') return []
    const [wide, tall] =
      lengthRuns === 'y' ? [layer.size.width, layer.size.length] : [layer.size.length, layer.size.width]
    const [dx, dy] = lengthRuns === 'y' ? [layer.at.y, layer.at.x] : [layer.at.x, layer.at.y]
    const x = middle.x + dx - wide / 2
    const y = middle.y + dy - tall / 2
    return [area('panel', `place of layer ${String(index + 1)}`, rectangle(x, y, x + wide, y + tall))]
  })
}

function drawInsertSheet(
  context: DrawContext,
  given: CardGiven,
  across: Millimetres,
  high: Millimetres,
): readonly Blank[] {
  const { insert } = given
  if (insert === null) return []
  const tall = high - 2 * insertInset
  const panel = across - 2 * insertInset
  const wide = insert.folded ? 2 * panel : panel
  return [
    makeBlank({
      name: `${context.name}/insert`,
      stock: insert.stock,
      outline: rectangle(0, 0, wide, tall),
      scores: insert.folded ? [score('fold', segment(panel, 0, panel, tall), 180)] : [],
      areas: () => [area('panel', 'insert', rectangle(0, 0, wide, tall))],
      measures: () => [
        measure('width', point(0, 0), point(wide, 0)),
        measure('length', point(0, 0), point(0, tall)),
        ...(insert.folded ? [measure('fold', point(0, tall), point(panel, tall))] : []),
      ],
      grain: grainAlong(context, insert.stock, 'y'),
    }),
  ]
}

/** A card: its sheet inside up, panels side by side along x, a pocket below the panel that holds; then its layers and its insert. */
export function drawCard(piece: FoldedPiece, given: CardGiven, context: DrawContext): readonly Blank[] {
  if (piece.form.kind !== 'card') return []
  const size = foldedSize(given)
  const lengthRuns = size.across === 'length' ? 'x' : 'y'
  const high = lengthRuns === 'x' ? size.width : size.length
  const panels = panelsInOrder(given, size.across === null ? [size.width] : piece.form.panels)
  const last = panels[panels.length - 1]
  // A gate's leaves are half a panel wide: what is glued or held inside lies on its back.
  const holder = piece.form.panels.length === 3 && given.style === 'gate' ? panels[1] : last
  if (last === undefined || holder === undefined) return []
  const total = last.to
  const bottom = given.pocket?.depth ?? 0
  const pocket = given.pocket === null ? null : rectangle(holder.from, 0, holder.to, bottom)
  const below = pocket === null ? [] : [point(holder.from, bottom), ...pocket.slice(0, 2), point(holder.to, bottom)]
  const outline = withoutRepeats([
    point(0, bottom),
    ...below,
    point(total, bottom),
    point(total, bottom + high),
    point(0, bottom + high),
  ])
  const isOuter = (corner: Point): boolean => corner.x === 0 || corner.x === total
  const side = given.pocket?.side ?? 0
  return [
    makeBlank({
      name: context.name,
      stock: given.stock,
      outline: roundCorners(outline, given.corner, isOuter),
      scores: [
        ...foldScores(given, panels, high, bottom),
        ...(pocket === null ? [] : [score('pocket', segment(holder.from, bottom, holder.to, bottom), 180)]),
      ],
      areas: () => [
        ...panels.map((panel) => area('panel', panel.name, rectangle(panel.from, bottom, panel.to, bottom + high))),
        ...insideLayers(given, holder, high, bottom, lengthRuns),
        ...(pocket === null ? [] : [area('flap', 'pocket', pocket)]),
        ...(pocket === null || side === 0
          ? []
          : [
              area('glue', 'pocket side', rectangle(holder.from, 0, holder.from + side, bottom)),
              area('glue', 'pocket side', rectangle(holder.to - side, 0, holder.to, bottom)),
            ]),
      ],
      measures: () => [
        measure(
          size.across === null ? 'width' : 'blank across the fold',
          point(0, bottom + high),
          point(total, bottom + high),
        ),
        measure('blank along the fold', point(0, bottom), point(0, bottom + high)),
        ...panels
          .slice(0, -1)
          .map((panel, index) =>
            measure(
              panels.length === 2 ? 'fold' : `fold ${String(index + 1)}`,
              point(0, bottom),
              point(panel.to, bottom),
            ),
          ),
        ...(pocket === null ? [] : [measure('pocket', point(holder.to, 0), point(holder.to, bottom))]),
      ],
      grain: grainAlong(context, given.stock, lengthRuns),
    }),
    ...given.layers.map((layer, index) => drawLayer(context, layer, `layer ${String(index + 1)}`)),
    ...drawInsertSheet(context, given, holder.to - holder.from, high),
  ]
}
