import type { Millimetres } from '../../units/units.ts'
import type { PieceBase } from '../piece-base.ts'

export interface CustomPoint {
  readonly x: Millimetres
  readonly y: Millimetres
}

export interface CustomScore {
  readonly from: CustomPoint
  readonly to: CustomPoint
  readonly fold: 'valley' | 'mountain'
  /** Degrees turned through. */
  readonly angle: number
}

/** Any other shape: its geometry is checked, its declared sizes are believed and the report says so. */
export interface CustomGiven extends PieceBase {
  readonly kind: 'custom'
  readonly stock: string
  readonly outline: readonly CustomPoint[]
  readonly scores: readonly CustomScore[]
  readonly inside: {
    readonly length: Millimetres
    readonly width: Millimetres
    readonly depth: Millimetres | null
  } | null
  readonly outside: {
    readonly length: Millimetres
    readonly width: Millimetres
    readonly height: Millimetres | null
  } | null
}
