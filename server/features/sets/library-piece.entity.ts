import { Entity, Index, PrimaryColumn, ForeignKey } from 'typeorm'
import { Json, Real, Ref, Text, Whole } from '../../db/columns.ts'
import type { Quantity } from '../../../shared/report/report.ts'

/** What a set's shown version can hold: one row for each piece with an inside. */
@Entity({ name: 'library_piece' })
@Index('library_piece_inside', ['teamId', 'longer', 'shorter'])
export class LibraryPiece {
  @ForeignKey('template_set', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  setId!: string
  @PrimaryColumn({ type: 'text' }) piece!: string
  @Ref('team') teamId!: string
  @Whole() number!: number
  @Text() kind!: string
  /** The two sides of the opening in millimetres, worst case wide. */
  @Real() longer!: number
  @Real() shorter!: number
  @Json() inside!: { readonly length: Quantity; readonly width: Quantity; readonly depth?: Quantity }
}
