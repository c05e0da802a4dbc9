import { Entity, Index } from 'typeorm'
import { Flag, Id, Moment, Ref, Text, Uuid, Whole } from '../../db/columns.ts'

/** What a reviewer decided. It holds for the content it was given on, whichever version carries it. */
@Entity({ name: 'decision' })
@Index('decision_content', ['setId', 'content', 'createdAt'])
@Index('decision_version', ['versionId'])
export class Decision {
  @Id() id!: string
  @Ref('template_set') setId!: string
  @Ref('version') versionId!: string
  @Whole() number!: number
  @Text() content!: string
  @Text() decision!: 'approve' | 'ask-changes'
  @Text() note!: string
  /** The decider had pushed the version. */
  @Flag() isOwn!: boolean
  @Text({ nullable: true }) overrideReason!: string | null
  @Uuid({ nullable: true }) personId!: string | null
  @Text() decidedBy!: string
  @Moment({ default: () => 'now()' }) createdAt!: Date
}
