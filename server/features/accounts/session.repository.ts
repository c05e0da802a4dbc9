import { createHash } from 'node:crypto'
import type { EntityManager } from 'typeorm'
import type { Session } from './session.entity.ts'

/** How a session is named to its owner: its own id is a secret. */
export const sessionName = (sid: string): string => createHash('sha256').update(sid).digest('hex').slice(0, 32)

export const sessionsOf = (manager: EntityManager, personId: string): Promise<Session[]> =>
  manager.query(`select sid, sess, expire from session where (sess -> 'passport' ->> 'user') = $1 and expire > now()`, [
    personId,
  ])

export const removeSession = async (manager: EntityManager, sid: string): Promise<void> => {
  await manager.query('delete from session where sid = $1', [sid])
}

/** Ends every session of a person but one. */
export const removeSessions = async (manager: EntityManager, personId: string, but: string | null): Promise<void> => {
  await manager.query(
    `delete from session where (sess -> 'passport' ->> 'user') = $1 and sid is distinct from $2::varchar`,
    [personId, but],
  )
}
