import type { AxisReport, FitReport, PieceReport, Report } from '../../../shared/report/report.ts'
import { factorFor, rectangle, type NestGap, type NestName, type NestPicture, type NestShape } from './nest-picture.ts'

type Along = 'length' | 'width'

const axisOf = (fit: FitReport, name: AxisReport['axis']): AxisReport | undefined =>
  fit.axes.find(({ axis }) => axis === name)

const wallOf = (piece: PieceReport | undefined, along: Along): number => {
  const inside = piece?.inside?.[along].nominal
  const outside = piece?.outside?.[along].nominal
  const thin = piece?.caliper ?? 0.2
  return inside === undefined || outside === undefined ? thin : Math.max((outside - inside) / 2, thin)
}

/** The box with what lies in it and what goes over and around it, from the inside out. */
interface Assembly {
  readonly base: string
  readonly contents: readonly FitReport[]
  readonly covers: readonly FitReport[]
}

function assembliesOf(report: Report): readonly Assembly[] {
  return Object.entries(report.pieces)
    .filter(
      ([name, piece]) =>
        piece.inside?.depth !== undefined && !report.fits.some((fit) => fit.relation === 'over' && fit.put === name),
    )
    .filter(([, piece]) => piece.kind !== 'bag')
    .map(([base]) => {
      const over = report.fits.filter((fit) => fit.relation === 'over' && fit.to === base)
      const closed = new Set([base, ...over.map((fit) => fit.put)])
      return {
        base,
        contents: report.fits.filter((fit) => fit.relation === 'in' && fit.to === base),
        covers: [...over, ...report.fits.filter((fit) => fit.relation === 'around' && closed.has(fit.to))],
      }
    })
    .filter(({ contents, covers }) => contents.length + covers.length > 0)
}

/** Grows the picture outwards, one cover after another. */
interface Growing {
  half: number
  bottom: number
  top: number
  readonly shapes: NestShape[]
  readonly gaps: NestGap[]
  readonly names: NestName[]
  readonly clashes: NestShape[]
}

const gapOf = (fit: FitReport, axis: AxisReport, from: NestGap['from'], to: NestGap['to']): NestGap => ({
  fit: fit.id,
  axis: axis.axis,
  verdict: fit.verdict,
  clearance: axis.clearance.nominal,
  from,
  to,
})

function bothSides(
  growing: Growing,
  piece: string,
  slant: 1 | -1,
  [inner, outer]: readonly [number, number],
  [bottom, top]: readonly [number, number],
): void {
  growing.shapes.push(
    { piece, look: 'wall', slant, outline: rectangle(-outer, bottom, -inner, top) },
    { piece, look: 'wall', slant, outline: rectangle(inner, bottom, outer, top) },
  )
}

/** Where two pieces claim the same place. */
function clash(growing: Growing, piece: string, from: number, to: number, bottom: number, top: number): void {
  if (to <= from) return
  for (const side of [-1, 1])
    growing.clashes.push({
      piece,
      look: 'clash',
      slant: 1,
      outline: rectangle(Math.min(side * from, side * to), bottom, Math.max(side * from, side * to), top),
    })
}

function addContents(
  report: Report,
  { base, contents }: Assembly,
  along: Along,
  factor: number,
  growing: Growing,
): void {
  const piece = report.pieces[base]
  const half = (piece?.inside?.[along].nominal ?? 0) / 2
  const room = piece?.inside?.depth?.nominal ?? 0
  const heights = contents.map((fit) => {
    const put = report.pieces[fit.put]
    return fit.pack?.nominal ?? put?.outside?.height.nominal ?? room / contents.length
  })
  const total = heights.reduce((sum, height) => sum + height, 0)
  const squeeze = contents.length > 1 && total > room ? room / total : 1
  let floor = 0
  contents.forEach((fit, index) => {
    const height = (heights[index] ?? 0) * squeeze
    const axis = axisOf(fit, along)
    const inner = axis === undefined ? half * 0.9 : half - (factor * axis.clearance.nominal) / 2
    const layers = Math.min(fit.count, 24)
    for (let layer = 0; layer < layers; layer += 1)
      growing.shapes.push({
        piece: fit.put,
        look: 'body',
        slant: 1,
        outline: rectangle(-inner, floor + (height * layer) / layers, inner, floor + (height * (layer + 1)) / layers),
      })
    if (axis !== undefined) {
      const y = floor + height * 0.5
      growing.gaps.push(gapOf(fit, axis, { x: inner, y }, { x: half, y }))
      clash(growing, fit.put, half, inner, floor, floor + height)
    }
    const depth = axisOf(fit, 'depth')
    if (depth !== undefined && along === 'length')
      growing.gaps.push(gapOf(fit, depth, { x: -half * 0.45, y: floor + height }, { x: -half * 0.45, y: room }))
    growing.names.push({
      text: fit.count > 1 ? `${String(fit.count)} × ${fit.put}` : fit.put,
      at: { x: 0, y: floor + height / 2 },
    })
    floor += height
  })
  growing.top = Math.max(growing.top, floor)
}

