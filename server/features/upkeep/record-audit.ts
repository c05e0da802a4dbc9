import type { EntityManager } from 'typeorm'
import type { Actor } from '../../http/caller.ts'
import { AuditEntry } from './audit-entry.entity.ts'

export interface Deed {
  /** A plain verb: published, approved, invited. */
  readonly verb: string
  readonly kind: string
  readonly name: string
  /** What happened, whole: “published orchard-notes version 3 as 1.2.0”. */
  readonly sentence: string
}

/** Writes down a decision or a change of permission, in the transaction that makes it. */
export async function recordAudit(manager: EntityManager, teamId: string, actor: Actor, deed: Deed): Promise<void> {
  await manager.insert(AuditEntry, {
    teamId,
    actorKind: actor.kind,
    actorName: actor.name,
    verb: deed.verb,
    objectKind: deed.kind,
    objectName: deed.name,
    sentence: `${actor.name} ${deed.sentence}`,
  })
}
