import type { Request } from 'express'
import type { Context } from '../../context.ts'
import { Refusal } from '../../http/refusal.ts'
import { countAttempt, refuseExhausted, type Throttles } from '../../http/throttles.ts'
import { isPassword } from './passwords.ts'
import type { Person } from './person.entity.ts'
import { findPersonByEmail } from './person.repository.ts'

const wrong = (): Refusal =>
  new Refusal(
    401,
    'wrong-sign-in',
    'E-mail or password is wrong.',
    'Ask for a link to set a new password if you forgot it.',
  )

/** The person behind e-mail and password. @throws Refusal 401 alike for unknown accounts, 429 after too many attempts */
export async function authenticate(
  context: Context,
  throttles: Throttles,
  request: Request,
  email: string,
  password: string,
): Promise<Person> {
  const address = request.ip ?? 'unknown'
  await refuseExhausted(throttles.account, email)
  await refuseExhausted(throttles.address, address)
  const person = await findPersonByEmail(context.database.manager, email)
  if (await isPassword(password, person?.passwordHash ?? null, context.config)) {
    await throttles.account.delete(email)
    if (person !== null) return person
  }
  await countAttempt(throttles.account, email)
  await countAttempt(throttles.address, address)
  throw wrong()
}

/** Opens a session under a new id. */
export function openSession(request: Request, context: Context, person: Person): Promise<void> {
  return new Promise((fulfil, reject) => {
    request.logIn(person, (error: unknown) => {
      if (error !== undefined && error !== null) {
        reject(error instanceof Error ? error : new Error(String(error)))
        return
      }
      const now = context.now().toISOString()
      request.session.startedAt = now
      request.session.lastSeenAt = now
      request.session.device = (request.headers['user-agent'] ?? 'unknown').slice(0, 200)
      request.session.address = request.ip ?? 'unknown'
      request.session.save((problem: unknown) => {
        if (problem === undefined || problem === null) fulfil()
        else reject(problem instanceof Error ? problem : new Error(String(problem)))
      })
    })
  })
}

export const closeSession = (request: Request): Promise<void> =>
  new Promise((fulfil, reject) => {
    request.logout((error: unknown) => {
      if (error === undefined || error === null) request.session.destroy(() => fulfil())
      else reject(error instanceof Error ? error : new Error(String(error)))
    })
  })
