import type { Request } from 'express'
import type { AnswerOf, BodyOf, Endpoint, ParamsOf, QueryOf } from '../../shared/api/endpoint.ts'
import type { Context } from '../context.ts'
import type { Caller, PersonCaller, RobotCaller } from './caller.ts'
import type { TeamAccess } from './team-access.ts'

/** A request that was understood and may be answered. */
export interface Asked<E extends Endpoint> {
  readonly params: ParamsOf<E>
  readonly query: QueryOf<E>
  readonly body: BodyOf<E>
  /** The body as it came, for endpoints that take other than JSON. */
  readonly bytes: Buffer
  readonly caller: Caller
  readonly context: Context
  readonly request: Request
}

export interface TeamAsked<E extends Endpoint> extends Asked<E> {
  readonly access: TeamAccess
}
export interface PersonAsked<E extends Endpoint> extends Asked<E> {
  readonly caller: PersonCaller
}
export interface CallerAsked<E extends Endpoint> extends Asked<E> {
  readonly caller: PersonCaller | RobotCaller
}

/** Endpoints without a JSON answer give nothing or a file. */
export type Answered<E extends Endpoint> = Promise<[AnswerOf<E>] extends [undefined] ? unknown : AnswerOf<E>>

type Need = 'team' | 'person' | 'caller' | 'open'

/** An endpoint with what answers it. */
export interface Route {
  readonly endpoint: Endpoint
  readonly need: Need
  answer(asked: Asked<Endpoint>): Promise<unknown>
}

const make =
  (need: Need) =>
  (endpoint: Endpoint, answer: (asked: never) => Promise<unknown>): Route => ({
    endpoint,
    need,
    answer: answer as Route['answer'],
  })

/** For members of the team in the path (and its robots where the endpoint says so). */
export const teamRoute = make('team') as <E extends Endpoint>(
  endpoint: E,
  answer: (asked: TeamAsked<E>) => Answered<E>,
) => Route
/** For people who are signed in. */
export const personRoute = make('person') as <E extends Endpoint>(
  endpoint: E,
  answer: (asked: PersonAsked<E>) => Answered<E>,
) => Route
/** For people and robots alike, whatever their team. */
export const callerRoute = make('caller') as <E extends Endpoint>(
  endpoint: E,
  answer: (asked: CallerAsked<E>) => Answered<E>,
) => Route
/** For anyone, and for holders of a link: the answer looks at the link itself. */
export const openRoute = make('open') as <E extends Endpoint>(
  endpoint: E,
  answer: (asked: Asked<E>) => Answered<E>,
) => Route
