import { bareLength, lengthText, sizeText } from '../../drawing/length-text.ts'
import type { Point } from '../../geometry/shapes.ts'
import type { Blank } from '../../pieces/blank.ts'
import { millimetresPerInch } from '../../units/format-length.ts'
import { roundToGrid } from '../../units/grid.ts'
import type { Millimetres, RulerUnit } from '../../units/units.ts'
import { stockTitle, type ExportPiece, type ExportSet, type ExportSheet } from '../export-set.ts'
import { sheetFrame, type SheetFrame, type Stroke } from './sheet-frame.ts'
import { step, type CornerName, type EdgeName, type Step, type StepAction } from './step.ts'

/** A length as the page shows it: to a tenth of a millimetre, or to a thirty-second of an inch. */
export const shown = (length: Millimetres, units: RulerUnit): Millimetres =>
  units === 'mm' ? Number(length.toFixed(1)) : roundToGrid(length, millimetresPerInch / 32)

const times = (count: number): string => (count === 1 ? 'one' : String(count))

/** A sheet's name in a sentence: `card`, `layer 1 of card`. */
export function sheetWords(blank: Blank): string {
  const [piece = blank.name, part] = blank.name.split('/')
  return part === undefined ? piece : `${part} of ${piece}`
}

/** Cutting a sheet to its rectangle, and writing its name on it. */
export function cutStep(set: ExportSet, sheet: ExportSheet): Step {
  const { blank, copies } = sheet
  const frame = sheetFrame(blank)
  const words = sheetWords(blank)
  const paper = blank.stock === null ? 'the paper' : stockTitle(set, blank.stock)
  const size = sizeText(frame.length, frame.width, set.units)
  const action: StepAction = {
    do: 'cut-sheet',
    sheet: blank.name,
    length: shown(frame.length, set.units),
    width: shown(frame.width, set.units),
    copies,
  }
  const grain =
    blank.grain === null || frame.rough.turn === 45
      ? ''
      : ` Let the grain run along the ${(blank.grain === 'x') === frame.length >= frame.width ? 'long' : 'short'} side.`
  return step(
    `Cut ${words}`,
    [
      `Cut ${times(copies)} from ${paper}: ${size}.${grain}`,
      `Write "${words}" in pencil on the side that will be inside, and an arrow to its top edge.`,
    ],
    { actions: [action], figure: { sheet: blank.name, stage: 'sheet' } },
  )
}

interface Setting {
  readonly distance: Millimetres
  readonly edges: readonly EdgeName[]
  readonly fold: 'valley' | 'mountain'
  readonly part: { readonly from: Millimetres; readonly to: Millimetres } | null
}

/** The edge a straight score is set from: its nearest where each is scored from its own edge, else the left or bottom one. */
function settingOf(stroke: Stroke, frame: SheetFrame, isTurning: boolean, units: RulerUnit): Setting | null {
  const { from, to } = stroke.line
  const isUpright = Math.abs(from.x - to.x) < 1e-6
  const isLevel = Math.abs(from.y - to.y) < 1e-6
  if (!isUpright && !isLevel) return null
  const [near, span] = isUpright ? [from.x, frame.length] : [from.y, frame.width]
  const isFar = isTurning && near > span / 2 + 1e-9
  const edge: EdgeName = isUpright ? (isFar ? 'right' : 'left') : isFar ? 'top' : 'bottom'
  const ends = isUpright ? [from.y, to.y] : [from.x, to.x]
  return {
    distance: shown(isFar ? span - near : near, units),
    edges: [edge],
    fold: stroke.fold,
    part: stroke.isAcross ? null : { from: shown(Math.min(...ends), units), to: shown(Math.max(...ends), units) },
  }
}

/** Settings of one distance gathered, so that the fence is set once. */
function gather(settings: readonly Setting[]): readonly Setting[] {
  const found: Setting[] = []
  for (const setting of settings) {
    const index = found.findIndex(
      (other) =>
        Math.abs(other.distance - setting.distance) < 1e-6 &&
        other.fold === setting.fold &&
        other.part === null &&
        setting.part === null,
    )
    const twin = found[index]
    if (twin === undefined) found.push(setting)
    else found[index] = { ...twin, edges: [...twin.edges, ...setting.edges] }
  }
  return found
}

const listed = (words: readonly string[]): string =>
  words.length < 2 ? (words[0] ?? '') : `${words.slice(0, -1).join(', ')} and ${words[words.length - 1] ?? ''}`

