import type { Reporter } from './reporter.ts'

/** The report contract itself: an array of reports, or one object. */
export const jsonReporter: Reporter = (reports, { isSingle }) =>
  `${JSON.stringify(isSingle ? reports[0] : reports, null, 2)}\n`
