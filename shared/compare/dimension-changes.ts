import type { PieceReport, Quantity, Report } from '../report/report.ts'
import type { DimensionChange, InputChange } from './comparison.ts'

/** Lengths that differ by less are the same: far below what any ruler shows. */
export const sameLength = 1e-6

interface ReportedMeasure {
  readonly what: string
  readonly nominal: number
}

const isQuantity = (value: unknown): value is Quantity =>
  typeof value === 'object' && value !== null && 'nominal' in value && 'sigma' in value

/** What a maker sets on a piece, and what comes of it: marks, then inside and outside. */
function dimensionsOf(piece: PieceReport): ReadonlyMap<string, number> {
  const measures = Array.isArray(piece['measures']) ? (piece['measures'] as readonly ReportedMeasure[]) : []
  const found = new Map(measures.map(({ what, nominal }) => [what, nominal]))
  for (const [side, sizes] of [
    ['inside', piece.inside],
    ['outside', piece.outside],
  ] as const) {
    for (const [axis, size] of Object.entries(sizes ?? {}))
      if (isQuantity(size)) found.set(`${side} ${axis}`, size.nominal)
  }
  const thickness = piece['thickness']
  if (isQuantity(thickness)) found.set('thickness', thickness.nominal)
  return found
}

const mentions = (report: Report, piece: string): readonly string[] =>
  report.fits
    .filter(
      (fit) =>
        fit.to === piece ||
        fit.holding === piece ||
        fit.put.split(', ').some((entry) => entry.replace(/^\d+ /, '') === piece),
    )
    .map((fit) => fit.id)

/** Every dimension that moved, appeared or went, by piece and name, largest first. */
export function compareDimensions(before: Report, after: Report): readonly DimensionChange[] {
  const changes: DimensionChange[] = []
  for (const piece of new Set([...Object.keys(before.pieces), ...Object.keys(after.pieces)])) {
    const old = before.pieces[piece]
    const now = after.pieces[piece]
    const was = old === undefined ? new Map<string, number>() : dimensionsOf(old)
    const is = now === undefined ? new Map<string, number>() : dimensionsOf(now)
    const dependents = [...new Set([...mentions(before, piece), ...mentions(after, piece)])].toSorted()
    for (const what of new Set([...was.keys(), ...is.keys()])) {
      const from = was.get(what) ?? null
      const to = is.get(what) ?? null
      const delta = from === null || to === null ? null : to - from
      if (delta !== null && Math.abs(delta) < sameLength) continue
      changes.push({ piece, what, before: from, after: to, delta, dependents })
    }
  }
  return changes.toSorted(
    (a, b) =>
      Math.abs(b.delta ?? Infinity) - Math.abs(a.delta ?? Infinity) ||
      (`${a.piece} ${a.what}` < `${b.piece} ${b.what}` ? -1 : 1),
  )
}

/** Tokens, options and engine as flat named texts. */
function inputsOf(report: Report): ReadonlyMap<string, string> {
  const flat = new Map<string, string>([
    ['engine', report.engine],
    ['rules', report.rules],
    ['workmanship', report.workmanship],
    ['paper', report.paper ?? 'as given'],
    ['print scale', String(report.scale)],
    ['target', String(report.target)],
    ['floor', String(report.floor)],
    ['units', report.units],
    ['ruler', `${String(report.ruler.cut)} / ${String(report.ruler.score)} mm`],
  ])
  for (const [name, stock] of Object.entries(report.inputs.stocks)) {
    flat.set(`stock ${name} caliper`, `${String(stock.caliper)} ± ${String(Number(stock.halfWidth.toFixed(4)))} mm`)
    flat.set(`stock ${name} grammage`, stock.grammage === null ? 'not given' : `${String(stock.grammage)} g/m²`)
  }
  for (const [name, size] of Object.entries(report.inputs.sizes))
    flat.set(`size ${name}`, `${String(size.length)} x ${String(size.width)} mm`)
  for (const [name, clearance] of Object.entries(report.inputs.clearances))
    flat.set(`clearance ${name}`, JSON.stringify(clearance))
  for (const [name, maker] of Object.entries(report.inputs.makers)) {
    flat.set(
      `makers ${name}`,
      `cut ${String(maker.cut)}, score ${String(maker.score)}, fence ${String(maker.fence)} mm`,
    )
  }
  return flat
}

/** What was judged with something else than before. */
export function compareInputs(before: Report, after: Report): readonly InputChange[] {
  const was = inputsOf(before)
  const is = inputsOf(after)
  return [...new Set([...was.keys(), ...is.keys()])].toSorted().flatMap((what) => {
    const from = was.get(what) ?? null
    const to = is.get(what) ?? null
    return from === to ? [] : [{ what, before: from, after: to }]
  })
}
