import { RateLimiterMemory, RateLimiterPostgres, RateLimiterRes, type RateLimiterAbstract } from 'rate-limiter-flexible'
import type { DataSource } from 'typeorm'
import type { Config } from '../config.ts'
import { poolOf } from '../db/pool-of.ts'
import { Refusal } from './refusal.ts'

export interface Throttles {
  /** Failed sign-ins of one account, wherever they come from. */
  readonly account: RateLimiterAbstract
  /** Failed sign-ins from one address, whatever the account. */
  readonly address: RateLimiterAbstract
  /** Mails that somebody who is not signed in can cause. */
  readonly mails: RateLimiterAbstract
  /** All requests of one caller, counted by each process for itself. */
  readonly requests: RateLimiterAbstract
}

/** Counters of attempts; those of sign-in are shared by every server process through the database. */
export function createThrottles(database: DataSource, config: Config): Throttles {
  const shared = (keyPrefix: string, points: number, duration: number): RateLimiterAbstract =>
    new RateLimiterPostgres({
      storeClient: poolOf(database),
      storeType: 'pool',
      tableName: 'throttle',
      tableCreated: true,
      clearExpiredByTimeout: false,
      keyPrefix,
      points,
      duration,
    })
  const quarterHour = 15 * 60
  return {
    account: shared('account', config.SIGN_INS_PER_QUARTER_HOUR, quarterHour),
    address: shared('address', config.SIGN_INS_PER_QUARTER_HOUR * 10, quarterHour),
    mails: shared('mails', 5, 3600),
    requests: new RateLimiterMemory({ keyPrefix: 'requests', points: config.REQUESTS_PER_MINUTE, duration: 60 }),
  }
}

const tooMany = (milliseconds: number): Refusal =>
  new Refusal(429, 'too-many', 'Too many attempts.', 'Wait a little and try again.', [], {
    'retry-after': String(Math.max(1, Math.ceil(milliseconds / 1000))),
  })

/** Counts one attempt. @throws Refusal 429 where there were too many */
export async function countAttempt(throttle: RateLimiterAbstract, key: string): Promise<void> {
  try {
    await throttle.consume(key)
  } catch (reason) {
    if (reason instanceof RateLimiterRes) throw tooMany(reason.msBeforeNext)
    throw reason
  }
}

/** @throws Refusal 429 where a key has used up its attempts; counts nothing */
export async function refuseExhausted(throttle: RateLimiterAbstract, key: string): Promise<void> {
  const state = await throttle.get(key)
  if (state !== null && state.remainingPoints <= 0 && state.msBeforeNext > 0) throw tooMany(state.msBeforeNext)
}
