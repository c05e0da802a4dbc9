import type { Millimetres } from './units.ts'

/** Distances below this are none: a nanometre, far below any ruler and far above rounding of doubles. */
export const sameLength: Millimetres = 1e-6
