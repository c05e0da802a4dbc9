import { RefusedError } from '../../shared/api/create-client.ts'
import { tokenEndpoints } from '../../shared/api/token-endpoints.ts'
import { exitCode } from '../exit-code.ts'
import { UsageError } from '../io.ts'
import { clientOf, explainRefusal } from '../push/connect.ts'
import { keepToken, readServer } from '../push/credentials.ts'
import type { CommandModule } from './command-module.ts'

export const loginCommand: CommandModule = {
  define(command) {
    command
      .argument('<server>', 'address of the server, such as https://foldgauge.example')
      .addHelpText('after', '\nThe token is read from standard input. Make one on the page of your team, under Tokens.')
  },

  async execute(io, words) {
    const server = readServer(words[0] ?? '')
    if (io.terminal.isTerminal) io.err(`Paste a token for ${server} and end with Enter and Ctrl-D:\n`)
    const token = (await io.readStandardInput()).trim()
    if (!/^fgt_[a-z0-9]{10}_[\w-]{43}$/.test(token))
      throw new UsageError(
        'that is not a token',
        'It begins with fgt_ and comes from the page of your team, under Tokens.',
      )
    try {
      const { team, name, scopes, expiresAt } = await clientOf({ server, token }).call(tokenEndpoints.tokenCaller)
      const file = keepToken(io, server, token)
      io.err(
        `Signed in to ${server} for team ${team} with the token ${name} (${scopes.join(', ')}), good until ${expiresAt.slice(0, 10)}.\nKept in ${file}.\n`,
      )
      return exitCode.clean
    } catch (error) {
      if (error instanceof RefusedError) throw new UsageError(explainRefusal(error, server).trimEnd())
      throw error
    }
  },
}
