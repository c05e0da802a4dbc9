import type { Millimetres } from './units.ts'

/** Inches to millimetres, rounded once: an inch is exactly 127/5 mm, and 25.4 is no double. */
export const inchesToMillimetres = (inches: number): Millimetres => (inches * 127) / 5
