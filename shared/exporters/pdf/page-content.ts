import type { LayerName, Page, TextMark } from '../../drawing/drawing.ts'
import { dashFor, lineStyles, narrowLine, wideLine } from '../../drawing/line-styles.ts'
import type { Point } from '../../geometry/shapes.ts'
import { runsOf, type UsedFont } from './pdf-fonts.ts'

/** A piece of tagged text: its place in the page's content and what it is. */
export interface TaggedText {
  readonly id: number
  readonly role: TextMark['role']
}

export interface PageContent {
  readonly stream: string
  readonly layers: ReadonlySet<LayerName>
  readonly tagged: readonly TaggedText[]
}

/** Coordinates to a ten-thousandth of a millimetre; what is rounded so needs no exponent. */
const num = (value: number): string => String(Math.round(value * 10000) / 10000 || 0)

const at = ({ x, y }: Point): string => `${num(x)} ${num(y)}`

const path = (points: readonly Point[], isClosed: boolean): string =>
  `${points.map((p, index) => `${at(p)} ${index === 0 ? 'm' : 'l'}`).join('\n')}${isClosed ? '\nh' : ''}`

function lengthOf(points: readonly Point[]): number {
  let total = 0
  for (let index = 1; index < points.length; index += 1) {
    const [a, b] = [points[index - 1], points[index]]
    if (a !== undefined && b !== undefined) total += Math.hypot(b.x - a.x, b.y - a.y)
  }
  return total
}

/** One line of text, begun so far left of its place as its anchor asks; every character is one cell wide. */
function textOperators(mark: TextMark, fonts: readonly UsedFont[]): string {
  const runs = runsOf(mark.text, fonts)
  const cells = runs.reduce((sum, run) => sum + run.cells, 0)
  const width = cells * 0.6 * mark.size
  const back = mark.anchor === 'start' ? 0 : mark.anchor === 'middle' ? width / 2 : width
  const turn = (mark.angle * Math.PI) / 180
  const [c, s] = [Math.cos(turn), Math.sin(turn)]
  const start = { x: mark.at.x - c * back, y: mark.at.y - s * back }
  const parts = runs.map((run) => `/${run.used.name} ${num(mark.size)} Tf <${run.hex}> Tj`)
  return `BT\n${num(c)} ${num(s)} ${num(-s)} ${num(c)} ${at(start)} Tm\n${parts.join('\n')}\nET`
}

const roleTags = { title: 'H1', heading: 'H2', paragraph: 'P', label: 'Span' } as const

/**
 * Content of a page: marks in the order given, gathered into runs of one layer, each run marked as optional content of
 * its layer and painted in that layer's own spot colour; text is tagged in reading order, lines are artifacts.
 */
export function pageContent(
  page: Page,
  fontsFor: (isBold: boolean) => readonly UsedFont[],
  shown: ReadonlySet<LayerName> | null,
): PageContent {
  const out: string[] = [`${num(72 / 25.4)} 0 0 ${num(72 / 25.4)} 0 0 cm`]
  const layers = new Set<LayerName>()
  const tagged: TaggedText[] = []
  let current: LayerName | null = null
  let state = ''
  let isArtifact = false
  const endArtifact = (): void => {
    if (isArtifact) out.push('EMC')
    isArtifact = false
  }
  const endLayer = (): void => {
    endArtifact()
    if (current !== null) out.push('Q', 'EMC')
    current = null
    state = ''
  }
  for (const mark of page.marks) {
    if (shown !== null && !shown.has(mark.layer)) continue
    if (mark.layer !== current) {
      endLayer()
      current = mark.layer
      layers.add(mark.layer)
      out.push(`/OC /L_${mark.layer} BDC`, 'q', '/Over gs', `/S_${mark.layer} CS 1 SCN /S_${mark.layer} cs 1 scn`)
    }
    if (mark.kind === 'text') {
      if (mark.text === '') continue
      endArtifact()
      const id = tagged.length
      tagged.push({ id, role: mark.role })
      out.push(`/${roleTags[mark.role]} <</MCID ${String(id)}>> BDC`, textOperators(mark, fontsFor(mark.isBold)), 'EMC')
      continue
    }
    if (!isArtifact) {
      out.push('/Artifact BMC')
      isArtifact = true
    }
    if (mark.kind === 'fill') {
      out.push(path(mark.polygon, true), 'f')
      continue
    }
    const style = lineStyles[mark.layer]
    const isOwn = mark.weight === 'own'
    const closing = mark.isClosed && mark.points[0] !== undefined ? [...mark.points, mark.points[0]] : mark.points
    const dash = isOwn ? dashFor(style, lengthOf(closing)) : []
    const width = isOwn ? style.width : mark.weight === 'wide' ? wideLine : narrowLine
    const wanted = `${num(width)} w ${isOwn && style.isRoundEnded ? '1' : '0'} J [${dash.map(num).join(' ')}] 0 d`
    if (wanted !== state) {
      out.push(wanted)
      state = wanted
    }
    out.push(path(mark.points, mark.isClosed), 'S')
  }
  endLayer()
  return { stream: `${out.join('\n')}\n`, layers, tagged }
}

export { roleTags }
