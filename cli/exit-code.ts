/** Exit codes are an interface: pipelines branch on them. */
export const exitCode = {
  /** Nothing failed. */
  clean: 0,
  /** A check failed, or something got worse. */
  failed: 1,
  /** Usage, no such file, no match, unreadable or invalid template. */
  unusable: 2,
  /** Checks ran, the push did not. */
  pushFailed: 3,
  /** A defect in Foldgauge itself. */
  defect: 70,
} as const

export type ExitCode = (typeof exitCode)[keyof typeof exitCode]

const severity: readonly ExitCode[] = [0, 1, 3, 2, 70]

/** The worst of several: 70 over 2 over 3 over 1. */
export const worstExit = (codes: readonly ExitCode[]): ExitCode =>
  codes.reduce<ExitCode>((worst, code) => (severity.indexOf(code) > severity.indexOf(worst) ? code : worst), 0)
