import { judgeAxis, worse, type FitVerdict } from '../assembly/judge-axis.ts'
import { modelDefaults } from '../pieces/model-defaults.ts'
import { dimensionOf } from '../report/quantity.ts'
import type { AxisReport, FitReport, PieceReport, Quantity, Report } from '../report/report.ts'
import { add, larger, scale } from '../uncertainty/arithmetic.ts'
import type { Dimension } from '../uncertainty/dimension.ts'
import { sameLength } from './dimension-changes.ts'
import type { Mating } from './comparison.ts'

type Side = 'before' | 'after'

const isQuantity = (value: unknown): value is Quantity =>
  typeof value === 'object' && value !== null && 'nominal' in value

/** The piece on the outside of a fit: what is put over or around, or what it is put in. */
const outerOf = (fit: FitReport): string => (fit.relation === 'in' ? fit.to : fit.put)

/** Height at which a lid rests on a base: the taller of base and lid depth. */
function restOf(base: PieceReport | undefined, lid: PieceReport | undefined): Dimension | null {
  const height = base?.outside?.height
  const depth = lid?.inside?.depth
  return height === undefined || depth === undefined ? null : larger(dimensionOf(height), dimensionOf(depth))
}

/**
 * Size of the outer piece along an axis. The inner one is this less the reported clearance, whatever it is made of,
 * so crossing two versions needs nothing but the outer sizes: C = O(other) − O(own) + C(own).
 */
function outerSize(report: Report, fit: FitReport, axis: AxisReport['axis']): Dimension | null {
  const outer = report.pieces[outerOf(fit)]
  if (outer === undefined) return null
  if (axis === 'overlap') return isQuantity(outer['strip']) ? dimensionOf(outer['strip']) : null
  // A bag's face and gusset are its length and width; what is put in knows them as width and depth.
  const inBag = outer.kind === 'bag' && fit.relation === 'in'
  const name = inBag ? (axis === 'width' ? 'length' : 'width') : axis
  const size = name === 'headspace' ? undefined : outer.inside?.[name]
  return size === undefined ? null : dimensionOf(size)
}

/** Clearance of an axis with the outer piece of one report and the inner one of the other. */
function crossed(outerReport: Report, innerReport: Report, fitId: string, axis: AxisReport): Dimension | null {
  const outerFit = outerReport.fits.find((fit) => fit.id === fitId)
  const innerFit = innerReport.fits.find((fit) => fit.id === fitId)
  const innerAxis = innerFit?.axes.find((candidate) => candidate.axis === axis.axis)
  if (outerFit === undefined || innerFit === undefined || innerAxis === undefined) return null
  const own = dimensionOf(innerAxis.clearance)
  if (axis.axis === 'headspace') {
    const base = innerReport.pieces[innerFit.to]
    const mixed = restOf(base, outerReport.pieces[outerFit.put])
    const rest = restOf(base, innerReport.pieces[innerFit.put])
    return mixed === null || rest === null ? null : add(mixed, scale(rest, -1), own)
  }
  const other = outerSize(outerReport, outerFit, axis.axis)
  const same = outerSize(innerReport, innerFit, axis.axis)
  return other === null || same === null ? null : add(other, scale(same, -1), own)
}

function judgeCrossing(
  target: number,
  floor: number,
  fit: FitReport,
  axis: AxisReport,
  clearance: Dimension,
): { verdict: FitVerdict; binds: number } {
  const give =
    fit.relation === 'over' && (axis.axis === 'length' || axis.axis === 'width')
      ? modelDefaults.lidGive.value
      : fit.give?.axis === axis.axis
        ? -fit.give.goesTo
        : 0
  const judged = judgeAxis(
    {
      axis: axis.axis,
      clearance,
      requirement: { band: axis.required, from: axis.requirementFrom, isStrict: axis.strict },
      give,
      closesFrom: axis.axis === 'overlap' ? 0 : null,
      contentSize: 0,
    },
    give,
    { target, floor },
  )
  return { verdict: judged.verdict, binds: judged.binds }
}

const sideWords = { before: 'old', after: 'new' } as const

function mate(before: Report, after: Report, fit: FitReport, outerFrom: Side): Mating {
  const innerFrom: Side = outerFrom === 'before' ? 'after' : 'before'
  const reports = { before, after }
  const isInside = fit.relation === 'in'
  const putFrom = isInside ? innerFrom : outerFrom
  const toFrom = isInside ? outerFrom : innerFrom
  const judged = fit.axes.map((axis) => {
    const clearance = crossed(reports[outerFrom], reports[innerFrom], fit.id, axis)
    return clearance === null ? null : { axis, ...judgeCrossing(after.target, after.floor, fit, axis, clearance) }
  })
  const known = judged.filter((entry) => entry !== null)
  const words = `${sideWords[putFrom]} ${fit.put} ${fit.relation} ${sideWords[toFrom]} ${fit.to}`
  const base = { fit: fit.id, put: fit.put, to: fit.to, putFrom, toFrom }
  const worst = known.toSorted((a, b) => b.binds - a.binds)[0]
  if (worst === undefined || known.length < judged.length) {
    return {
      ...base,
      verdict: 'unchecked',
      closes: null,
      worstAxis: null,
      sentence: `${words}: cannot be told from these two reports`,
    }
  }
  const verdict = known.map((entry) => entry.verdict).reduce(worse, 'pass')
  const share = Math.round((1 - worst.binds) * 100)
  const said = verdict === 'fail' ? 'does not mate' : verdict === 'warn' ? 'mates with care' : 'mates'
  return {
    ...base,
    verdict,
    closes: 1 - worst.binds,
    worstAxis: worst.axis.axis,
    sentence: `${words}: ${said}, about ${String(share)} of 100`,
  }
}

const sameQuantity = (a: Quantity | undefined, b: Quantity | undefined): boolean =>
  a === b ||
  (a !== undefined &&
    b !== undefined &&
    Math.abs(a.nominal - b.nominal) < sameLength &&
    Math.abs(a.sigma - b.sigma) < sameLength)

/** Whether a piece is the same in both reports as far as mating goes. */
function isSamePiece(a: PieceReport | undefined, b: PieceReport | undefined): boolean {
  if (a === undefined || b === undefined) return a === b
  const pairs = [
    [a.inside?.length, b.inside?.length],
    [a.inside?.width, b.inside?.width],
    [a.inside?.depth, b.inside?.depth],
    [a.outside?.length, b.outside?.length],
    [a.outside?.width, b.outside?.width],
    [a.outside?.height, b.outside?.height],
  ] as const
  return pairs.every(([x, y]) => sameQuantity(x, y))
}

/** Every fit both reports know that crosses the versions, where at least one of its clearances is another than before. */
export function matingsOf(before: Report, after: Report): readonly Mating[] {
  return after.fits.flatMap((fit) => {
    const old = before.fits.find((candidate) => candidate.id === fit.id)
    if (old === undefined || old.relation !== fit.relation || old.put !== fit.put || old.to !== fit.to) return []
    const hasSameAxes = fit.axes.every((axis) =>
      sameQuantity(axis.clearance, old.axes.find((candidate) => candidate.axis === axis.axis)?.clearance),
    )
    if (hasSameAxes && isSamePiece(before.pieces[outerOf(fit)], after.pieces[outerOf(fit)])) return []
    return [mate(before, after, fit, 'before'), mate(before, after, fit, 'after')]
  })
}
