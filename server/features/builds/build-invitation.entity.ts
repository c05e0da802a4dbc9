import { Entity, Index } from 'typeorm'
import { Bytes, Day, Id, Moment, Ref, Text, Uuid, Whole } from '../../db/columns.ts'

/** Somebody asked to build a version. The link's secret exists only in the mail. */
@Entity({ name: 'build_invitation' })
@Index('build_invitation_stamp', ['versionId', 'tester'], { unique: true })
export class BuildInvitation {
  @Id() id!: string
  @Ref('team') teamId!: string
  @Ref('version') versionId!: string
  /** Counts testers of a version: the 2 of `v3-t2`. */
  @Whole() tester!: number
  @Index('build_invitation_email')
  @Text()
  email!: string
  @Text() name!: string
  @Text() note!: string
  @Index('build_invitation_secret', { unique: true })
  @Bytes({ nullable: true })
  secretHash!: Buffer | null
  @Day({ nullable: true }) dueOn!: string | null
  @Uuid({ nullable: true }) inviterId!: string | null
  @Text() invitedBy!: string
  @Moment({ default: () => 'now()' }) createdAt!: Date
  @Moment() expiresAt!: Date
  @Moment({ nullable: true }) openedAt!: Date | null
  @Moment({ nullable: true }) revokedAt!: Date | null
}
