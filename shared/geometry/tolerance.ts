import type { Millimetres } from '../units/units.ts'

/*
 * Every distance below which two lengths count as the same lives here. They are distances, never ratios or areas: an
 * area is compared with a distance times the length of the edge along which it could lie.
 */

/** Two points nearer than this are one point: a thousandth of what the finest cutter resolves. */
export const samePoint: Millimetres = 1e-6

/** How far a chord may lie inside the arc it stands for: a tenth of what a hand or a cutter holds. */
export const chordError: Millimetres = 0.005

/** Narrower slivers than this left by clipping are rounding, not paper. */
export const sliver: Millimetres = 1e-7
