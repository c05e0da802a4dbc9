import { drawBlank } from '../drawing/draw-blank.ts'
import type { Drawing, LayerName } from '../drawing/drawing.ts'
import { layerTitles } from '../drawing/line-styles.ts'
import { boundsOf, heightOf, widthOf } from '../geometry/bounds.ts'
import { writeDxf } from './dxf/write-dxf.ts'
import type { ExportSet, ExportSheet } from './export-set.ts'
import { fileName, separateLayers, type ExportedFile } from './exported-file.ts'
import { writeSvg } from './svg/write-svg.ts'

export interface DrawingOptions {
  readonly format: 'svg' | 'dxf'
  readonly isSeparate: boolean
  readonly areDashesDrawn: boolean
  readonly pieces: readonly string[] | null
}

/** White round an SVG drawing, so that half a line's width is not cut off. */
const border = 1

function sheetFiles(set: ExportSet, sheet: ExportSheet, options: DrawingOptions): readonly ExportedFile[] {
  const drawing: Drawing = drawBlank(sheet.blank, { units: set.units })
  const bounds = boundsOf(sheet.blank.outline)
  const write = (layers: ReadonlySet<LayerName> | null): string =>
    options.format === 'dxf'
      ? writeDxf(drawing, { units: set.units, layers, areDashesDrawn: options.areDashesDrawn })
      : writeSvg(drawing, {
          title: `${sheet.blank.name} · ${set.title}`,
          description: `Make ${String(sheet.copies)}. True size, one user unit is one millimetre. ${set.version}, digest ${set.digest}.${set.draft === null ? '' : ` DRAFT: ${set.draft}.`}`,
          box: {
            left: -border,
            bottom: -border,
            width: widthOf(bounds) + 2 * border,
            height: heightOf(bounds) + 2 * border,
          },
          layers,
          areDashesDrawn: options.areDashesDrawn,
          colour: '#000',
        })
  const units = options.format === 'dxf' ? set.units : 'mm'
  const draft = set.draft === null ? '' : 'draft'
  if (!options.isSeparate)
    return [{ name: `${fileName(set.name, sheet.blank.name, draft, units)}.${options.format}`, content: write(null) }]
  const present = separateLayers.filter((layer) => drawing.marks.some((mark) => mark.layer === layer))
  return present.map((layer) => ({
    name: `${fileName(set.name, sheet.blank.name, draft, layerTitles[layer], units)}.${options.format}`,
    content: write(new Set([layer])),
  }))
}

/** One drawing a sheet, or one for every operation on it. */
export const exportDrawings = (set: ExportSet, options: DrawingOptions): readonly ExportedFile[] =>
  set.pieces
    .filter((piece) => options.pieces === null || options.pieces.includes(piece.name))
    .flatMap((piece) => piece.sheets)
    .flatMap((sheet) => sheetFiles(set, sheet, options))
