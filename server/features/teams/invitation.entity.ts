import { Entity, Index } from 'typeorm'
import type { Role } from '../../../shared/api/permissions.ts'
import { Bytes, Id, Moment, Ref, Text } from '../../db/columns.ts'

/** An invitation to a team. Its secret exists only in the mail; here is its digest. */
@Entity({ name: 'invitation' })
@Index('invitation_team', ['teamId', 'createdAt'])
export class Invitation {
  @Id() id!: string
  @Ref('team') teamId!: string
  @Text() email!: string
  @Text() role!: Role
  @Index('invitation_secret', { unique: true })
  @Bytes({ nullable: true })
  secretHash!: Buffer | null
  @Text() invitedBy!: string
  @Moment({ default: () => 'now()' }) createdAt!: Date
  @Moment() expiresAt!: Date
  @Moment({ nullable: true }) acceptedAt!: Date | null
  @Moment({ nullable: true }) revokedAt!: Date | null
}
