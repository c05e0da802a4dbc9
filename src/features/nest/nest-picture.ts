import type { AxisName, FitReport } from '../../../shared/report/report.ts'

export interface NestPoint {
  readonly x: number
  readonly y: number
}

/** One part of a piece cut through, or seen from above. */
export interface NestShape {
  readonly piece: string
  /** `wall` is hatched as parts in section are, `body` is what lies inside. */
  readonly look: 'wall' | 'body' | 'clash'
  /** Neighbours are hatched the other way. */
  readonly slant: 1 | -1
  readonly outline: readonly NestPoint[]
}

/** A gap between two pieces, with both ends of its dimension line. */
export interface NestGap {
  readonly fit: string
  readonly axis: AxisName
  readonly verdict: FitReport['verdict']
  /** In all along the axis, millimetres. */
  readonly clearance: number
  readonly from: NestPoint
  readonly to: NestPoint
}

export interface NestName {
  readonly text: string
  readonly at: NestPoint
}

/** One picture of pieces in one another: millimetres, y upwards. */
export interface NestPicture {
  readonly id: string
  readonly kind: 'plan' | 'section'
  readonly along: 'length' | 'width'
  readonly about: readonly string[]
  /** How much larger gaps and walls are drawn than everything else. */
  readonly factor: number
  readonly shapes: readonly NestShape[]
  readonly gaps: readonly NestGap[]
  readonly names: readonly NestName[]
  readonly bounds: { readonly left: number; readonly right: number; readonly bottom: number; readonly top: number }
}

export const rectangle = (left: number, bottom: number, right: number, top: number): readonly NestPoint[] => [
  { x: left, y: bottom },
  { x: right, y: bottom },
  { x: right, y: top },
  { x: left, y: top },
]

/** A whole factor that shows the gaps without hiding the proportions: their sum takes about a sixth of half the width. */
export function factorFor(halfWidth: number, gaps: readonly number[]): number {
  const sum = gaps.reduce((total, gap) => total + Math.abs(gap), 0)
  const wished = sum < 1e-6 ? 1 : (halfWidth * 0.3) / sum
  return [10, 8, 6, 5, 4, 3, 2].find((factor) => factor <= wished) ?? 1
}

/** Pieces that a fit puts: `4 card, 4 envelope` names two. */
export const piecesPut = (fit: FitReport): readonly string[] =>
  fit.put.split(', ').map((part) => part.replace(/^\d+ /, ''))
