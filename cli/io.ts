/** Everything the command line touches outside itself; tests hand in their own. */
export interface Io {
  readonly cwd: string
  readonly env: Readonly<Record<string, string | undefined>>
  /** Today, YYYY-MM-DD. */
  today(): string
  /** Carries reports and nothing else. */
  out(text: string): void
  /** Progress and messages. */
  err(text: string): void
  readonly terminal: { readonly isTerminal: boolean; readonly columns: number | null }
  /** True where progress may be drawn over itself. */
  readonly showsProgress: boolean
  readStandardInput(): Promise<string>
}

/** An expected failure: what is wrong and what to do instead. It ends the command with its exit code. */
export class UsageError extends Error {
  constructor(
    message: string,
    readonly hint: string | null = null,
  ) {
    super(message)
  }
}
