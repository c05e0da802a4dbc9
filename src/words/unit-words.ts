/** Bands of lengths in words. */
export const unitWords = {
  any: 'any',
  upTo: (end: string) => `up to ${end}`,
  from: (end: string) => `${end} or more`,
  between: (low: string, high: string) => `${low} to ${high}`,
} as const
