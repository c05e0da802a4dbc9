import type { Command } from 'commander'
import type { ExitCode } from '../exit-code.ts'
import type { GivenWords } from '../context/plain-words.ts'
import type { Io } from '../io.ts'

/** A command: its arguments and options, and what it does. */
export interface CommandModule {
  /** Adds arguments, options and examples to a command of the right name. */
  define(command: Command): void
  /** Reads a plain line without a parser; `null` for a line that needs one. */
  readPlainly?(words: readonly string[]): GivenWords | null
  execute(io: Io, words: readonly string[], options: Readonly<Record<string, unknown>>): Promise<ExitCode>
}
