import { Entity, Index } from 'typeorm'
import { Id, Moment, Ref, Text, Texts, Uuid } from '../../db/columns.ts'
import type { ActorKind } from '../../http/caller.ts'

/** One push: stored whole or not at all. */
@Entity({ name: 'push' })
@Index('push_content', ['teamId', 'contentKey'], { unique: true })
@Index('push_commit', ['teamId', 'commit'])
@Index('push_list', ['teamId', 'createdAt', 'id'])
export class Push {
  @Id() id!: string
  @Ref('team') teamId!: string
  @Text() contentKey!: string
  @Text() branch!: string
  @Text({ nullable: true }) commit!: string | null
  @Texts({ default: () => "'{}'" }) ancestors!: string[]
  @Text({ nullable: true }) mergeBase!: string | null
  @Text({ nullable: true }) link!: string | null
  @Text() engine!: string
  @Text({ nullable: true }) workspaceFile!: string | null
  @Text({ nullable: true }) workspaceDigest!: string | null
  @Text() actorKind!: ActorKind
  @Text() actorName!: string
  @Uuid({ nullable: true }) personId!: string | null
  @Moment({ default: () => 'now()' }) createdAt!: Date
}
