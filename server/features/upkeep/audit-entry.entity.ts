import { Entity, Index, PrimaryColumn } from 'typeorm'
import { Moment, Text, Uuid } from '../../db/columns.ts'
import type { ActorKind } from '../../http/caller.ts'

/** Who did what, in words that stay readable when everything named in them is gone. Rows are only added. */
@Entity({ name: 'audit_entry' })
@Index('audit_entry_list', ['teamId', 'id'])
export class AuditEntry {
  @PrimaryColumn({ type: 'bigint', generated: 'identity', generatedIdentity: 'ALWAYS' }) id!: string
  /** No foreign key: the record outlives the team. */
  @Uuid() teamId!: string
  @Moment({ default: () => 'now()' }) at!: Date
  @Text() actorKind!: ActorKind
  @Text() actorName!: string
  @Text() verb!: string
  @Text() objectKind!: string
  @Text() objectName!: string
  @Text() sentence!: string
}
