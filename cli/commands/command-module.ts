import type { Command } from 'commander'
import type { ExitCode } from '../exit-code.ts'
import type { Io } from '../io.ts'

/** A command: its arguments and options, and what it does. */
export interface CommandModule {
  /** Adds arguments, options and examples to a command of the right name. */
  define(command: Command): void
  execute(io: Io, words: readonly string[], options: Readonly<Record<string, unknown>>): Promise<ExitCode>
}
