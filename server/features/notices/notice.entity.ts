import { Entity, Index } from 'typeorm'
import type { NoticeEvent } from '../../../shared/api/notice-endpoints.ts'
import { Flag, Id, Moment, Ref, Text } from '../../db/columns.ts'

/** Something one person was told. */
@Entity({ name: 'notice' })
@Index('notice_list', ['personId', 'teamId', 'createdAt', 'id'])
@Index('notice_digest', { synchronize: false })
export class Notice {
  @Id() id!: string
  @Ref('team') teamId!: string
  @Ref('person') personId!: string
  @Text() event!: NoticeEvent
  @Text() subject!: string
  @Text() sentence!: string
  @Text({ nullable: true }) page!: string | null
  /** Waits for the digest. */
  @Flag({ default: false }) isWaiting!: boolean
  @Moment({ default: () => 'now()' }) createdAt!: Date
}
