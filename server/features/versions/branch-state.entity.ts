import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'
import { Moment, Ref, Texts } from '../../db/columns.ts'

/** Where a branch of a set stands. */
@Entity({ name: 'branch_state' })
@Index('branch_state_team', ['teamId', 'branch'])
export class BranchState {
  @ForeignKey('TemplateSet', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  setId!: string
  @PrimaryColumn({ type: 'text' }) branch!: string
  @Ref('Team') teamId!: string
  @Ref('Version') versionId!: string
  /** Failures people have been told of; a notice leaves only for others. */
  @Texts({ default: () => "'{}'" }) toldFailing!: string[]
  @Moment({ default: () => 'now()' }) updatedAt!: Date
}
