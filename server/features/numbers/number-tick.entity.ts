import { Entity, ForeignKey, PrimaryColumn } from 'typeorm'
import { Moment, Real, Text, Whole } from '../../db/columns.ts'

/** An editor's tick or query beside one measure of a version. */
@Entity({ name: 'number_tick' })
export class NumberTick {
  @ForeignKey('version', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  versionId!: string
  @PrimaryColumn({ type: 'text' }) key!: string
  /** The measure in millimetres when it was ticked. */
  @Real() value!: number
  @Text() state!: 'ticked' | 'queried' | 'changed'
  @Text() note!: string
  @Text() tickedBy!: string
  @Moment({ default: () => 'now()' }) tickedAt!: Date
  /** Version the tick was first made on. */
  @Whole({ nullable: true }) carriedFrom!: number | null
}
