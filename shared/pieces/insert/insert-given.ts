import type { GivenSize, Open, PieceBase } from '../piece-base.ts'

/** A flat piece that lies (insert) or stands (divider) in another. */
export interface InsertGiven extends PieceBase {
  readonly kind: 'insert' | 'divider'
  readonly stock: string
  readonly size: GivenSize | Open
  readonly count: number
}
