import { Entity, Index } from 'typeorm'
import { Id, Moment, Ref, Text, Uuid, Whole } from '../../db/columns.ts'

/** A remark on a version, a fit or a piece. */
@Entity({ name: 'comment' })
@Index('comment_version', ['versionId', 'createdAt'])
export class Comment {
  @Id() id!: string
  @Ref('team') teamId!: string
  @Ref('version') versionId!: string
  @Whole() number!: number
  @Text() anchorKind!: 'version' | 'fit' | 'piece'
  @Text({ nullable: true }) anchorName!: string | null
  @Text() body!: string
  @Uuid({ nullable: true }) personId!: string | null
  @Text() writtenBy!: string
  @Moment({ default: () => 'now()' }) createdAt!: Date
  @Moment({ nullable: true }) resolvedAt!: Date | null
  @Text({ nullable: true }) resolvedBy!: string | null
}