function settingSentence({ distance, edges, fold, part }: Setting, units: RulerUnit): string {
  const where =
    edges.length === 1
      ? `with the ${edges[0] ?? ''} edge against the fence`
      : `with the ${listed(edges)} edges against the fence in turn, turning the sheet the same way each time`
  const along =
    part === null
      ? 'right across'
      : `only from ${bareLength(part.from, units)} to ${lengthText(part.to, units)} along that edge`
  const far = fold === 'mountain' ? ' This one will fold away from you.' : ''
  return `Fence at ${lengthText(distance, units)}: score ${along}, ${where}.${far}`
}

function cornerOf(
  stroke: Stroke,
  frame: SheetFrame,
  units: RulerUnit,
): Extract<StepAction, { do: 'score-corner' }> | null {
  const { from, to } = stroke.line
  const isOn = (value: number, edge: number): boolean => Math.abs(value - edge) < 1e-6
  const level = [from, to].find((p) => isOn(p.y, 0) || isOn(p.y, frame.width))
  const upright = [from, to].find((p) => p !== level && (isOn(p.x, 0) || isOn(p.x, frame.length)))
  if (level === undefined || upright === undefined || !stroke.isAcross) return null
  const isLower = isOn(level.y, 0)
  const isLeft = isOn(upright.x, 0)
  const corner: CornerName = `${isLower ? 'lower' : 'upper'} ${isLeft ? 'left' : 'right'}`
  return {
    do: 'score-corner',
    sheet: '',
    corner,
    along: shown(isLeft ? level.x : frame.length - level.x, units),
    up: shown(isLower ? upright.y : frame.width - upright.y, units),
    fold: stroke.fold,
  }
}

/** Scoring everything on a sheet, before anything is cut away. */
export function scoreStep(set: ExportSet, piece: ExportPiece, blank: Blank): Step | null {
  if (blank.scores.length === 0) return null
  const frame = sheetFrame(blank)
  const { units } = set
  // Girths and bags are set out from one end, as their measures are; trays and cards turn from edge to edge.
  const isTurning =
    piece.folded.given.scored === 'turning' && !['sleeve', 'bag', 'band', 'custom'].includes(piece.folded.form.kind)
  const settings: Setting[] = []
  const actions: StepAction[] = []
  const corners: Extract<StepAction, { do: 'score-corner' }>[] = []
  for (const stroke of frame.strokes) {
    const setting = settingOf(stroke, frame, isTurning, units)
    const corner = setting === null ? cornerOf(stroke, frame, units) : null
    if (setting !== null) settings.push(setting)
    else if (corner !== null) corners.push({ ...corner, sheet: blank.name })
    else {
      const point = (p: Point): Point => ({ x: shown(p.x, units), y: shown(p.y, units) })
      actions.push({
        do: 'score-between',
        sheet: blank.name,
        from: point(stroke.line.from),
        to: point(stroke.line.to),
        fold: stroke.fold,
      })
    }
  }
  const sentences = gather(settings).map((setting) => settingSentence(setting, units))
  for (const { edges, distance, part, fold } of settings) {
    for (const edge of edges) actions.push({ do: 'score', sheet: blank.name, edge, distance, part, fold })
  }
  for (const corner of corners) {
    const same = Math.abs(corner.along - corner.up) < 1e-6
    const measure = same
      ? `${lengthText(corner.along, units)} from it on both edges that meet there`
      : `${lengthText(corner.along, units)} along and ${lengthText(corner.up, units)} up`
    sentences.push(
      `At the ${corner.corner} corner: mark ${measure}, lay a ruler from mark to mark and score right across.`,
    )
    actions.push(corner)
  }
  for (const action of actions) {
    if (action.do !== 'score-between') continue
    const at = (p: Point): string => `${bareLength(p.x, units)} across and ${lengthText(p.y, units)} up`
    sentences.push(`Score from the point ${at(action.from)} to the point ${at(action.to)}.`)
  }
  return step(
    `Score ${sheetWords(blank)}`,
    [
      `Lay ${sheetWords(blank)} with its inside up and its arrow away from you.`,
      ...sentences,
      'Score everything before you cut anything away.',
    ],
    { actions, figure: { sheet: blank.name, stage: 'scored' } },
  )
}

/** Folding along every score, and back. */
export function foldStep(blank: Blank): Step | null {
  if (blank.scores.length === 0) return null
  const mountains = blank.scores.filter((score) => score.fold === 'mountain')
  return step(
    `Fold ${sheetWords(blank)}`,
    [
      `Inside up, fold ${mountains.length === 0 ? 'every score' : 'every valley score'} towards you and rub it down with a bone folder.`,
      ...(mountains.length === 0 ? [] : [`Fold the mountain scores away from you.`]),
    ],
    { actions: [{ do: 'fold', sheet: blank.name }] },
  )
}
