import { bareLength, lengthText } from '../../drawing/length-text.ts'
import type { Point, Polygon } from '../../geometry/shapes.ts'
import { thumbNotchRadius } from '../../pieces/box/box-outline.ts'
import type { Blank } from '../../pieces/blank.ts'
import type { RulerUnit } from '../../units/units.ts'
import type { ExportPiece, ExportSet } from '../export-set.ts'
import { sheetFrame, type SheetFrame } from './sheet-frame.ts'
import { sheetWords, shown } from './sheet-steps.ts'
import { step, type Step, type StepAction } from './step.ts'

const isCurved = (part: Polygon): boolean => part.length > 8

interface Cutting {
  readonly sentences: readonly string[]
  readonly actions: readonly StepAction[]
}

/** The tabs of a tray, said once for all four corners, and its thumb notches. */
function trayCutting(piece: ExportPiece, blank: Blank, units: RulerUnit): Cutting | null {
  const { given, form } = piece.folded
  if (form.kind !== 'box' || (given.kind !== 'box' && given.kind !== 'lid') || blank.name !== piece.name) return null
  const { at, taper } = given.tabs
  const trim = shown(given.tabs.trim, units)
  const glued = at === 'ends' ? 'side' : 'end'
  const floor = given.kind === 'lid' ? 'top' : 'floor'
  const wide = shown(2 * thumbNotchRadius(form, at), units)
  return {
    sentences: [
      `At each corner cut from the edge to where the scores cross, between the tab and the ${glued} wall: the tab stays on its own wall.`,
      `${trim > 0 ? `Trim ${lengthText(trim, units)} off the edge of each tab that will lie along the ${floor}` : 'Leave each tab as wide as its wall'}${taper > 0 ? `, and lean both of its long edges in by ${String(taper)}° towards its free end` : ''}.`,
      ...(given.thumbNotch
        ? [
            `Cut a half-round thumb notch ${lengthText(wide, units)} wide in the middle of the rim of both ${glued} walls.`,
          ]
        : []),
    ],
    actions: [
      { do: 'trim-tabs', sheet: blank.name, at, trim, taper },
      ...(given.thumbNotch
        ? [
            {
              do: 'thumb-notches' as const,
              sheet: blank.name,
              at: at === 'ends' ? ('sides' as const) : ('ends' as const),
              wide,
            },
          ]
        : []),
    ],
  }
}

/** The notches of a square that stands on a corner, between its scores. */
const cornerCutting = (blank: Blank): Cutting => ({
  sentences: ['Cut out the notch at each corner of the pocket, from the edge along the scores to where they cross.'],
  actions: [{ do: 'cut-notches', sheet: blank.name }],
})

/** Parts cut away anywhere else, by the points they run through. */
function plainCutting(blank: Blank, frame: SheetFrame, units: RulerUnit): Cutting {
  const point = (p: Point): Point => ({ x: shown(p.x, units), y: shown(p.y, units) })
  const straight = frame.waste.filter((part) => !isCurved(part))
  const at = (p: Point): string => `${bareLength(p.x, units)}, ${bareLength(p.y, units)}`
  return {
    sentences:
      straight.length === 0
        ? []
        : [
            `Points are across from the left edge, then up from the bottom edge, in ${units === 'mm' ? 'millimetres' : 'inches'}.`,
            ...straight.map((part) => `Cut away through ${part.map(at).join(' · ')}.`),
          ],
    actions: [
      ...frame.waste.map((part): StepAction => ({
        do: 'cut-away',
        sheet: blank.name,
        points: part.map(point),
      })),
      ...frame.slits.map((slit): StepAction => ({
        do: 'slit',
        sheet: blank.name,
        from: point(slit.from),
        to: point(slit.to),
      })),
    ],
  }
}

/** Cutting away notches, corners and the edges of tabs. */
export function notchStep(set: ExportSet, piece: ExportPiece, blank: Blank): Step | null {
  const frame = sheetFrame(blank)
  if (frame.waste.length === 0 && frame.slits.length === 0) return null
  const { units } = set
  const isEnvelope = frame.rough.turn === 45 && blank.scores.length > 0
  const { sentences, actions } =
    trayCutting(piece, blank, units) ?? (isEnvelope ? cornerCutting(blank) : plainCutting(blank, frame, units))
  const { corner } = piece.folded.given
  const rounded = corner > 0 && blank.name === piece.name
  return step(
    `Cut out ${sheetWords(blank)}`,
    [
      ...sentences,
      ...(rounded
        ? [`Round the ${isEnvelope ? 'point of the seal flap' : 'outer corners'} to ${lengthText(corner, units)}.`]
        : []),
    ],
    { actions, figure: { sheet: blank.name, stage: 'cut' } },
  )
}
