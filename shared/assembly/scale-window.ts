import { coefficientOf } from '../uncertainty/moments.ts'
import { judgeAxis, type JudgedAxis } from './judge-axis.ts'
import type { JudgedFit } from './judge-fit.ts'
import type { JudgedSet } from './judge-set.ts'

const least = 0.9
const most = 1.1

/** Whether an axis keeps to `floor` when printed pieces come out at another scale. */
function holdsAt(judged: JudgedSet, axis: JudgedAxis, scale: number): boolean {
  const perScale = coefficientOf(axis.clearance.clearance, 'print-scale')
  const shift = perScale * (scale - (judged.options.scale ?? 1))
  const { floor } = judged.set.tokens
  const moved = judgeAxis(axis.clearance, axis.give, judged.set.tokens, 1, shift)
  return moved.verdict !== 'fail' && 1 - moved.rattles >= floor
}

/** The scale nearest to `good` beyond which the axis no longer holds, found by halving. */
function edgeTowards(judged: JudgedSet, axis: JudgedAxis, good: number, far: number): number {
  if (holdsAt(judged, axis, far)) return far
  let inside = good
  let outside = far
  for (let step = 0; step < 20; step += 1) {
    const middle = (inside + outside) / 2
    if (holdsAt(judged, axis, middle)) inside = middle
    else outside = middle
  }
  return inside
}

/** True where printing at another scale would change the fit at all. */
export const feelsScale = (fit: JudgedFit): boolean =>
  fit.axes.some((axis) => Math.abs(coefficientOf(axis.clearance.clearance, 'print-scale')) > 1e-9)

/**
 * Print scales within 0.9..1.1 at which every axis of a fit stays at `floor` or better, printed pieces only.
 * The clearance is linear in the scale: blanks stretch, calipers and bought things do not.
 * @returns `null` where the fit fails at the scale it was judged at
 */
export function scaleWindow(judged: JudgedSet, fit: JudgedFit): { readonly min: number; readonly max: number } | null {
  const at = judged.options.scale ?? 1
  if (fit.axes.some((axis) => !holdsAt(judged, axis, at))) return null
  const edges = fit.axes.map((axis) => ({
    min: edgeTowards(judged, axis, at, least),
    max: edgeTowards(judged, axis, at, most),
  }))
  return { min: Math.max(...edges.map((edge) => edge.min)), max: Math.min(...edges.map((edge) => edge.max)) }
}
