import type { AxisReport, FitReport, Report } from '../../../shared/report/report.ts'
import { factorFor, piecesPut, rectangle, type NestGap, type NestPicture, type NestShape } from './nest-picture.ts'

const axisOf = (fit: FitReport, name: AxisReport['axis']): AxisReport | undefined =>
  fit.axes.find(({ axis }) => axis === name)

/** A flat thing in a pocket, seen from above; the throat is left open at the top. */
function planOf(report: Report, fit: FitReport): NestPicture | null {
  const outer = report.pieces[fit.to]
  const length = axisOf(fit, 'length')
  const width = axisOf(fit, 'width')
  if (outer?.inside == null || length === undefined || width === undefined) return null
  const half = { x: outer.inside.length.nominal / 2, y: outer.inside.width.nominal / 2 }
  const factor = factorFor(Math.min(half.x, half.y), [length.clearance.nominal, width.clearance.nominal])
  const wall = Math.max((outer.caliper ?? 0.15) * factor, half.x / 60)
  const inner = {
    x: half.x - (factor * length.clearance.nominal) / 2,
    y: half.y - (factor * width.clearance.nominal) / 2,
  }
  const name = piecesPut(fit)[0] ?? fit.put
  const shapes: NestShape[] = [
    { piece: name, look: 'body', slant: 1, outline: rectangle(-inner.x, -half.y, inner.x, -half.y + 2 * inner.y) },
    { piece: fit.to, look: 'wall', slant: 1, outline: rectangle(-half.x - wall, -half.y - wall, -half.x, half.y) },
    { piece: fit.to, look: 'wall', slant: 1, outline: rectangle(half.x, -half.y - wall, half.x + wall, half.y) },
    { piece: fit.to, look: 'wall', slant: 1, outline: rectangle(-half.x, -half.y - wall, half.x, -half.y) },
  ]
  const common = { fit: fit.id, verdict: fit.verdict }
  const gaps: NestGap[] = [
    {
      ...common,
      axis: 'length',
      clearance: length.clearance.nominal,
      from: { x: inner.x, y: -half.y * 0.35 },
      to: { x: half.x, y: -half.y * 0.35 },
    },
    {
      ...common,
      axis: 'width',
      clearance: width.clearance.nominal,
      from: { x: half.x * 0.3, y: -half.y + 2 * inner.y },
      to: { x: half.x * 0.3, y: half.y },
    },
  ]
  return {
    id: fit.id,
    kind: 'plan',
    along: 'length',
    about: [fit.id],
    factor,
    shapes,
    gaps,
    names: [
      { text: fit.put, at: { x: 0, y: -half.y + inner.y } },
      { text: fit.to, at: { x: 0, y: -half.y - wall - half.y * 0.16 } },
    ],
    bounds: {
      left: -half.x - wall,
      right: Math.max(half.x + wall, inner.x),
      bottom: -half.y - wall - half.y * 0.24,
      top: Math.max(half.y, -half.y + 2 * inner.y),
    },
  }
}

/** One picture for every flat thing that goes into a flat pocket. */
export const planPictures = (report: Report): readonly NestPicture[] =>
  report.fits
    .filter((fit) => fit.relation === 'in' && report.pieces[fit.to]?.inside?.depth === undefined)
    .flatMap((fit) => planOf(report, fit) ?? [])
