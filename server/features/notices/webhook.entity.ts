import { Entity, Index } from 'typeorm'
import type { NoticeEvent } from '../../../shared/api/notice-endpoints.ts'
import { Flag, Id, Moment, Ref, Text, Texts, Whole } from '../../db/columns.ts'

/** An address that is told. Its signing secret is derived from the server's own and never stored. */
@Entity({ name: 'webhook' })
export class Webhook {
  @Id() id!: string
  @Index('webhook_team')
  @Ref('team')
  teamId!: string
  @Text() url!: string
  @Texts() events!: NoticeEvent[]
  @Flag({ default: true }) isOn!: boolean
  /** Deliveries that failed for good in a row. */
  @Whole({ default: 0 }) failures!: number
  @Text({ nullable: true }) stoppedWhy!: string | null
  @Moment({ default: () => 'now()' }) createdAt!: Date
}
