import { randomUUID } from 'node:crypto'
import type { EntityManager } from 'typeorm'
import type { Context } from '../../context.ts'
import { conflict, Refusal } from '../../http/refusal.ts'
import { hashSecret } from '../../http/secrets.ts'
import { AccountLink } from './account-link.entity.ts'
import { hashPassword } from './passwords.ts'
import { Person } from './person.entity.ts'
import { findPersonByEmail } from './person.repository.ts'
import { removeSessions } from './session.repository.ts'

const hour = 3_600_000

const used = (): Refusal =>
  new Refusal(410, 'link-over', 'This link has been used or is too old.', 'Ask for a new one.')

async function addLink(
  context: Context,
  manager: EntityManager,
  link: Pick<AccountLink, 'personId' | 'purpose' | 'email' | 'changeId'>,
  hours: number,
): Promise<void> {
  const id = randomUUID()
  const expiresAt = new Date(context.now().getTime() + hours * hour)
  await manager.insert(AccountLink, { ...link, id, expiresAt, createdAt: context.now() })
  await context.jobs.add(manager, 'mail-link', { link: 'account', id }, { teamId: null, about: `${link.purpose} link` })
}

/** The link of a secret, locked. @throws Refusal 410 */
async function takeLink(
  context: Context,
  manager: EntityManager,
  secret: string,
  purposes: readonly AccountLink['purpose'][],
): Promise<AccountLink> {
  const link = await manager.findOne(AccountLink, {
    where: { secretHash: hashSecret(secret) },
    lock: { mode: 'pessimistic_write' },
  })
  if (link === null || link.usedAt !== null || link.expiresAt <= context.now() || !purposes.includes(link.purpose))
    throw used()
  await manager.update(AccountLink, { id: link.id }, { usedAt: context.now() })
  return link
}

/** Mails a reset link where the account exists; says nothing either way. */
export async function askReset(context: Context, email: string): Promise<void> {
  await context.database.transaction(async (manager) => {
    const person = await findPersonByEmail(manager, email)
    if (person === null) return
    await addLink(context, manager, { personId: person.id, purpose: 'reset', email: null, changeId: null }, 1)
  })
}

/** Sets a new password, ends every session and uses up every other reset link. */
export async function resetPassword(context: Context, secret: string, password: string): Promise<void> {
  const passwordHash = await hashPassword(password, context.config)
  await context.database.transaction(async (manager) => {
    const { personId } = await takeLink(context, manager, secret, ['reset'])
    await manager.update(Person, { id: personId }, { passwordHash })
    await manager.update(AccountLink, { personId, purpose: 'reset' }, { usedAt: context.now() })
    await removeSessions(manager, personId, null)
  })
}

/** Mails both ends. The new address hears nothing that tells whether another account has it. */
export async function askEmailChange(context: Context, person: Person, email: string): Promise<void> {
  if (email === person.email) throw conflict('same-address', 'That is your address already.')
  await context.database.transaction(async (manager) => {
    const changeId = randomUUID()
    const link = { personId: person.id, email, changeId }
    await addLink(context, manager, { ...link, purpose: 'email-old' }, 24)
    await addLink(context, manager, { ...link, purpose: 'email-new' }, 24)
  })
}

/** Confirms one end; with the second the address is changed. */
export async function confirmEmailChange(
  context: Context,
  secret: string,
): Promise<{ isComplete: boolean; waitsFor: 'old' | 'new' | null }> {
  return context.database.transaction(async (manager) => {
    const link = await takeLink(context, manager, secret, ['email-old', 'email-new'])
    const other = link.purpose === 'email-old' ? 'email-new' : 'email-old'
    if (link.changeId === null || link.email === null) throw used()
    const twin = await manager.findOne(AccountLink, {
      where: { changeId: link.changeId, purpose: other },
      lock: { mode: 'pessimistic_write' },
    })
    if (twin?.usedAt == null) return { isComplete: false, waitsFor: other === 'email-old' ? 'old' : 'new' } as const
    const owner = await findPersonByEmail(manager, link.email)
    if (owner !== null) throw conflict('address-taken', 'This address cannot be used.', 'Choose another one.')
    await manager.update(Person, { id: link.personId }, { email: link.email })
    return { isComplete: true, waitsFor: null }
  })
}
