import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'
import { Moment, Ref, Text, Texts } from '../../db/columns.ts'

/** Where a branch of a set stands. */
@Entity({ name: 'branch_state' })
@Index('branch_state_team', ['teamId', 'branch'])
export class BranchState {
  @ForeignKey('template_set', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  setId!: string
  @PrimaryColumn({ type: 'text' }) branch!: string
  @Ref('team') teamId!: string
  @Ref('version') versionId!: string
  /** Failures people have been told of; a notice leaves only for others. */
  @Texts({ default: () => "'{}'" }) toldFailing!: string[]
  /** The workspace it was last judged with, whether or not that changed anything. */
  @Text({ nullable: true }) workspaceFile!: string | null
  @Text({ nullable: true }) workspaceDigest!: string | null
  @Moment({ default: () => 'now()' }) updatedAt!: Date
}
