import { clearancesOf, type AxisClearance } from '../assembly/clearances.ts'
import type { SetModel } from '../assembly/set-model.ts'
import type { Fit } from '../template/template-model.ts'
import { distributionOf } from '../uncertainty/distribution.ts'
import type { Dimension } from '../uncertainty/dimension.ts'
import type { RequiredBand } from '../report/report.ts'
import { ceilToGrid } from '../units/grid.ts'

/** A lower bound on one length: the clearance it makes when it has a given value, and what that must be. */
export interface Bound {
  readonly requirement: string
  clearanceAt(value: number): { readonly clearance: Dimension; readonly band: RequiredBand }
}

export interface Least {
  readonly value: number
  readonly unrounded: number
  readonly limitedBy: string
}

/** One axis of a fit as its author laid it; sizing needs clearances only, not verdicts. @throws where the fit has no such axis */
export function axisAsLaid(model: SetModel, fit: Fit, axis: string): AxisClearance {
  const found = clearancesOf(model, fit).orientations[0]?.axes.find((candidate) => candidate.axis === axis)
  if (found === undefined) throw new RangeError(`${fit.id} has no ${axis}`)
  return found
}

/** Whether so many builds keep the least clearance. */
export const keepsLeast = (clearance: Dimension, band: RequiredBand, target: number): boolean =>
  band.min === null || 1 - distributionOf(clearance).below(band.min) >= target

const needs = (bound: Bound, value: number, target: number): number => {
  const { clearance, band } = bound.clearanceAt(value)
  return band.min === null ? -Infinity : band.min - distributionOf(clearance).quantile(1 - target)
}

/**
 * The least value on the grid that meets every bound, each bound growing by a millimetre with each millimetre.
 * Neighbours are tried, so that what comes back passes and the next smaller does not.
 */
export function leastValue(bounds: readonly Bound[], start: number, grid: number, target: number): Least | null {
  const asked = bounds
    .map((bound) => ({ bound, value: start + needs(bound, start, target) }))
    .filter(({ value }) => value > -Infinity)
  const hardest = asked.toSorted((a, b) => b.value - a.value)[0]
  if (hardest === undefined) return null
  const passes = (value: number): boolean =>
    bounds.every((bound) => {
      const { clearance, band } = bound.clearanceAt(value)
      return keepsLeast(clearance, band, target)
    })
  let value = ceilToGrid(hardest.value, grid)
  for (let step = 0; step < 20 && !passes(value); step += 1) value = ceilToGrid(value + grid, grid)
  while (value - grid > 0 && passes(ceilToGrid(value - grid - 1e-9, grid)))
    value = ceilToGrid(value - grid - 1e-9, grid)
  return { value, unrounded: hardest.value, limitedBy: hardest.bound.requirement }
}

/** A requirement in words: `lid-on-base across the width: at least 0.2 mm (slip-lid)`. */
export const requirementInWords = (fit: string, axis: AxisClearance): string => {
  const { band, from } = axis.requirement
  const source = from === 'default' ? 'default' : from === 'set' ? 'given with the fit' : from
  return `${fit}, ${axis.axis}: at least ${String(band.min ?? 0)} mm (${source})`
}
