import { modelDefaults } from '../pieces/model-defaults.ts'
import type { Fit } from '../template/template-model.ts'
import { jointProbability } from '../uncertainty/joint.ts'
import type { Dimension } from '../uncertainty/dimension.ts'
import { worstCase } from '../uncertainty/moments.ts'
import { clearancesOf, type FitClearances, type Orientation } from './clearances.ts'
import {
  bowGive,
  bowHeight,
  clears,
  closesAt,
  judgeAxis,
  withCare,
  worse,
  type FitVerdict,
  type JudgedAxis,
  type Shares,
} from './judge-axis.ts'
import type { Seat, SetModel } from './set-model.ts'

/** One condition of a fit going together by hand. */
export interface CloseCondition {
  readonly dimension: Dimension
  readonly atLeast: number
}

/** A fit judged, with everything a rule or the report says about it. */
export interface JudgedFit {
  readonly fit: Fit
  readonly clearances: FitClearances
  readonly isTurned: boolean
  readonly axes: readonly JudgedAxis[]
  readonly verdict: FitVerdict
  /** Share of builds in which every axis goes together by hand. */
  readonly closes: number
  readonly conditions: readonly CloseCondition[]
  readonly dependsOnCare: boolean
  readonly give: {
    readonly axis: JudgedAxis
    readonly name: 'snug' | 'push-on'
    readonly goesTo: number
    readonly bow: number | null
  } | null
  readonly seat: Seat | null
}

/** Give in force on each axis of an orientation: a lid's own, or a flat load's bowing where the other axis is free. */
function givesOf(clearances: FitClearances, orientation: Orientation, shares: Shares, care: number): readonly number[] {
  const { headroom } = clearances
  return orientation.axes.map((axis) => {
    if (axis.give > 0) return axis.give
    if (headroom === null || (axis.axis !== 'length' && axis.axis !== 'width')) return 0
    const other = orientation.axes.find((candidate) => candidate.axis === (axis.axis === 'length' ? 'width' : 'length'))
    if (other === undefined || clears(other, care) < shares.floor) return 0
    return bowGive(axis.contentSize, headroom)
  })
}

function judgeOrientation(
  clearances: FitClearances,
  orientation: Orientation,
  shares: Shares,
  care: number,
): readonly JudgedAxis[] {
  const gives = givesOf(clearances, orientation, shares, care)
  return orientation.axes.map((axis, index) => judgeAxis(axis, gives[index] ?? 0, shares, care))
}

const worstBinding = (axes: readonly JudgedAxis[]): number => Math.max(0, ...axes.map((axis) => axis.binds))

interface Chosen {
  readonly orientation: Orientation
  readonly axes: readonly JudgedAxis[]
}

/** The orientation whose worst axis binds least; ties stay unturned. */
function chooseOrientation(clearances: FitClearances, shares: Shares): Chosen {
  const [first, ...others] = clearances.orientations
  if (first === undefined) throw new RangeError('a fit has no orientation')
  let best: Chosen = { orientation: first, axes: judgeOrientation(clearances, first, shares, 1) }
  for (const orientation of others) {
    // Differences below what the distribution is computed to are ties, and nothing binds less than nothing.
    if (worstBinding(best.axes) <= 1e-4) break
    const axes = judgeOrientation(clearances, orientation, shares, 1)
    if (worstBinding(axes) < worstBinding(best.axes) - 1e-4) best = { orientation, axes }
  }
  return best
}

/** True where even the hastiest hands cannot leave the band: then no care changes the verdict. */
function isSureOfItself(axis: JudgedAxis): boolean {
  const { band } = axis.clearance.requirement
  const { min, max } = worstCase(withCare(axis.clearance.clearance, modelDefaults.careHigh.value))
  return (band.min === null || min >= band.min) && (band.max === null || max <= band.max)
}

const verdictOf = (axes: readonly JudgedAxis[]): FitVerdict => axes.map((axis) => axis.verdict).reduce(worse, 'pass')

function giveOf(chosen: Chosen, fitCase: FitClearances['fitCase']): JudgedFit['give'] {
  const axis = chosen.axes.find((candidate) => candidate.restsOnGive)
  if (axis === undefined) return null
  const isPack = fitCase !== 'lid'
  const interference = Math.max(0, -axis.clearance.clearance.nominal)
  return {
    axis,
    name: isPack ? 'snug' : 'push-on',
    goesTo: -axis.give,
    bow: isPack ? bowHeight(axis.clearance.contentSize, interference) : null,
  }
}

function conditionsOf(axes: readonly JudgedAxis[]): readonly CloseCondition[] {
  return axes.flatMap((axis) => {
    const atLeast = closesAt(axis.clearance, axis.give)
    return atLeast === null ? [] : [{ dimension: axis.clearance.clearance, atLeast }]
  })
}

/** Judges a fit in a model; the verdict again for careful and hasty hands says whether it depends on care. */
export function judgeFit(model: SetModel, fit: Fit): JudgedFit {
  const shares: Shares = model.set.tokens
  const clearances = clearancesOf(model, fit)
  const chosen = chooseOrientation(clearances, shares)
  const verdict = verdictOf(chosen.axes)
  const conditions = conditionsOf(chosen.axes)
  const dependsOnCare =
    !chosen.axes.every(isSureOfItself) &&
    [modelDefaults.careLow.value, modelDefaults.careHigh.value].some(
      (care) => verdictOf(judgeOrientation(clearances, chosen.orientation, shares, care)) !== verdict,
    )
  return {
    fit,
    clearances,
    isTurned: chosen.orientation.isTurned,
    axes: chosen.axes,
    verdict,
    closes: jointProbability(conditions),
    conditions,
    dependsOnCare,
    give: giveOf(chosen, clearances.fitCase),
    seat: fit.relation === 'over' ? model.seat(fit.to) : null,
  }
}
