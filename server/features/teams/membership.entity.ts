import { Entity, Index, PrimaryColumn, ForeignKey } from 'typeorm'
import type { Role } from '../../../shared/api/permissions.ts'
import { Moment, Text } from '../../db/columns.ts'

/** A person's place in a team. */
@Entity({ name: 'membership' })
export class Membership {
  @ForeignKey('team', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  teamId!: string
  @Index('membership_person')
  @ForeignKey('person', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  personId!: string
  @Text() role!: Role
  @Moment({ default: () => 'now()' }) joinedAt!: Date
}
