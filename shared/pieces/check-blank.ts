import { boundsOf } from '../geometry/bounds.ts'
import { containsPoint } from '../geometry/contains-point.ts'
import { crossingsOf } from '../geometry/crossings.ts'
import type { Polygon } from '../geometry/shapes.ts'
import { samePoint } from '../geometry/tolerance.ts'
import type { Millimetres } from '../units/units.ts'
import type { Blank } from './blank.ts'
import { trayShape } from './box/draw-box.ts'
import { trayTabs } from './box/box-outline.ts'
import type { BoxGiven } from './box/box-given.ts'
import { rollStep } from './card/card-panels.ts'
import { baronialFlaps, baronialFromCorners, baronialPocket } from './envelope/baronial-geometry.ts'
import { squareFlapSizesOf } from './envelope/draw-square-flap.ts'
import { openBack } from './envelope/layer-map.ts'
import { squareFlapFace, squareFlapParts } from './envelope/square-flap-geometry.ts'
import type { BoxForm, EnvelopeForm, FoldedPiece } from './folded-piece.ts'
import { modelDefaults } from './model-defaults.ts'

export type BlankFactName =
  | 'outline'
  | 'score-outside'
  | 'wall-too-deep'
  | 'tabs-collide'
  | 'tab-too-long'
  | 'flap-short'
  | 'flap-shows'
  | 'back-open'
  | 'seam-narrow'
  | 'inner-panel'

/** Something measured on a blank or on the piece it folds into, with the limit that it keeps or breaks. */
export interface BlankFact {
  readonly fact: BlankFactName
  /** What was measured, in the trade's words: the sheet's name, `side flap`, `side wall 1`. */
  readonly part: string
  readonly measured: number
  readonly limit: number
  readonly sense: 'at-least' | 'at-most'
  readonly unit: 'mm' | 'mm2' | 'count'
  readonly holds: boolean
}

const atMost = (
  fact: BlankFactName,
  part: string,
  measured: number,
  limit: number,
  unit: BlankFact['unit'] = 'mm',
): BlankFact => ({
  fact,
  part,
  measured,
  limit,
  sense: 'at-most',
  unit,
  holds: measured <= limit + samePoint,
})

const atLeast = (fact: BlankFactName, part: string, measured: Millimetres, limit: Millimetres): BlankFact => ({
  fact,
  part,
  measured,
  limit,
  sense: 'at-least',
  unit: 'mm',
  holds: measured >= limit - samePoint,
})

/** Reaching something takes more than nothing. */
const reaches = (part: string, measured: Millimetres): BlankFact => ({
  ...atLeast('flap-short', part, measured, 0),
  holds: measured > samePoint,
})

/** Cut outlines that cross or touch themselves, holes and slits included, and scores that leave the sheet. */
function outlineFacts(blank: Blank): readonly BlankFact[] {
  const crossings = [blank.outline, ...blank.holes].reduce((count, outline) => count + crossingsOf(outline).length, 0)
  const strayHoles = blank.holes.filter((hole) => hole.some((corner) => !containsPoint(blank.outline, corner))).length
  const strayScores = blank.scores.filter(({ from, to }) =>
    [from, to, { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 }].some(
      (end) => !containsPoint(blank.outline, end, 1e-4),
    ),
  ).length
  return [
    atMost('outline', blank.name, crossings + strayHoles, 0, 'count'),
    atMost('score-outside', blank.name, strayScores, 0, 'count'),
  ]
}

function boxFacts(piece: FoldedPiece, given: BoxGiven, form: BoxForm): readonly BlankFact[] {
  const { length, width } = piece.blank ?? { length: 0, width: 0 }
  const depths = [
    atMost('wall-too-deep', 'end walls', form.walls.length[0] + form.walls.length[1], length),
    atMost('wall-too-deep', 'side walls', form.walls.width[0] + form.walls.width[1], width),
  ].map((fact) => ({ ...fact, holds: fact.measured < fact.limit - samePoint }))
  if (depths.some((fact) => !fact.holds)) return depths
  const tabs = trayTabs(trayShape(given, piece, form))
  const owner = given.tabs.at === 'ends' ? 'length' : 'width'
  const gluedTo = owner === 'length' ? 'width' : 'length'
  const wallName = gluedTo === 'width' ? 'side wall' : 'end wall'
  // Tabs run counter-clockwise from the lower left; the first wall they are glued to has the first two (bottom) or the two at the left.
  const pairs =
    gluedTo === 'width'
      ? [
          [0, 1],
          [2, 3],
        ]
      : [
          [0, 3],
          [1, 2],
        ]
  const room = piece.cavity?.[owner].nominal ?? form.scored[owner]
  const collisions = pairs.map((pair, index) =>
    atMost(
      'tabs-collide',
      `${wallName} ${String(index + 1)}`,
      pair.reduce((sum, tab) => sum + (tabs[tab]?.reach ?? 0), 0),
      room,
    ),
  )
  const deepest = Math.max(...form.walls[owner])
  const shallowest = Math.min(...form.walls[gluedTo])
  return [...depths, ...collisions, atMost('tab-too-long', 'tab', deepest, shallowest)]
}

