import { hash, verify } from '@node-rs/argon2'
import type { Config } from '../../config.ts'

const options = (config: Config) => ({ memoryCost: config.PASSWORD_MEMORY, timeCost: 2, parallelism: 1 })

/** argon2id in its usual text form; 19 MiB and two passes, as common practice has it. */
export const hashPassword = (password: string, config: Config): Promise<string> => hash(password, options(config))

/** Verifies against a hash, and takes as long where there is none: unknown accounts cannot be told from known ones. */
export async function isPassword(password: string, known: string | null, config: Config): Promise<boolean> {
  dummy ??= hashPassword('no account has this password', config)
  const matches = await verify(known ?? (await dummy), password)
  return known !== null && matches
}

let dummy: Promise<string> | null = null
