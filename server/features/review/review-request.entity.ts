import { Entity, Index } from 'typeorm'
import { Id, Moment, Ref, Text, Uuid } from '../../db/columns.ts'

/** A version put up for review. */
@Entity({ name: 'review_request' })
@Index('review_request_version', ['versionId', 'createdAt'])
export class ReviewRequest {
  @Id() id!: string
  @Ref('version') versionId!: string
  @Text() note!: string
  @Uuid({ nullable: true }) personId!: string | null
  @Text() askedBy!: string
  @Moment({ default: () => 'now()' }) createdAt!: Date
}
