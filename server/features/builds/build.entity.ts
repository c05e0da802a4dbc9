import { Entity, Index } from 'typeorm'
import type { BuildReport } from '../../../shared/api/shapes/build-shapes.ts'
import { Id, Json, Moment, Ref, Text } from '../../db/columns.ts'

/** What somebody who built a version reports. */
@Entity({ name: 'build' })
@Index('build_version', ['versionId', 'startedAt', 'id'])
export class Build {
  @Id() id!: string
  @Ref('team') teamId!: string
  @Ref('version') versionId!: string
  @Index('build_invitation_build', { unique: true })
  @Ref('build_invitation', 'SET NULL', { nullable: true })
  invitationId!: string | null
  @Text() stamp!: string
  @Text() tester!: string
  @Text() source!: 'tester' | 'member' | 'import'
  @Json() report!: BuildReport
  @Moment({ default: () => 'now()' }) startedAt!: Date
  @Moment({ nullable: true }) submittedAt!: Date | null
}
