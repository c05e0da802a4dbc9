import connectPgSimple from 'connect-pg-simple'
import { createHash } from 'node:crypto'
import type { Express, RequestHandler } from 'express'
import session from 'express-session'
import { Passport } from 'passport'
import { Strategy as BearerStrategy } from 'passport-http-bearer'
import type { Context } from '../context.ts'
import { poolOf } from '../db/pool-of.ts'
import { findPerson } from '../features/accounts/person.repository.ts'
import { findRobot } from '../features/tokens/tokens.service.ts'
import { Refusal } from './refusal.ts'

const month = 30 * 86_400_000
const sightedEvery = 5 * 60_000

const badToken = (): Refusal =>
  new Refusal(401, 'bad-token', 'The token is unknown, revoked or over.', 'Make a new one on the team’s page.', [], {
    'www-authenticate': 'Bearer',
  })

/** Tokens in addresses end up in logs and histories: such a request is refused, and so is one in a body. */
const refuseTokensElsewhere: RequestHandler = (request, _response, next) => {
  next(
    'access_token' in request.query
      ? new Refusal(
          400,
          'token-in-address',
          'A token was sent in the address.',
          'Send it as Authorization: Bearer …, and revoke this one.',
        )
      : undefined,
  )
}

/** The session's cookie is written anew now and then, and its last use noted. */
const noteSighting =
  (context: Context): RequestHandler =>
  (request, _response, next) => {
    const seen = Date.parse(request.session.lastSeenAt ?? '')
    if (request.caller != null && !(context.now().getTime() - seen < sightedEvery))
      request.session.lastSeenAt = context.now().toISOString()
    next()
  }

/**
 * Tells who sends a request: a person by session cookie, or a robot by bearer token, never both.
 * Another way of signing in (a company's own accounts) would be one more strategy here that ends in `openSession`.
 */
export function mountSignIn(app: Express, context: Context): void {
  const { config } = context
  const passport = new Passport()
  const Store = connectPgSimple(session)
  const store = new Store({
    pool: poolOf(context.database),
    tableName: 'session',
    createTableIfMissing: false,
    pruneSessionInterval: false,
    disableTouch: true,
  })
  const sessions = session({
    store,
    name: 'foldgauge',
    secret: createHash('sha256').update(`session ${config.FOLDGAUGE_SECRET}`).digest('hex'),
    resave: false,
    saveUninitialized: false,
    cookie: {
      httpOnly: true,
      sameSite: 'lax',
      secure: config.PUBLIC_URL.startsWith('https:'),
      maxAge: month,
      path: '/',
    },
  })
  passport.serializeUser((user, done) => {
    done(null, (user as { readonly id: string }).id)
  })
  passport.deserializeUser((id: string, done) => {
    findPerson(context.database.manager, id).then(
      (person) => {
        done(null, person ?? false)
      },
      (error: unknown) => {
        done(error)
      },
    )
  })
  passport.use(
    new BearerStrategy((token, done) => {
      findRobot(context, token).then(
        (robot) => {
          done(null, robot ?? false)
        },
        (error: unknown) => {
          done(error)
        },
      )
    }),
  )
  const bearer: RequestHandler = (request, response, next) => {
    const check = passport.authenticate('bearer', { session: false }, (error: unknown, robot: unknown) => {
      if (error !== null && error !== undefined) next(error)
      else if (robot === false || robot === undefined) next(badToken())
      else {
        request.caller = robot as NonNullable<typeof request.caller>
        next()
      }
    }) as RequestHandler
    void check(request, response, next)
  }
  const person: RequestHandler = (request, _response, next) => {
    const user = request.user as { readonly id: string; readonly name: string; readonly email: string } | undefined
    if (user !== undefined) request.caller = { kind: 'person', id: user.id, name: user.name, email: user.email }
    next()
  }
  const chain = [sessions, passport.initialize(), passport.session(), person, noteSighting(context)]
  app.use('/api', refuseTokensElsewhere)
  app.use('/api', (request, response, next) => {
    if (request.headers.authorization !== undefined) bearer(request, response, next)
    else runAll(chain as RequestHandler[], request, response, next)
  })
}

function runAll(handlers: readonly RequestHandler[], ...[request, response, next]: Parameters<RequestHandler>): void {
  const [first, ...rest] = handlers
  if (first === undefined) {
    next()
    return
  }
  void first(request, response, (error?: unknown) => {
    if (error === undefined || error === null) runAll(rest, request, response, next)
    else next(error)
  })
}