function addLid(report: Report, fit: FitReport, along: Along, factor: number, slant: 1 | -1, growing: Growing): void {
  const lid = report.pieces[fit.put]
  const axis = axisOf(fit, along)
  const depth = lid?.inside?.depth?.nominal ?? 0
  const rest = Math.max(fit.seat?.z ?? growing.top, growing.top)
  const gap = (axis?.clearance.nominal ?? 0) / 2
  const inner = growing.half + factor * gap
  const thick = factor * wallOf(lid, along)
  const roof = Math.max(factor * (lid?.caliper ?? 0.3), growing.half / 70)
  bothSides(growing, fit.put, slant, [inner, inner + thick], [rest - depth, rest + roof])
  growing.shapes.push({ piece: fit.put, look: 'wall', slant, outline: rectangle(-inner, rest, inner, rest + roof) })
  if (axis !== undefined) {
    const y = Math.max(rest - depth / 2, rest - depth + 1)
    growing.gaps.push(gapOf(fit, axis, { x: growing.half, y }, { x: inner, y }))
    clash(growing, fit.put, inner, growing.half, rest - depth, rest)
  }
  const headspace = axisOf(fit, 'headspace')
  if (headspace !== undefined && along === 'length') {
    const x = -growing.half * 0.45
    growing.gaps.push(gapOf(fit, headspace, { x, y: rest - headspace.clearance.nominal }, { x, y: rest }))
  }
  growing.half = Math.max(growing.half, inner + thick)
  growing.top = rest + roof
  growing.names.push({ text: fit.put, at: { x: 0, y: growing.top + growing.half * 0.09 } })
}

function addWrap(report: Report, fit: FitReport, along: Along, factor: number, slant: 1 | -1, growing: Growing): void {
  const wrap = report.pieces[fit.put]
  const axis = axisOf(fit, along)
  const depth = axisOf(fit, 'depth')
  const overlap = axisOf(fit, 'overlap')
  const thick = Math.max(factor * (wrap?.caliper ?? 0.2), growing.half / 90)
  const wrapped = wrap?.['wrapped']
  const isAcross = axis !== undefined || (overlap !== undefined && wrapped === along)
  const sideGap = axis === undefined ? growing.half / 60 : (factor * axis.clearance.nominal) / 2
  const endGap = depth === undefined ? growing.half / 60 : depth.clearance.nominal / 2
  const inner = growing.half + Math.max(sideGap, 0)
  const bottom = growing.bottom - Math.max(endGap, 0)
  const top = growing.top + Math.max(endGap, 0)
  const reach = isAcross ? inner + thick : Math.min(growing.half, (wrap?.outside?.width.nominal ?? growing.half) / 2)
  growing.shapes.push(
    { piece: fit.put, look: 'wall', slant, outline: rectangle(-reach, top, reach, top + thick) },
    { piece: fit.put, look: 'wall', slant, outline: rectangle(-reach, bottom - thick, reach, bottom) },
  )
  if (isAcross) bothSides(growing, fit.put, slant, [inner, inner + thick], [bottom, top])
  if (axis !== undefined) {
    const y = growing.bottom + (growing.top - growing.bottom) * 0.8
    growing.gaps.push(gapOf(fit, axis, { x: growing.half, y }, { x: inner, y }))
  }
  if (depth !== undefined && along === wrapped)
    growing.gaps.push(gapOf(fit, depth, { x: growing.half * 0.55, y: growing.top }, { x: growing.half * 0.55, y: top }))
  if (overlap !== undefined && along === wrapped)
    growing.gaps.push(
      gapOf(fit, overlap, { x: growing.half * 0.5, y: top + thick }, { x: growing.half * 0.75, y: top + thick }),
    )
  growing.names.push({
    text: fit.put,
    at: { x: growing.half * 0.35, y: bottom - thick - growing.half * 0.07 },
  })
  if (isAcross) growing.half = inner + thick
  growing.top = top + thick
  growing.bottom = bottom - thick
}

function sectionOf(report: Report, assembly: Assembly, along: Along): NestPicture {
  const base = report.pieces[assembly.base]
  const inside = (base?.inside?.[along].nominal ?? 1) / 2
  const depth = base?.inside?.depth?.nominal ?? 0
  const fits = [...assembly.contents, ...assembly.covers]
  const factor = factorFor(
    inside,
    fits.flatMap((fit) => axisOf(fit, along)?.clearance.nominal ?? []),
  )
  const wall = factor * wallOf(base, along)
  const floor = Math.max(factor * (base?.caliper ?? 0.3), inside / 70)
  const growing: Growing = { half: inside + wall, bottom: -floor, top: 0, shapes: [], gaps: [], names: [], clashes: [] }
  addContents(report, assembly, along, factor, growing)
  bothSides(growing, assembly.base, 1, [inside, inside + wall], [-floor, depth])
  growing.shapes.push({ piece: assembly.base, look: 'wall', slant: 1, outline: rectangle(-inside, -floor, inside, 0) })
  growing.names.push({ text: assembly.base, at: { x: -inside * 0.5, y: -floor - inside * 0.08 } })
  growing.top = Math.max(growing.top, depth)
  let slant: 1 | -1 = -1
  for (const fit of assembly.covers) {
    const add = fit.relation === 'over' ? addLid : addWrap
    add(report, fit, along, factor, slant, growing)
    slant = slant === 1 ? -1 : 1
  }
  return {
    id: `${assembly.base}-${along}`,
    kind: 'section',
    along,
    about: fits.map(({ id }) => id),
    factor,
    shapes: [...growing.shapes, ...growing.clashes],
    gaps: growing.gaps,
    names: growing.names,
    bounds: {
      left: -growing.half,
      right: growing.half,
      bottom: growing.bottom - inside * 0.16,
      top: growing.top + inside * 0.16,
    },
  }
}

/** Every box cut through, once along its length and once along its width. */
export const sectionPictures = (report: Report): readonly NestPicture[] =>
  assembliesOf(report).flatMap((assembly) =>
    (['length', 'width'] as const).map((along) => sectionOf(report, assembly, along)),
  )
