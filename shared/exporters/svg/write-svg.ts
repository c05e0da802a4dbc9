import { dashLine } from '../../drawing/dash-line.ts'
import type { Drawing, LayerName, LineMark, Mark } from '../../drawing/drawing.ts'
import { dashFor, layerOrder, layerTitles, lineStyles, narrowLine, wideLine } from '../../drawing/line-styles.ts'
import type { Point } from '../../geometry/shapes.ts'
import type { Millimetres } from '../../units/units.ts'

export interface SvgOptions {
  readonly title: string
  readonly description: string
  /** Shown part of the plane, its lower left and size. */
  readonly box: {
    readonly left: Millimetres
    readonly bottom: Millimetres
    readonly width: Millimetres
    readonly height: Millimetres
  }
  /** Only these layers; `null` for all. */
  readonly layers: ReadonlySet<LayerName> | null
  /** Dashes drawn as strokes of their own, for machines that draw no patterns. */
  readonly areDashesDrawn: boolean
  /** Colour of every line: one neutral colour for cutters, `currentColor` on a page. */
  readonly colour: string
}

/** Text safe in XML: control characters left out, marks of its syntax written as entities. */
export const escapeXml = (content: string): string =>
  [...content]
    .filter((character) => {
      const code = character.codePointAt(0) ?? 0
      return code >= 32 && code !== 127 && (code < 0xd800 || code > 0xdfff) && code !== 0xfffe && code !== 0xffff
    })
    .join('')
    .replace(/&/g, '&amp;')
    .replace(/</g, '&lt;')
    .replace(/>/g, '&gt;')
    .replace(/"/g, '&quot;')
    .replace(/'/g, '&apos;')

const num = (value: number): string => {
  const rounded = Math.round(value * 1e6) / 1e6
  return Object.is(rounded, -0) ? '0' : String(rounded)
}

function pathData(points: readonly Point[], isClosed: boolean, place: (p: Point) => Point): string {
  const moved = points.map(place)
  return `${moved.map(({ x, y }, index) => `${index === 0 ? 'M' : 'L'}${num(x)} ${num(y)}`).join('')}${isClosed ? 'Z' : ''}`
}

const lengthOf = (points: readonly Point[]): number =>
  points.reduce((sum, p, index) => {
    const before = points[index - 1]
    return before === undefined ? sum : sum + Math.hypot(p.x - before.x, p.y - before.y)
  }, 0)

function lineElement(mark: LineMark, options: SvgOptions, place: (p: Point) => Point): string {
  const style = lineStyles[mark.layer]
  const isOwn = mark.weight === 'own'
  const first = mark.points[0]
  const dash = isOwn
    ? dashFor(style, lengthOf(mark.isClosed && first !== undefined ? [...mark.points, first] : mark.points))
    : []
  const width = isOwn ? style.width : mark.weight === 'wide' ? wideLine : narrowLine
  const cap = isOwn && style.isRoundEnded ? ' stroke-linecap="round"' : ''
  if (dash.length > 0 && options.areDashesDrawn) {
    const closed = mark.isClosed && first !== undefined ? [...mark.points, first] : mark.points
    const data = dashLine(closed, dash, style.width)
      .map(({ from, to }) => pathData([from, to], false, place))
      .join('')
    return `<path d="${data}" stroke-width="${num(width)}"/>`
  }
  const pattern = dash.length > 0 ? ` stroke-dasharray="${dash.map(num).join(' ')}"` : ''
  return `<path d="${pathData(mark.points, mark.isClosed, place)}" stroke-width="${num(width)}"${cap}${pattern}/>`
}

function markElement(mark: Mark, options: SvgOptions, place: (p: Point) => Point): string {
  switch (mark.kind) {
    case 'line':
      return lineElement(mark, options, place)
    case 'fill':
      return `<path d="${pathData(mark.polygon, true, place)}" fill="${options.colour}" stroke="none"/>`
    case 'text': {
      const at = place(mark.at)
      const turn = mark.angle === 0 ? '' : ` transform="rotate(${num(-mark.angle)} ${num(at.x)} ${num(at.y)})"`
      const weight = mark.isBold ? ' font-weight="700"' : ''
      return `<text x="${num(at.x)}" y="${num(at.y)}" font-size="${num(mark.size)}" text-anchor="${mark.anchor}"${weight}${turn} fill="${options.colour}" stroke="none" unicode-bidi="plaintext">${escapeXml(mark.text)}</text>`
    }
  }
}

/** A drawing as SVG at true size: one user unit is one millimetre, one group an operation, y downwards as SVG has it. */
export function writeSvg(drawing: Drawing, options: SvgOptions): string {
  const { left, bottom, width, height } = options.box
  const place = (p: Point): Point => ({ x: p.x - left, y: height - (p.y - bottom) })
  const groups = layerOrder.flatMap((layer) => {
    if (options.layers !== null && !options.layers.has(layer)) return []
    const marks = drawing.marks.filter((mark) => mark.layer === layer)
    if (marks.length === 0) return []
    const body = marks.map((mark) => markElement(mark, options, place)).join('\n')
    return [
      `<g id="${layerTitles[layer].toLowerCase().replace(/ /g, '-')}" data-layer="${layerTitles[layer]}">\n<title>${layerTitles[layer]}</title>\n${body}\n</g>`,
    ]
  })
  return `<?xml version="1.0" encoding="UTF-8"?>
<svg xmlns="http://www.w3.org/2000/svg" width="${num(width)}mm" height="${num(height)}mm" viewBox="0 0 ${num(width)} ${num(height)}" role="img" fill="none" stroke="${options.colour}" font-family="'JetBrains Mono', monospace">
<title>${escapeXml(options.title)}</title>
<desc>${escapeXml(options.description)}</desc>
${groups.join('\n')}
</svg>
`
}
