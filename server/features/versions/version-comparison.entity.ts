import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'
import type { Comparison } from '../../../shared/compare/comparison.ts'
import { Flag, Json, Moment, Text } from '../../db/columns.ts'

/** A comparison of two versions as an engine made it, kept so that pages need not wait. */
@Entity({ name: 'version_comparison' })
@Index('version_comparison_after', ['afterId'])
export class VersionComparison {
  @ForeignKey('version', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  beforeId!: string
  @ForeignKey('version', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  afterId!: string
  /** Engine and rules edition that compared. */
  @PrimaryColumn({ type: 'text' }) engine!: string
  @Flag() isRechecked!: boolean
  @Text() sentence!: string
  @Json() comparison!: Comparison
  @Moment({ default: () => 'now()' }) createdAt!: Date
}
