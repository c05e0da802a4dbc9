import { Entity, Index } from 'typeorm'
import type { TokenScope } from '../../../shared/api/endpoint.ts'
import { Bytes, Id, Moment, Ref, Text, Texts } from '../../db/columns.ts'

/** A robot's key: belongs to the team; found by its prefix, held as a digest. */
@Entity({ name: 'api_token' })
@Index('api_token_team', ['teamId', 'createdAt'])
export class ApiToken {
  @Id() id!: string
  @Ref('team') teamId!: string
  @Text() name!: string
  @Index('api_token_prefix', { unique: true })
  @Text()
  prefix!: string
  @Bytes() secretHash!: Buffer
  @Text() lastFour!: string
  @Texts() scopes!: TokenScope[]
  @Ref('person', 'SET NULL', { nullable: true }) createdBy!: string | null
  @Text() creatorName!: string
  @Moment({ default: () => 'now()' }) createdAt!: Date
  @Moment() expiresAt!: Date
  @Moment({ nullable: true }) lastUsedAt!: Date | null
  @Moment({ nullable: true }) revokedAt!: Date | null
  @Moment({ nullable: true }) warnedAt!: Date | null
}
