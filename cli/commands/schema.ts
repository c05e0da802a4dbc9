import { exitCode } from '../exit-code.ts'
import { oneOf } from './check.ts'
import type { CommandModule } from './command-module.ts'

export const schemaCommand: CommandModule = {
  define(command) {
    command.argument('<kind>', 'set, workspace, report')
  },

  async execute(io, words) {
    const kind = oneOf('schema', words[0] ?? '', ['set', 'workspace', 'report'])
    const schema =
      kind === 'set'
        ? (await import('../../shared/template/set-schema.ts')).setSchema()
        : kind === 'workspace'
          ? (await import('../../shared/template/workspace-schema.ts')).workspaceSchema()
          : (await import('../../shared/report/report-schema.ts')).reportSchema()
    io.out(`${JSON.stringify(schema, null, 2)}\n`)
    return exitCode.clean
  },
}
