import { z } from 'zod'
import { anyone, byLink, defineEndpoint, signedIn } from './define-endpoint.ts'
import { words } from './shapes/words.ts'

const group = 'Accounts'

export const meShape = z
  .strictObject({
    id: words.id,
    name: words.name,
    email: z.string(),
    digestHour: z.int().min(0).max(23).describe('hour in UTC at which the daily digest leaves'),
    teams: z.array(z.strictObject({ slug: words.slug, name: words.name, role: words.role })),
  })
  .meta({ id: 'Me' })

const sessionShape = z
  .strictObject({
    id: z.string().describe('a digest of the session, not its secret'),
    isThis: z.boolean(),
    startedAt: words.moment,
    lastSeenAt: words.moment,
    device: z.string(),
    address: z.string(),
  })
  .meta({ id: 'Session' })

/** Signing in and out, the own account, reset and change of address. */
export const accountEndpoints = {
  signIn: defineEndpoint('signIn', 'post', '/api/session', {
    group,
    summary: 'Sign in with e-mail and password; the answer is the same for unknown accounts',
    access: anyone,
    body: z.strictObject({ email: words.email, password: z.string().min(1).max(200) }),
    answer: meShape,
    statuses: [200],
  }),
  signOut: defineEndpoint('signOut', 'delete', '/api/session', { group, summary: 'Sign out', access: signedIn }),
  me: defineEndpoint('me', 'get', '/api/me', {
    group,
    summary: 'Who is signed in, and their teams',
    access: signedIn,
    answer: meShape,
  }),
  changeMe: defineEndpoint('changeMe', 'patch', '/api/me', {
    group,
    summary: 'Change the own name or the hour of the digest',
    access: signedIn,
    body: z.strictObject({ name: words.name.optional(), digestHour: z.int().min(0).max(23).optional() }),
    answer: meShape,
  }),
  changePassword: defineEndpoint('changePassword', 'put', '/api/me/password', {
    group,
    summary: 'Change the own password; ends every other session',
    access: signedIn,
    body: z.strictObject({ current: z.string().min(1).max(200), next: words.password }),
  }),
  askEmailChange: defineEndpoint('askEmailChange', 'post', '/api/me/email-change', {
    group,
    summary: 'Ask to change the own address; mails go to the old and the new one and both must be confirmed',
    access: signedIn,
    body: z.strictObject({ email: words.email, password: z.string().min(1).max(200) }),
    statuses: [204],
  }),
  confirmEmailChange: defineEndpoint('confirmEmailChange', 'post', '/api/email-changes/{secret}', {
    group,
    summary: 'Confirm one end of a change of address',
    access: byLink,
    params: z.strictObject({ secret: words.secret }),
    answer: z.strictObject({ isComplete: z.boolean(), waitsFor: z.enum(['old', 'new']).nullable() }),
    statuses: [200],
  }),
  askReset: defineEndpoint('askReset', 'post', '/api/password-resets', {
    group,
    summary: 'Ask for a link to set a new password; the answer is the same for unknown accounts',
    access: anyone,
    body: z.strictObject({ email: words.email }),
    statuses: [204],
  }),
  reset: defineEndpoint('reset', 'post', '/api/password-resets/{secret}', {
    group,
    summary: 'Set a new password with a link; ends every session',
    access: byLink,
    params: z.strictObject({ secret: words.secret }),
    body: z.strictObject({ password: words.password }),
    statuses: [204],
  }),
  sessions: defineEndpoint('sessions', 'get', '/api/me/sessions', {
    group,
    summary: 'The own sessions',
    access: signedIn,
    answer: z.strictObject({ items: z.array(sessionShape) }),
  }),
  endSession: defineEndpoint('endSession', 'delete', '/api/me/sessions/{session}', {
    group,
    summary: 'End one of the own sessions',
    access: signedIn,
    params: z.strictObject({ session: z.string().min(8).max(64) }),
  }),
  invitationByLink: defineEndpoint('invitationByLink', 'get', '/api/invitations/{secret}', {
    group,
    summary: 'What an invitation is to, and whether an account with its address exists',
    access: byLink,
    params: z.strictObject({ secret: words.secret }),
    answer: z.strictObject({
      team: words.name,
      role: words.role,
      email: z.string(),
      invitedBy: z.string(),
      hasAccount: z.boolean(),
      expiresAt: words.moment,
    }),
  }),
  acceptInvitation: defineEndpoint('acceptInvitation', 'post', '/api/invitations/{secret}', {
    group,
    summary: 'Accept an invitation: with name and a new password, or the password of the account that exists',
    access: byLink,
    params: z.strictObject({ secret: words.secret }),
    body: z.strictObject({ name: words.name.optional(), password: words.password }),
    answer: meShape,
    statuses: [200],
  }),
} as const
