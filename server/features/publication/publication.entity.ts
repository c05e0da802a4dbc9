import { Entity, Index } from 'typeorm'
import { Id, Moment, Ref, Text, Whole } from '../../db/columns.ts'

/** A version under an immutable label. Its version cannot be deleted while it stands. */
@Entity({ name: 'publication' })
@Index('publication_label', ['setId', 'label'], { unique: true })
@Index('publication_version', ['versionId'], { unique: true })
@Index('publication_list', ['setId', 'publishedAt'])
export class Publication {
  @Id() id!: string
  @Ref('template_set') setId!: string
  @Ref('version') versionId!: string
  @Whole() number!: number
  @Text() label!: string
  @Text() notes!: string
  @Text() licence!: string
  @Text({ nullable: true }) overrideReason!: string | null
  @Text() publishedBy!: string
  @Moment({ default: () => 'now()' }) publishedAt!: Date
  @Text({ default: 'pending' }) exports!: 'pending' | 'ready' | 'failed'
  @Moment({ nullable: true }) recalledAt!: Date | null
  @Text({ nullable: true }) recallReason!: string | null
  @Text({ nullable: true }) recalledBy!: string | null
}
