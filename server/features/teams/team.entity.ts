import { Entity, Index } from 'typeorm'
import type { TeamChoices } from '../../../shared/api/permissions.ts'
import { Id, Json, Moment, Text, Whole } from '../../db/columns.ts'

/** Those who keep sets together. */
@Entity({ name: 'team' })
export class Team {
  @Id() id!: string
  @Index('team_slug', { unique: true })
  @Text()
  slug!: string
  @Text() name!: string
  @Text({ default: 'main' }) mainBranch!: string
  @Text({ default: '' }) licence!: string
  @Json({ default: {} }) choices!: Partial<TeamChoices>
  /** Days and counts of retention; null keeps. */
  @Whole({ nullable: true }) mainDays!: number | null
  @Whole({ nullable: true }) branchDays!: number | null
  @Whole({ nullable: true }) branchVersions!: number | null
  @Moment({ default: () => 'now()' }) createdAt!: Date
}
