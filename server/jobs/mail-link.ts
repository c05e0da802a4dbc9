import type { EntityManager } from 'typeorm'
import { AccountLink } from '../features/accounts/account-link.entity.ts'
import { Person } from '../features/accounts/person.entity.ts'
import { BuildInvitation } from '../features/builds/build-invitation.entity.ts'
import { TemplateSet } from '../features/sets/template-set.entity.ts'
import { Invitation } from '../features/teams/invitation.entity.ts'
import { Team } from '../features/teams/team.entity.ts'
import { Version } from '../features/versions/version.entity.ts'
import { hashSecret, makeSecret } from '../http/secrets.ts'
import type { Mail } from '../mail/mailer.ts'
import type { JobData } from './job-kinds.ts'
import type { WorkContext } from './job-handler.ts'

const dayOf = (date: Date): string => date.toISOString().slice(0, 10)

async function invitationMail(
  manager: EntityManager,
  id: string,
  linkTo: (path: string) => string,
): Promise<Mail | null> {
  const invitation = await manager.findOneBy(Invitation, { id })
  if (invitation === null || invitation.acceptedAt !== null || invitation.revokedAt !== null) return null
  const team = await manager.findOneBy(Team, { id: invitation.teamId })
  return {
    to: invitation.email,
    subject: `${invitation.invitedBy} invites you to ${team?.name ?? 'a team'}`,
    text: `${invitation.invitedBy} invites you to ${team?.name ?? 'a team'} as ${invitation.role}.\n\nAccept it here until ${dayOf(invitation.expiresAt)}:\n${linkTo('/invitations/')}\n`,
  }
}

const accountWords = {
  reset: [
    'Set a new password',
    'Somebody, probably you, asked to set a new password. This link works for an hour:',
    '/password/',
  ],
  'email-old': [
    'Your address is about to change',
    'Somebody, probably you, asked to change the address of your account to',
    '/email/',
  ],
  'email-new': [
    'Confirm this address',
    'Somebody, probably you, wants to use this address for their account. Confirm it within a day:',
    '/email/',
  ],
} as const

async function accountMail(manager: EntityManager, id: string, linkTo: (path: string) => string): Promise<Mail | null> {
  const link = await manager.findOneBy(AccountLink, { id })
  if (link === null || link.usedAt !== null) return null
  const person = await manager.findOneBy(Person, { id: link.personId })
  const to = link.purpose === 'email-new' ? link.email : (person?.email ?? null)
  if (to === null) return null
  const [subject, words, path] = accountWords[link.purpose]
  const change = link.purpose === 'email-old' ? ` ${link.email ?? ''}. Confirm it within a day:` : ''
  return { to, subject, text: `${words}${change}\n${linkTo(path)}\n\nIf it was not you, do nothing.\n` }
}

async function buildMail(manager: EntityManager, id: string, linkTo: (path: string) => string): Promise<Mail | null> {
  const invitation = await manager.findOneBy(BuildInvitation, { id })
  if (invitation === null || invitation.revokedAt !== null) return null
  const version = await manager.findOneBy(Version, { id: invitation.versionId })
  const set = version === null ? null : await manager.findOneBy(TemplateSet, { id: version.setId })
  if (version === null || set === null) return null
  const due = invitation.dueOn === null ? '' : `\nPlease send it in by ${invitation.dueOn}.`
  return {
    to: invitation.email,
    subject: `Please build ${set.title}, version ${String(version.number)}`,
    text: `Hello ${invitation.name},\n\n${invitation.invitedBy} asks you to build ${set.title}, version ${String(version.number)}, and to tell how it went.\nYour copy is v${String(version.number)}-t${String(invitation.tester)}, for testing and not for sharing.${due}\n${invitation.note === '' ? '' : `\n${invitation.note}\n`}\nThe form, no account needed:\n${linkTo('/test/')}\n\nMind knives, scoring tools and hot glue, and follow their makers' instructions.\n`,
  }
}

const tables = { invitation: Invitation, account: AccountLink, build: BuildInvitation } as const
const mails = { invitation: invitationMail, account: accountMail, build: buildMail } as const

/**
 * Makes a link's secret, keeps its digest and mails it. The secret exists in the mail only.
 * Where the mail was sent but the job is repeated, a second mail with another secret goes out and the first link ends.
 */
export async function mailLink(context: WorkContext, { link, id }: JobData['mail-link']): Promise<void> {
  const secret = makeSecret()
  const { manager } = context.database
  const mail = await mails[link](manager, id, (path) => `${context.config.PUBLIC_URL}${path}${secret}`)
  if (mail === null) return
  await manager.update(tables[link] as typeof Invitation, { id }, { secretHash: hashSecret(secret) })
  await context.mailer.send(mail)
}
