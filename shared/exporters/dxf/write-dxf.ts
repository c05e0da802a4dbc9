import { DxfWriter, LWPolylineFlags, point2d, point3d, TextHorizontalAlignment, Units } from '@tarikjabiri/dxf'
import { dashLine } from '../../drawing/dash-line.ts'
import type { Drawing, LayerName } from '../../drawing/drawing.ts'
import { layerOrder, layerTitles, lineStyles } from '../../drawing/line-styles.ts'
import type { Point } from '../../geometry/shapes.ts'
import { millimetresPerInch } from '../../units/format-length.ts'
import type { RulerUnit } from '../../units/units.ts'

export interface DxfOptions {
  readonly units: RulerUnit
  readonly layers: ReadonlySet<LayerName> | null
  readonly areDashesDrawn: boolean
}

/** Index of the colour that shows black on white and white on black: one neutral colour for all. */
const neutral = 7

/** DXF text is one line of a file: control characters end it, so they go; a caret and a percent sign start codes. */
const safeText = (content: string): string =>
  [...content]
    .filter((character) => (character.codePointAt(0) ?? 0) >= 32)
    .join('')
    .replace(/\^/g, '^ ')
    .replace(/%%/g, '%')

const layerName = (layer: LayerName): string => layerTitles[layer].toUpperCase().replace(/ /g, '_')

/**
 * A drawing as DXF (2007, UTF-8), one layer an operation, outlines as closed polylines, coordinates in the unit that
 * `$INSUNITS` declares. Readers may ignore that variable, so file names say the unit too.
 */
export function writeDxf(drawing: Drawing, options: DxfOptions): string {
  const writer = new DxfWriter()
  const isMetric = options.units === 'mm'
  const scale = isMetric ? 1 : 1 / millimetresPerInch
  writer.setUnits(isMetric ? Units.Millimeters : Units.Inches)
  writer.setVariable('$MEASUREMENT', { 70: isMetric ? 1 : 0 })
  const place = ({ x, y }: Point): Point => ({ x: x * scale, y: y * scale })
  const isShown = (layer: LayerName): boolean => options.layers === null || options.layers.has(layer)
  const used = layerOrder.filter((layer) => isShown(layer) && drawing.marks.some((mark) => mark.layer === layer))
  const lineTypes = new Map<LayerName, string>()
  for (const layer of used) {
    const { dash } = lineStyles[layer]
    const hasPattern = dash.length > 0 && !options.areDashesDrawn
    if (hasPattern) {
      const elements = dash.map((part, index) => (index % 2 === 0 ? part : -part) * scale)
      writer.addLType(layerName(layer), lineStyles[layer].word, elements)
      lineTypes.set(layer, layerName(layer))
    }
    writer.addLayer(layerName(layer), neutral, lineTypes.get(layer) ?? 'Continuous')
  }
  const polyline = (layer: LayerName, points: readonly Point[], isClosed: boolean): void => {
    writer.addLWPolyline(
      points.map((p) => ({ point: point2d(place(p).x, place(p).y) })),
      { layerName: layerName(layer), flags: isClosed ? LWPolylineFlags.Closed : LWPolylineFlags.None },
    )
  }
  for (const mark of drawing.marks) {
    if (!isShown(mark.layer)) continue
    const common = { layerName: layerName(mark.layer) }
    switch (mark.kind) {
      case 'line': {
        const { dash, width } = lineStyles[mark.layer]
        const first = mark.points[0]
        const [from, to] = mark.points
        if (options.areDashesDrawn && mark.weight === 'own' && dash.length > 0) {
          const closed = mark.isClosed && first !== undefined ? [...mark.points, first] : mark.points
          for (const piece of dashLine(closed, dash, width)) {
            const [a, b] = [place(piece.from), place(piece.to)]
            writer.addLine(point3d(a.x, a.y), point3d(b.x, b.y), common)
          }
        } else if (mark.points.length === 2 && from !== undefined && to !== undefined) {
          const [a, b] = [place(from), place(to)]
          writer.addLine(point3d(a.x, a.y), point3d(b.x, b.y), common)
        } else polyline(mark.layer, mark.points, mark.isClosed)
        break
      }
      case 'fill':
        polyline(mark.layer, mark.polygon, true)
        break
      case 'text': {
        const at = place(mark.at)
        const horizontalAlignment = {
          start: TextHorizontalAlignment.Left,
          middle: TextHorizontalAlignment.Center,
          end: TextHorizontalAlignment.Right,
        }[mark.anchor]
        writer.addText(point3d(at.x, at.y), mark.size * 0.73 * scale, safeText(mark.text), {
          ...common,
          rotation: mark.angle,
          horizontalAlignment,
          secondAlignmentPoint: point3d(at.x, at.y),
        })
      }
    }
  }
  return writer.stringify()
}
