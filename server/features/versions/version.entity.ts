import { Entity, Index } from 'typeorm'
import type { z } from 'zod'
import type { worstFitShape } from '../../../shared/api/set-endpoints.ts'
import type { baselineReasons, countsShape, reviewStates } from '../../../shared/api/shapes/version-shapes.ts'
import type { Report } from '../../../shared/report/report.ts'
import { Day, Id, Json, Moment, Real, Ref, Text, Texts, Uuid, Whole } from '../../db/columns.ts'
import type { ActorKind } from '../../http/caller.ts'

export type ChangeState = 'pending' | 'first' | 'same' | 'changed' | 'better' | 'worse' | 'incomparable'
export type BaselineReason = (typeof baselineReasons)[number]
export type ReviewState = (typeof reviewStates)[number]

/** One immutable state of a set. What lists show is here; texts and report lie in `VersionContent`. */
@Entity({ name: 'version' })
@Index('version_number', ['setId', 'number'], { unique: true })
@Index('version_branch', ['setId', 'branch', 'number'])
@Index('version_review', ['setId', 'reviewState', 'number'])
@Index('version_content_digest', ['setId', 'content'])
@Index('version_team_age', ['teamId', 'createdAt'])
export class Version {
  @Id() id!: string
  @Ref('team') teamId!: string
  @Ref('template_set') setId!: string
  @Whole() number!: number
  @Text() branch!: string
  @Text({ nullable: true }) commit!: string | null
  @Text({ nullable: true }) link!: string | null
  @Text() origin!: 'push' | 'ripple'
  @Text() file!: string
  @Text() title!: string
  @Text({ nullable: true }) family!: string | null
  @Text() units!: 'mm' | 'in'
  @Text() digest!: string
  /** What an approval binds to: the digest without the day. */
  @Text() content!: string
  /** Text, judging options and the status of each verdict: what makes a version another one. */
  @Text() identity!: string
  @Text() engine!: string
  @Text() rules!: string
  @Day() asOf!: string
  @Text() verdict!: Report['summary']['verdict']
  @Real() works!: number
  @Json() counts!: z.output<typeof countsShape>
  @Json({ nullable: true }) worstFit!: z.output<typeof worstFitShape> | null
  /** Fingerprints that fail. */
  @Texts() failing!: string[]
  @Text({ nullable: true }) differs!: string | null
  @Text() senderEngine!: string
  @Text({ nullable: true }) senderDigest!: string | null
  @Text({ nullable: true }) senderVerdict!: Report['summary']['verdict'] | null
  @Text() actorKind!: ActorKind
  @Text() actorName!: string
  @Uuid({ nullable: true }) personId!: string | null
  @Index('version_baseline')
  @Ref('version', 'SET NULL', { nullable: true })
  baselineId!: string | null
  @Whole({ nullable: true }) baselineNumber!: number | null
  @Text() baselineReason!: BaselineReason
  @Text() baselineSentence!: string
  @Text({ nullable: true }) baselineBy!: string | null
  @Text({ default: 'pending' }) changeState!: ChangeState
  @Text({ default: '' }) changeSentence!: string
  @Whole({ default: 0 }) newlyFailing!: number
  @Whole({ default: 0 }) nowPassing!: number
  @Text({ default: 'none' }) reviewState!: ReviewState
  @Moment({ default: () => 'now()' }) createdAt!: Date
}
