import { sameLength } from '../../units/epsilon.ts'
import type { Rectangle } from './sheet-of.ts'

/** How a rectangle goes on a sheet: as it lies, turned at an angle, or not at all. */
export type Placement = 'straight' | 'at an angle' | null

/**
 * Whether a rectangle a × b goes into a rectangle W × H (a ≥ b, W ≥ H), at any angle: a ≤ W and b ≤ H, or a > W, b ≤ H and
 * H ≥ (2abW + (a² − b²)√(a² + b² − W²)) / (a² + b²).
 * @see physics J (from memory: Wetzel's condition; held against random trials)
 */
export function placementIn(rectangle: Rectangle, sheet: Rectangle): Placement {
  const { length: a, width: b } = rectangle
  const long = Math.max(sheet.length, sheet.width) + sameLength
  const short = Math.min(sheet.length, sheet.width) + sameLength
  if (a <= long && b <= short) return 'straight'
  if (b > short) return null
  const diagonal = a * a + b * b
  const least = (2 * a * b * long + (a * a - b * b) * Math.sqrt(diagonal - long * long)) / diagonal
  return short >= least ? 'at an angle' : null
}
