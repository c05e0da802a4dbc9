import type { Reading } from '../../../shared/units/units.ts'

/** The value of a text that should be read; what is wrong with it where it is not. */
export function valueOf<T>(reading: Reading<T>): T {
  if (!reading.ok) throw new Error(`${reading.code}: ${reading.fact}: ${reading.remedy}`)
  return reading.value
}

/** Code and remedy of a text that should be refused. */
export function refusalOf(reading: Reading<unknown>): { readonly code: string; readonly remedy: string } {
  if (reading.ok) throw new Error(`read as ${JSON.stringify(reading.value)}`)
  return { code: reading.code, remedy: reading.remedy }
}
