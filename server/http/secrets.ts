import { createHash, createHmac, randomBytes, timingSafeEqual } from 'node:crypto'

/** 32 random bytes as a word that fits in an address. */
export const makeSecret = (): string => randomBytes(32).toString('base64url')

/** What is kept of a secret: it has 256 random bits, so a plain digest cannot be guessed back. */
export const hashSecret = (secret: string): Buffer => createHash('sha256').update(secret).digest()

/** Compares in constant time. */
export const isSecret = (secret: string, hash: Buffer): boolean => {
  const given = hashSecret(secret)
  return given.length === hash.length && timingSafeEqual(given, hash)
}

/** A secret that follows from the server's own and need not be stored. */
export const derivedSecret = (serverSecret: string, purpose: string): string =>
  createHmac('sha256', serverSecret).update(purpose).digest('base64url')