/** How far a folded flap lies beyond the pocket. */
function showsBy(pocket: Polygon, folded: Polygon): Millimetres {
  const inner = boundsOf(pocket)
  const outer = boundsOf(folded)
  return Math.max(
    0,
    inner.left - outer.left,
    inner.bottom - outer.bottom,
    outer.right - inner.right,
    outer.top - inner.top,
  )
}

function baronialFacts(form: Extract<EnvelopeForm, { style: 'baronial' }>): readonly BlankFact[] {
  const shape = baronialFromCorners(form.square, form.corners)
  const pocket = baronialPocket(shape)
  const flaps = baronialFlaps(shape)
  const names = { left: 'left side flap', right: 'right side flap', bottom: 'bottom flap', flap: 'seal flap' } as const
  const least = modelDefaults.seamMinimum.value
  return [
    reaches('bottom flap', form.seam.bottom),
    reaches('seal flap', form.seam.top),
    ...flaps.map((flap) => atMost('flap-shows', names[flap.name], showsBy(pocket, flap.folded), 0)),
    atMost(
      'back-open',
      'back',
      openBack(
        pocket,
        flaps.map((flap) => flap.folded),
      ),
      0,
      'mm2',
    ),
    atLeast('seam-narrow', 'bottom seam', form.seam.bottom, least),
    atLeast('seam-narrow', 'top seam', form.seam.top, least),
  ]
}

function squareFlapFacts(form: Extract<EnvelopeForm, { style: 'square-flap' }>): readonly BlankFact[] {
  const sizes = squareFlapSizesOf(form)
  const face = squareFlapFace(sizes)
  const parts = squareFlapParts(sizes)
  const names = { left: 'left side flap', right: 'right side flap', back: 'back', flap: 'seal flap' } as const
  const lean = sizes.sideFlap * Math.tan((sizes.taper * Math.PI) / 180)
  return [
    reaches('back', sizes.back - lean),
    reaches('seal flap', sizes.flap - (sizes.across - sizes.back)),
    ...parts.map((part) => atMost('flap-shows', names[part.name], showsBy(face, part.folded), 0)),
    atMost(
      'back-open',
      'back',
      openBack(
        face,
        parts.map((part) => part.folded),
      ),
      0,
      'mm2',
    ),
    atLeast('seam-narrow', 'side flaps', sizes.sideFlap, modelDefaults.seamMinimum.value),
  ]
}

/** Folded-in panels of a roll, each against the one it lies in. */
function rollFacts(piece: FoldedPiece): readonly BlankFact[] {
  const { given, form } = piece
  if (given.kind !== 'card' || form.kind !== 'card' || given.style !== 'roll') return []
  const least = rollStep(piece.caliper?.nominal ?? 0) + modelDefaults.rollFoldError.value
  return form.panels.flatMap((panel, index) => {
    const around = form.panels[index - 1]
    return index < 2 || around === undefined
      ? []
      : [atLeast('inner-panel', `panel ${String(index + 1)}`, around - panel, least)]
  })
}

function kindFacts(piece: FoldedPiece): readonly BlankFact[] {
  const { given, form } = piece
  const least = modelDefaults.seamMinimum.value
  switch (form.kind) {
    case 'box':
      return given.kind === 'box' || given.kind === 'lid' ? boxFacts(piece, given, form) : []
    case 'envelope':
      return form.style === 'baronial' ? baronialFacts(form) : squareFlapFacts(form)
    case 'card':
      return [
        ...rollFacts(piece),
        ...(given.kind === 'card' && given.pocket !== null
          ? [atLeast('seam-narrow', 'pocket sides', given.pocket.side, least)]
          : []),
      ]
    case 'sleeve':
      return [atLeast('seam-narrow', 'lap', form.overlap.nominal, least)]
    case 'bag':
      return [atLeast('seam-narrow', 'seam', form.seam, least)]
    case 'band':
    case 'insert':
    case 'bought':
    case 'custom':
      return []
  }
}

/**
 * Geometric facts of a piece and its sheets, those that hold too: a rule gives a verdict for each.
 * @see physics I (derived) for tabs and flaps, A.6 for folded-in panels
 */
export function checkBlank(piece: FoldedPiece, blanks: readonly Blank[]): readonly BlankFact[] {
  return [...blanks.flatMap(outlineFacts), ...kindFacts(piece)]
}
