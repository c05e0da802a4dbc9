import type { Bounds } from '../geometry/bounds.ts'
import { movePolygon, rotation } from '../geometry/transform.ts'
import type { Blank } from '../pieces/blank.ts'
import type { Millimetres } from '../units/units.ts'
import { drawBlank } from './draw-blank.ts'
import { line, type Mark } from './drawing.ts'
import { fitScaled } from './fit-on-page.ts'
import { placeDrawing } from './place-drawing.ts'
import { roughSheetOf } from './rough-sheet.ts'
import { scaleBlank } from './scale-blank.ts'

export interface Figure {
  readonly width: Millimetres
  readonly height: Millimetres
  readonly marks: readonly Mark[]
}

/** A small picture of a sheet at one stage: the rectangle it is cut as, that with its scores, or the finished blank. */
export function drawFigure(
  blank: Blank,
  stage: 'sheet' | 'scored' | 'cut',
  width: Millimetres,
  height: Millimetres,
): Figure {
  const rough = roughSheetOf(blank)
  const room: Bounds = { left: 1, bottom: 1, right: width - 1, top: height - 1 }
  // As the maker has it before them: a square that stands on a corner when folded is cut and scored lying square.
  const turn = rough.turn === 0 ? null : rotation(-rough.turn)
  const laid = turn === null ? rough.corners : movePolygon(rough.corners, turn)
  const placement = fitScaled(laid, room)
  const drawn = drawBlank(scaleBlank(blank, placement.scale), { units: 'mm', isBare: true }).marks.filter((mark) => {
    if (stage === 'cut') return mark.layer !== 'position'
    return stage === 'scored' && (mark.layer === 'valley' || mark.layer === 'mountain')
  })
  const corners = rough.corners.map(({ x, y }) => ({ x: x * placement.scale, y: y * placement.scale }))
  const sheet = stage === 'cut' ? [] : [line('cut', corners, { isClosed: true })]
  return {
    width,
    height,
    marks: placeDrawing({ marks: [...drawn, ...sheet] }, { ...placement, turn: placement.turn - rough.turn, scale: 1 }),
  }
}
