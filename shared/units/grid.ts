import { sameLength } from './epsilon.ts'
import type { Millimetres } from './units.ts'

/*
 * Grids are distances between marks, in millimetres: a sixteenth of an inch is 25.4 / 16. A length within `sameLength` of
 * a mark, or of the middle between two, is taken as on it, since doubles cannot hold most marks exactly.
 * Adding zero turns the double -0 into 0, which prints without a sign.
 */

/** The nearest mark; halves go up. @see physics K (derived) */
export const roundToGrid = (mm: Millimetres, grid: Millimetres): Millimetres =>
  Math.floor((mm + sameLength) / grid + 0.5) * grid + 0

/** The least mark that is not smaller; a length that is on the grid stays. */
export const ceilToGrid = (mm: Millimetres, grid: Millimetres): Millimetres =>
  Math.ceil((mm - sameLength) / grid) * grid + 0

/** The largest mark that is not larger. */
export const floorToGrid = (mm: Millimetres, grid: Millimetres): Millimetres =>
  Math.floor((mm + sameLength) / grid) * grid + 0

/** Whether a length is a mark of the grid. */
export const isOnGrid = (mm: Millimetres, grid: Millimetres): boolean =>
  Math.abs(mm - roundToGrid(mm, grid)) < sameLength
