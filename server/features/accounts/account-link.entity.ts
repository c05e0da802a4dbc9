import { Entity, Index } from 'typeorm'
import { Bytes, Id, Moment, Ref, Text, Uuid } from '../../db/columns.ts'

/** A link mailed to somebody: a reset, or one end of a change of address. */
@Entity({ name: 'account_link' })
export class AccountLink {
  @Id() id!: string
  @Index('account_link_person')
  @Ref('person')
  personId!: string
  @Text() purpose!: 'reset' | 'email-old' | 'email-new'
  @Index('account_link_secret', { unique: true })
  @Bytes({ nullable: true })
  secretHash!: Buffer | null
  /** The address that is changed to. */
  @Text({ nullable: true }) email!: string | null
  /** Both ends of one change share it. */
  @Uuid({ nullable: true }) changeId!: string | null
  @Moment({ default: () => 'now()' }) createdAt!: Date
  @Moment() expiresAt!: Date
  @Moment({ nullable: true }) usedAt!: Date | null
}
