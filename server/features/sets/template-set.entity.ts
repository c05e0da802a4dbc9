import { Entity, Index } from 'typeorm'
import { Flag, Id, Moment, Ref, Text, Texts, Uuid, Whole } from '../../db/columns.ts'

/** A set as a team keeps it; what is listed is written here with every version. */
@Entity({ name: 'template_set' })
@Index('template_set_name', ['teamId', 'name'], { unique: true })
@Index('template_set_list', { synchronize: false })
export class TemplateSet {
  @Id() id!: string
  @Ref('team') teamId!: string
  @Text() name!: string
  @Text() title!: string
  @Text({ nullable: true }) family!: string | null
  @Texts({ default: () => "'{}'" }) tags!: string[]
  @Text({ default: 'passing' }) state!: string
  /** Order of the list: newly failing first. */
  @Whole({ default: 9 }) stateRank!: number
  @Whole({ default: 0 }) lastNumber!: number
  /** What the list shows: the latest of the main branch, else of any. */
  @Uuid({ nullable: true }) shownVersionId!: string | null
  @Uuid({ nullable: true }) pinnedVersionId!: string | null
  @Text({ nullable: true }) pinNote!: string | null
  @Text({ nullable: true }) pinnedBy!: string | null
  @Flag({ default: false }) isPublic!: boolean
  @Index('template_set_public', { unique: true })
  @Text({ nullable: true })
  publicKey!: string | null
  @Text({ nullable: true }) photoKey!: string | null
  @Moment({ default: () => 'now()' }) createdAt!: Date
  @Moment({ default: () => 'now()' }) updatedAt!: Date
}
