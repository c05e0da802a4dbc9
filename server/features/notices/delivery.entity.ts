import { Entity, Index } from 'typeorm'
import { Id, Json, Moment, Ref, Text, Whole } from '../../db/columns.ts'

/** One message to a webhook, and what came of it. */
@Entity({ name: 'delivery' })
@Index('delivery_list', ['webhookId', 'createdAt', 'id'])
export class Delivery {
  @Id() id!: string
  @Ref('webhook') webhookId!: string
  @Text() event!: string
  @Json() payload!: object
  @Whole({ default: 0 }) attempts!: number
  @Whole({ nullable: true }) status!: number | null
  @Text({ default: 'waiting' }) state!: 'waiting' | 'delivered' | 'failed'
  @Text({ nullable: true }) error!: string | null
  @Moment({ default: () => 'now()' }) createdAt!: Date
  @Moment({ nullable: true }) deliveredAt!: Date | null
}
