import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { conflict, found, Refusal } from '../../http/refusal.ts'
import { openRoute, personRoute, type Route } from '../../http/route.ts'
import { countAttempt, type Throttles } from '../../http/throttles.ts'
import { askEmailChange, askReset, confirmEmailChange, resetPassword } from './account-links.service.ts'
import { presentMe } from './me.presenter.ts'
import { hashPassword, isPassword } from './passwords.ts'
import { Person } from './person.entity.ts'
import { findPerson } from './person.repository.ts'
import { removeSession, removeSessions, sessionName, sessionsOf } from './session.repository.ts'
import { authenticate, closeSession, openSession } from './sign-in.ts'

const wrongPassword = (): Refusal => new Refusal(403, 'wrong-password', 'Your present password is wrong.')

export const accountRoutes = (throttles: Throttles): readonly Route[] => [
  openRoute(endpoints.signIn, async ({ body, context, request }) => {
    const person = await authenticate(context, throttles, request, body.email, body.password)
    await openSession(request, context, person)
    return presentMe(context.database.manager, person)
  }),
  personRoute(endpoints.signOut, async ({ request }) => {
    await closeSession(request)
  }),
  personRoute(endpoints.me, async ({ caller, context: { database } }) =>
    presentMe(database.manager, found(await findPerson(database.manager, caller.id))),
  ),
  personRoute(endpoints.changeMe, async ({ body, caller, context: { database } }) => {
    const change = {
      ...(body.name === undefined ? {} : { name: body.name }),
      ...(body.digestHour === undefined ? {} : { digestHour: body.digestHour }),
    }
    if (Object.keys(change).length > 0) await database.manager.update(Person, { id: caller.id }, change)
    return presentMe(database.manager, found(await findPerson(database.manager, caller.id)))
  }),
  personRoute(endpoints.changePassword, async ({ body, caller, context, request }) => {
    const person = found(await findPerson(context.database.manager, caller.id))
    await countAttempt(throttles.account, person.email)
    if (!(await isPassword(body.current, person.passwordHash, context.config))) throw wrongPassword()
    await throttles.account.delete(person.email)
    const passwordHash = await hashPassword(body.next, context.config)
    await context.database.transaction(async (manager) => {
      await manager.update(Person, { id: caller.id }, { passwordHash })
      await removeSessions(manager, caller.id, request.sessionID)
    })
  }),
  personRoute(endpoints.askEmailChange, async ({ body, caller, context }) => {
    const person = found(await findPerson(context.database.manager, caller.id))
    await countAttempt(throttles.mails, `person ${person.id}`)
    if (!(await isPassword(body.password, person.passwordHash, context.config))) throw wrongPassword()
    await askEmailChange(context, person, body.email)
  }),
  openRoute(endpoints.confirmEmailChange, ({ params, context }) => confirmEmailChange(context, params.secret)),
  openRoute(endpoints.askReset, async ({ body, context, request }) => {
    await countAttempt(throttles.mails, `reset ${body.email}`)
    await countAttempt(throttles.address, request.ip ?? 'unknown')
    await askReset(context, body.email)
  }),
  openRoute(endpoints.reset, async ({ params, body, context }) => {
    await resetPassword(context, params.secret, body.password)
  }),
  personRoute(endpoints.sessions, async ({ caller, context, request }) => {
    const sessions = await sessionsOf(context.database.manager, caller.id)
    const items = sessions.map(({ sid, sess }) => ({
      id: sessionName(sid),
      isThis: sid === request.sessionID,
      startedAt: sess.startedAt ?? context.now().toISOString(),
      lastSeenAt: sess.lastSeenAt ?? sess.startedAt ?? context.now().toISOString(),
      device: sess.device ?? 'unknown',
      address: sess.address ?? 'unknown',
    }))
    return { items: items.toSorted((a, b) => (a.lastSeenAt < b.lastSeenAt ? 1 : -1)) }
  }),
  personRoute(endpoints.endSession, async ({ params, caller, context, request }) => {
    const sessions = await sessionsOf(context.database.manager, caller.id)
    const session = found(sessions.find(({ sid }) => sessionName(sid) === params.session))
    if (session.sid === request.sessionID)
      throw conflict('own-session', 'This is the session you are using.', 'Sign out instead.')
    await removeSession(context.database.manager, session.sid)
  }),
]
