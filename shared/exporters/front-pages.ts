import { lineStyles, layerOrder } from '../drawing/line-styles.ts'
import { line, text, type LayerName, type Mark } from '../drawing/drawing.ts'
import { flowBlocks, framed, gap, heading, paragraph, table, type Block } from '../drawing/flow.ts'
import { lengthText, sizeText } from '../drawing/length-text.ts'
import { roomOn, type PageFrame, type PagePlan } from '../drawing/page-frame.ts'
import { roughSheetOf } from '../drawing/rough-sheet.ts'
import { barLengths, correctionRows, windowText } from '../drawing/scale-bar.ts'
import { capHeight } from '../drawing/text-width.ts'
import type { Millimetres } from '../units/units.ts'
import { stockTitle, type ExportSet } from './export-set.ts'
import { cautions, tools } from './steps/cautions.ts'

/** Type larger than this leaves no room for tables of figures. */
const largest: Millimetres = 5

const legendLayers: readonly LayerName[] = layerOrder.filter((layer) => layer !== 'legend')

/** One row of the legend: the line as it is drawn, its word, its letter and what to do with it. */
function legendRow(layer: LayerName, width: Millimetres, size: Millimetres): Block {
  const style = lineStyles[layer]
  const sample = 30
  return {
    height: size * (size > largest ? 3.1 : 1.9),
    keepsNext: false,
    draw: (left, top) => {
      const middle = top - size * 0.95
      const base = middle - (size * capHeight) / 2
      const strokes: Mark[] =
        layer === 'glue'
          ? Array.from({ length: 13 }, (_, index) =>
              line(
                'glue',
                [
                  { x: left + 1 + index * 2.2, y: middle - 1.6 },
                  { x: left + 2.8 + index * 2.2, y: middle + 1.6 },
                ],
                { weight: 'plain' },
              ),
            )
          : [
              line(layer, [
                { x: left, y: middle },
                { x: left + sample, y: middle },
              ]),
            ]
      const word = style.tick === '' ? style.word : `${style.word} (${style.tick})`
      return [
        ...strokes,
        text('legend', { x: left + sample + 4, y: base }, word, size, { isBold: true, role: 'paragraph' }),
        size > largest
          ? text('legend', { x: left + size, y: base - size * 1.3 }, style.meaning, size, { role: 'paragraph' })
          : text('legend', { x: left + sample + 4 + size * 9, y: base }, style.meaning, size, { role: 'paragraph' }),
      ].filter((mark) => mark.kind !== 'text' || mark.at.x < left + width)
    },
  }
}

function scaleBlocks(frame: PageFrame, width: Millimetres, size: Millimetres): readonly Block[] {
  const room = roomOn(frame, false)
  const bars = barLengths(room.right - room.left)
  const rows = correctionRows(bars)
  const inner = width - 4
  return framed(
    [
      ...paragraph('Scale check: print this page alone first', inner, {
        size: size * 1.15,
        isBold: true,
        role: 'heading',
      }),
      ...paragraph(
        `Lay a ruler along both bars at the edges of this page. ${windowText(bars, frame.window)} The bar up the side is checked against its own figures in the same way.`,
        inner,
        { size },
      ),
      ...(size > largest
        ? rows.flatMap((row) => paragraph(`${row.measured} mm: print at ${row.printAt} %`, inner, { size }))
        : [rows.slice(0, 5), rows.slice(5)].flatMap((part) =>
            table(
              ['if it measures (mm)', ...part.map((row) => row.measured)],
              [['print at (%)', ...part.map((row) => row.printAt)]],
              [2.4, 1, 1, 1, 1, 1],
              inner,
              size * 0.9,
            ),
          )),
    ],
    width,
    room.top - room.bottom,
  )
}

/** The cover: scale check, what the set is, its pieces and papers, tools, the legend of lines, and what to take care of. */
export function coverPages(set: ExportSet, frame: PageFrame, size: Millimetres): readonly PagePlan[] {
  const room = roomOn(frame, false)
  const width = room.right - room.left
  const ribbons = set.pieces.flatMap((piece) =>
    piece.folded.form.kind === 'band' && piece.folded.form.ribbon
      ? [[piece.name, '1', 'ribbon', lengthText(piece.folded.form.stripLength.nominal, set.units)]]
      : [],
  )
  const bought = set.pieces
    .filter((piece) => piece.folded.given.kind === 'bought')
    .map((piece) => [piece.name, String(piece.make), 'bought', '–'])
  const rows = set.pieces.flatMap((piece) =>
    piece.sheets.map(({ blank, copies }) => {
      const rough = roughSheetOf(blank)
      return [
        blank.name,
        String(copies),
        blank.stock === null ? '–' : stockTitle(set, blank.stock),
        sizeText(rough.length, rough.width, set.units),
      ]
    }),
  )
  const papers = [
    ...new Set(
      set.pieces.flatMap((piece) => piece.sheets.flatMap(({ blank }) => (blank.stock === null ? [] : [blank.stock]))),
    ),
  ]
  const paperText = (name: string): string => {
    const stock = set.stocks.get(name)
    const weight = stock?.grammage == null ? '' : `, ${String(Math.round(stock.grammage))} g/m²`
    const caliper = stock?.caliper == null ? '' : `, ${stock.caliper.toFixed(2)} mm thick`
    return `${stockTitle(set, name)}${weight}${caliper}`
  }
  const blocks: readonly Block[] = [
    ...heading(set.title, width, size * 1.9, 'title'),
    ...(set.family === null
      ? []
      : paragraph(
          `From the family ${set.family.title}${set.family.mark === null ? '' : ` (${set.family.mark})`}.`,
          width,
          { size },
        )),
    ...paragraph(
      `${set.version} · digest ${set.digest} · checked ${set.asOf} with Foldgauge ${set.engine} · measures in ${set.units === 'mm' ? 'millimetres' : 'inches'}`,
      width,
      { size },
    ),
    gap(2),
    ...scaleBlocks(frame, width, size),
    ...heading('Pieces', width, size * 1.2),
    ...table(['piece', 'make', 'paper', 'cut to'], [...rows, ...bought, ...ribbons], [3, 1, 3, 3], width, size),
    ...heading('Papers', width, size * 1.2),
    ...papers.flatMap((name) =>
      paragraph(paperText(name), width, { size, indent: Math.max(4, size * 1.4), bullet: '-' }),
    ),
    ...heading('Tools', width, size * 1.2),
    ...paragraph(`${tools.join(', ')}.`, width, { size }),
    ...heading('Lines', width, size * 1.2),
    ...legendLayers.map((layer) => legendRow(layer, width, size)),
    ...heading('Take care', width, size * 1.2),
    ...cautions.flatMap((caution) => paragraph(caution, width, { size, indent: Math.max(4, size * 1.4), bullet: '-' })),
  ]
  return flowBlocks(blocks, room).map((marks, index) => ({
    title: index === 0 ? 'Start here' : 'Start here, continued',
    aside: 'print this page alone and measure its bars',
    isTurned: false,
    marks,
  }))
}
