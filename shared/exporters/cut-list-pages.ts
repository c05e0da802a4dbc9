import { line, text, type Mark } from '../drawing/drawing.ts'
import { flowBlocks, gap, heading, paragraph, table, type Block } from '../drawing/flow.ts'
import { sizeText } from '../drawing/length-text.ts'
import { roomOn, type PageFrame, type PagePlan } from '../drawing/page-frame.ts'
import { clipText, textWidth } from '../drawing/text-width.ts'
import type { Millimetres } from '../units/units.ts'
import type { PaperList, PaperSheet, Placed } from './cut-list.ts'
import type { ExportSet } from './export-set.ts'

const corners = ({ x, y, length, width }: Placed, scale: number, left: number, bottom: number) => [
  { x: left + x * scale, y: bottom + y * scale },
  { x: left + (x + length) * scale, y: bottom + y * scale },
  { x: left + (x + length) * scale, y: bottom + (y + width) * scale },
  { x: left + x * scale, y: bottom + (y + width) * scale },
]

/** A sheet of paper with what is cut from it, small. */
function layoutMarks(
  sheet: PaperSheet,
  list: PaperList,
  scale: number,
  left: Millimetres,
  bottom: Millimetres,
): readonly Mark[] {
  const label = (placed: Placed, content: string): readonly Mark[] => {
    const [long, high] = [placed.length * scale, placed.width * scale]
    const isUpright = high > long * 1.2
    const size = 2.2
    const words = clipText(content, Math.max(long, high) - 1, size)
    if (Math.min(long, high) < size * 1.3 || textWidth(words, size) < 3) return []
    const at = { x: left + (placed.x + placed.length / 2) * scale, y: bottom + (placed.y + placed.width / 2) * scale }
    return isUpright
      ? [text('legend', { x: at.x + size * 0.36, y: at.y }, words, size, { anchor: 'middle', angle: 90 })]
      : [text('legend', { x: at.x, y: at.y - size * 0.36 }, words, size, { anchor: 'middle' })]
  }
  return [
    line('legend', corners({ x: 0, y: 0, length: list.sheet.length, width: list.sheet.width }, scale, left, bottom), {
      isClosed: true,
      weight: 'wide',
    }),
    ...sheet.placed.flatMap((placed) => [
      line('legend', corners(placed, scale, left, bottom), { isClosed: true, weight: 'plain' }),
      ...label(placed, placed.name),
    ]),
    ...sheet.offcuts.slice(0, 3).flatMap((offcut) => label(offcut, 'left over')),
  ]
}

const sameLayout = (a: PaperSheet, b: PaperSheet): boolean => JSON.stringify(a.placed) === JSON.stringify(b.placed)

/** Equal sheets shown once, with how many of them there are. */
function distinctSheets(
  sheets: readonly PaperSheet[],
): readonly { readonly sheet: PaperSheet; readonly count: number }[] {
  const found: { sheet: PaperSheet; count: number }[] = []
  for (const sheet of sheets) {
    const twin = found.find((other) => sameLayout(other.sheet, sheet))
    if (twin === undefined) found.push({ sheet, count: 1 })
    else twin.count += 1
  }
  return found
}

function paperBlocks(list: PaperList, set: ExportSet, width: Millimetres, size: Millimetres): readonly Block[] {
  const sheetSize = sizeText(list.sheet.length, list.sheet.width, set.units)
  const scale = Math.min((width * 0.45) / list.sheet.length, 60 / list.sheet.width)
  const [wide, high] = [list.sheet.length * scale, list.sheet.width * scale]
  const perRow = Math.max(1, Math.floor((width + 6) / (wide + 6)))
  const shown = distinctSheets(list.sheets)
  const rows: Block[] = []
  for (let start = 0; start < shown.length; start += perRow) {
    const row = shown.slice(start, start + perRow)
    rows.push({
      height: high + 8,
      keepsNext: false,
      draw: (left, top) =>
        row.flatMap(({ sheet, count }, index) => {
          const x = left + index * (wide + 6)
          const caption = `${String(count)} × like this`
          return [
            ...layoutMarks(sheet, list, scale, x, top - high - 1),
            text('legend', { x, y: top - high - 4.6 }, caption, size * 0.85, { role: 'paragraph' }),
          ]
        }),
    })
  }
  const offcuts = list.sheets.flatMap((sheet) => sheet.offcuts)
  const buy = list.sheets.length
  return [
    ...heading(
      `${list.title}: ${String(buy)} ${buy === 1 ? 'sheet' : 'sheets'} of ${list.sheet.name === sheetSize ? sheetSize : `${list.sheet.name} (${sheetSize})`}`,
      width,
      size * 1.15,
    ),
    ...paragraph('The last two columns: how many one sheet yields.', width, { size, keepsNext: true }),
    ...table(
      ['piece', 'make', 'cut to', 'straight cuts', 'by knife'],
      list.items.map((item) => [
        item.name,
        String(item.copies),
        sizeText(item.length, item.width, set.units),
        String(item.guillotine),
        String(item.knife),
      ]),
      [3, 1, 3, 2.4, 1.2],
      width,
      size,
    ),
    ...list.tooLarge.flatMap((item) =>
      paragraph(`${item.name} does not go on a sheet of this size: buy a larger one.`, width, { size, isBold: true }),
    ),
    ...(list.fromOffcuts.length === 0
      ? []
      : paragraph(`From what the others leave over: ${list.fromOffcuts.join(', ')}.`, width, { size })),
    ...(offcuts.length === 0
      ? []
      : paragraph(
          `Left over in one piece, the largest first: ${offcuts
            .toSorted((a, b) => b.length * b.width - a.length * a.width)
            .slice(0, 4)
            .map((rest) => sizeText(rest.length, rest.width, set.units))
            .join(', ')}.`,
          width,
          { size },
        )),
    gap(2),
    ...rows,
  ]
}

/** The cut list of a set, paper by paper, with the buying list in front. */
export function cutListPages(
  set: ExportSet,
  lists: readonly PaperList[],
  frame: PageFrame,
  size: Millimetres,
): readonly PagePlan[] {
  const room = roomOn(frame, false)
  const width = room.right - room.left
  const buying = lists.map(
    (list) =>
      `${list.title}: ${String(list.sheets.length)} × ${sizeText(list.sheet.length, list.sheet.width, set.units)}`,
  )
  const blocks: readonly Block[] = [
    ...heading('To buy', width, size * 1.2),
    ...buying.flatMap((content) => paragraph(content, width, { size, indent: 4, bullet: '-' })),
    ...paragraph(
      'One sheet more of each lets you begin again once. Layouts use straight cuts from edge to edge only; lay pieces so that the grain runs as drawn on them.',
      width,
      { size },
    ),
    ...lists.flatMap((list) => paperBlocks(list, set, width, size)),
  ]
  return flowBlocks(blocks, room).map((marks, index) => ({
    title: index === 0 ? 'Cut list' : 'Cut list, continued',
    aside: 'what to buy and how to cut it',
    isTurned: false,
    marks,
  }))
}
