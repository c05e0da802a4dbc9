import type { TokenScope } from '../../shared/api/endpoint.ts'

export type ActorKind = 'person' | 'robot' | 'tester' | 'system'

/** Whoever did something, as it is recorded: the name stays when the person goes. */
export interface Actor {
  readonly kind: ActorKind
  readonly name: string
  readonly personId: string | null
}

export interface PersonCaller {
  readonly kind: 'person'
  readonly id: string
  readonly name: string
  readonly email: string
}

export interface RobotCaller {
  readonly kind: 'robot'
  readonly tokenId: string
  readonly teamId: string
  readonly name: string
  /** Who made the token: their work counts as their own whoever carries it. */
  readonly makerId: string | null
  readonly scopes: readonly TokenScope[]
}

/** Who sent a request; null is signed out. */
export type Caller = PersonCaller | RobotCaller | null

export const systemActor: Actor = { kind: 'system', name: 'Foldgauge', personId: null }

export const actorOf = (caller: PersonCaller | RobotCaller): Actor => ({
  kind: caller.kind,
  name: caller.name,
  personId: caller.kind === 'person' ? caller.id : caller.makerId,
})
