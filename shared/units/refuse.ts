import type { Reading } from './units.ts'

export type Failure = Extract<Reading<never>, { ok: false }>

/** A reading that failed: a stable code, the fact and the remedy, both in the author's words. */
export const refuse = (code: string, fact: string, remedy: string): Failure => ({ ok: false, code, fact, remedy })

/** Longer than any measure; what is longer is refused unread, so that no text takes long to refuse. */
export const longestMeasure = 120

const longestQuotation = 40

/** The author's text in quotation marks, cut short where it goes on and on. */
export const quoted = (text: string): string =>
  `“${text.length > longestQuotation ? `${text.slice(0, longestQuotation)}…` : text}”`
