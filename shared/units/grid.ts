import { sameLength } from './epsilon.ts'
import type { Millimetres } from './units.ts'

/** The nearest mark; halves go up. */
export const roundToGrid = (mm: Millimetres, grid: Millimetres): Millimetres =>
  Math.floor(mm / grid + 0.5 + 1e-9) * grid

/** The least mark that is not smaller; a length that is on the grid stays. */
export const ceilToGrid = (mm: Millimetres, grid: Millimetres): Millimetres =>
  Math.ceil((mm - sameLength) / grid) * grid

/** The largest mark that is not larger. */
export const floorToGrid = (mm: Millimetres, grid: Millimetres): Millimetres =>
  Math.floor((mm + sameLength) / grid) * grid

/** Whether a length is a mark of the grid. */
export const isOnGrid = (mm: Millimetres, grid: Millimetres): boolean =>
  Math.abs(mm - roundToGrid(mm, grid)) < sameLength
