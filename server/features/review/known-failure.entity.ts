import { Entity, Index } from 'typeorm'
import { Day, Id, Moment, Ref, Text } from '../../db/columns.ts'

/** A failure accepted until a day. */
@Entity({ name: 'known_failure' })
@Index('known_failure_set', ['setId', 'acceptedAt'])
@Index('known_failure_until', ['until'])
export class KnownFailure {
  @Id() id!: string
  @Ref('team') teamId!: string
  @Ref('template_set') setId!: string
  @Text() fingerprint!: string
  @Text() reason!: string
  /** Holds through this day. */
  @Day() until!: string
  @Text() acceptedBy!: string
  @Moment({ default: () => 'now()' }) acceptedAt!: Date
  @Moment({ nullable: true }) endedAt!: Date | null
  @Moment({ nullable: true }) warnedAt!: Date | null
}
