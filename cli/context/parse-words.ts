import { Command, CommanderError } from 'commander'
import type { CommandModule } from '../commands/command-module.ts'
import { exitCode, type ExitCode } from '../exit-code.ts'
import type { Io } from '../io.ts'

/** A commander message in our words: lower case, without its prefix. */
const plain = (message: string): string => message.replace(/^error: /, '').trim()

/** Parses a command's words and executes it; help and mistakes in the words are told. */
export async function parseAndExecute(
  io: Io,
  name: string,
  summary: string,
  module: CommandModule,
  words: readonly string[],
): Promise<ExitCode> {
  const command = new Command(`foldgauge ${name}`)
    .description(summary)
    .exitOverride()
    .showSuggestionAfterError(true)
    .configureOutput({
      writeOut: (text) => {
        io.out(text)
      },
      writeErr: () => undefined,
    })
  module.define(command)
  let code: ExitCode = exitCode.clean
  command.action(async () => {
    code = await module.execute(io, command.args, command.opts())
  })
  try {
    await command.parseAsync([...words], { from: 'user' })
    return code
  } catch (error) {
    if (!(error instanceof CommanderError)) throw error
    if (error.exitCode === 0) return exitCode.clean
    io.err(`foldgauge ${name}: ${plain(error.message)}\nRun foldgauge ${name} --help to see its options.\n`)
    return exitCode.unusable
  }
}
