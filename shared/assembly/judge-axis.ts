import { modelDefaults } from '../pieces/model-defaults.ts'
import { distributionOf } from '../uncertainty/distribution.ts'
import { withScaledHalfWidths } from '../uncertainty/arithmetic.ts'
import type { Dimension } from '../uncertainty/dimension.ts'
import type { AxisClearance } from './clearances.ts'

export type FitVerdict = 'pass' | 'warn' | 'fail'

export interface Shares {
  /** Share of builds that must not bind for a pass; below `floor` it fails. */
  readonly target: number
  readonly floor: number
}

/** One axis judged: how many builds bind and rattle, and what that comes to. */
export interface JudgedAxis {
  readonly clearance: AxisClearance
  readonly binds: number
  readonly rattles: number
  /** Give in force on this axis, 0 where there is none. */
  readonly give: number
  /** True where the verdict is a warning only because hands take the interference up. */
  readonly restsOnGive: boolean
  readonly verdict: FitVerdict
}

const rank: Readonly<Record<FitVerdict, number>> = { pass: 0, warn: 1, fail: 2 }

export const worse = (a: FitVerdict, b: FitVerdict): FitVerdict => (rank[a] >= rank[b] ? a : b)
export const isWorse = (a: FitVerdict, b: FitVerdict): boolean => rank[a] > rank[b]

/** Sources that depend on how exactly makers work, as against what paper and air do. */
export const isWorkmanship = (source: string): boolean =>
  source.startsWith('score(') || source.startsWith('cut(') || source.startsWith('fence(')

/** The same clearance made by more careful or hastier hands. */
export const withCare = (dimension: Dimension, factor: number): Dimension =>
  factor === 1 ? dimension : withScaledHalfWidths(dimension, factor, isWorkmanship)

/** The lowest clearance at which the axis still goes together by hand. */
export function closesAt(axis: AxisClearance, give: number): number | null {
  if (give > 0) return -give
  return axis.closesFrom ?? axis.requirement.band.min
}

/**
 * Judges one axis. Binding passes at `target`, warns at `floor` or where the give covers it at `floor`, else fails.
 * Rattling can at most warn unless the requirement is strict. An overlap too short warns until the ends no longer meet.
 * @param shift moves the whole clearance, as a misread mark does
 */
export function judgeAxis(axis: AxisClearance, give: number, shares: Shares, care = 1, shift = 0): JudgedAxis {
  const { band, isStrict } = axis.requirement
  const distribution = distributionOf(withCare(axis.clearance, care))
  const below = (limit: number): number => distribution.below(limit - shift)
  const above = (limit: number): number => distribution.above(limit - shift)
  const binds = band.min === null ? 0 : below(band.min)
  const rattles = band.max === null ? 0 : above(band.max)
  const goes = 1 - binds
  let verdict: FitVerdict = goes >= shares.target ? 'pass' : goes >= shares.floor ? 'warn' : 'fail'
  let restsOnGive = false
  if (verdict === 'fail' && give > 0 && 1 - below(-give) >= shares.floor) {
    verdict = 'warn'
    restsOnGive = true
  }
  if (verdict === 'fail' && axis.closesFrom !== null && 1 - below(axis.closesFrom) >= shares.target) verdict = 'warn'
  const still = 1 - rattles
  const loose: FitVerdict = still >= shares.target ? 'pass' : still >= shares.floor || !isStrict ? 'warn' : 'fail'
  return { clearance: axis, binds, rattles, give, restsOnGive, verdict: worse(verdict, loose) }
}

/** Chance that the clearance is not negative: used to decide whether a pack may bow on the other axis. */
export function clears(axis: AxisClearance, care = 1): number {
  return 1 - distributionOf(withCare(axis.clearance, care)).below(0)
}

/**
 * Interference that bowing a flat load takes up: δ = min(θ²L/4 at the end slope hands accept, (π·headroom/2)²/L).
 * @see physics G (derived; the slope is a guess)
 */
export function bowGive(length: number, headroom: number): number {
  if (headroom <= 0 || length <= 0) return 0
  const slope = (modelDefaults.bowSlope.value * Math.PI) / 180
  return Math.min((slope * slope * length) / 4, ((Math.PI * headroom) / 2) ** 2 / length)
}

/** Height to which a flat load of that length bows at an interference: h = (2/π)√(δL). */
export const bowHeight = (length: number, interference: number): number =>
  interference <= 0 ? 0 : (2 / Math.PI) * Math.sqrt(interference * length)
