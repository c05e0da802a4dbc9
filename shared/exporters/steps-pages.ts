import { drawFigure } from '../drawing/draw-figure.ts'
import { besideFigure, flowBlocks, framed, gap, heading, paragraph, table, type Block } from '../drawing/flow.ts'
import { roomOn, type PageFrame, type PagePlan } from '../drawing/page-frame.ts'
import { placeDrawing } from '../drawing/place-drawing.ts'
import type { Blank } from '../pieces/blank.ts'
import type { Millimetres } from '../units/units.ts'
import type { ExportSet } from './export-set.ts'
import type { Step } from './steps/step.ts'

const figureWidth: Millimetres = 42
const figureHeight: Millimetres = 32

const blankNamed = (set: ExportSet, name: string): Blank | null =>
  set.pieces.flatMap((piece) => piece.sheets).find((sheet) => sheet.blank.name === name)?.blank ?? null

function stepBlocks(
  set: ExportSet,
  one: Step,
  number: number,
  width: Millimetres,
  size: Millimetres,
  most: Millimetres,
): readonly Block[] {
  const blank = one.figure === null ? null : blankNamed(set, one.figure.sheet)
  const hasFigure = one.figure !== null && blank !== null && width > 2.4 * figureWidth
  const textWidth = hasFigure ? width - figureWidth - 4 : one.isStop ? width - 4 : width
  const title = `${String(number)}. ${one.isStop ? 'STOP. ' : ''}${one.title}`.trimEnd()
  const lines: readonly Block[] = [
    ...paragraph(title, textWidth, { size: size * 1.1, isBold: true, role: 'heading', keepsNext: true }),
    ...one.sentences.flatMap((sentence) => paragraph(sentence, textWidth, { size, indent: size * 1.4, bullet: '-' })),
    ...(one.table === null
      ? []
      : [
          gap(1),
          ...table(
            one.table.head,
            one.table.rows,
            one.table.head.map(() => 1),
            textWidth,
            size * 0.85,
          ),
        ]),
  ]
  const high = lines.reduce((sum, each) => sum + each.height, 0)
  if (hasFigure && high <= most) {
    const figure = drawFigure(blank, one.figure.stage, figureWidth, figureHeight)
    const move = (marks: typeof figure.marks, x: Millimetres, y: Millimetres) =>
      placeDrawing({ marks }, { x, y, turn: 0, scale: 1 })
    return [besideFigure(lines, figure, move, width), gap(size * 0.9)]
  }
  return one.isStop ? [...framed(lines, width, most), gap(size * 0.9)] : [...lines, gap(size * 0.9)]
}

/** The steps as pages of a document. @param size body of the type; large print is 22 points and more */
export function stepsPages(
  set: ExportSet,
  steps: readonly Step[],
  frame: PageFrame,
  size: Millimetres,
): readonly PagePlan[] {
  const room = roomOn(frame, false)
  const width = room.right - room.left
  const blocks: readonly Block[] = [
    ...heading('Steps', width, size * 1.4),
    ...paragraph(
      `All measures are in ${set.units === 'mm' ? 'millimetres' : 'inches'}. Turn every sheet the same way each time.`,
      width,
      { size },
    ),
    gap(size),
    ...steps.flatMap((one, index) => stepBlocks(set, one, index + 1, width, size, room.top - room.bottom)),
  ]
  return flowBlocks(blocks, room).map((marks, index) => ({
    title: index === 0 ? 'Steps' : 'Steps, continued',
    aside: `measures in ${set.units === 'mm' ? 'millimetres' : 'inches'}`,
    isTurned: false,
    marks,
  }))
}
