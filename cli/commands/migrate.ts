import { existsSync, readFileSync } from 'node:fs'
import { join, relative } from 'node:path'
import { formatNumber } from '../../shared/edition.ts'
import { migrateText } from '../../shared/template/migrate-text.ts'
import { exitCode, worstExit, type ExitCode } from '../exit-code.ts'
import { findSets } from '../inputs/find-sets.ts'
import { findWorkspaceFolder, workspaceFile } from '../inputs/find-workspace.ts'
import { writeWhole } from '../inputs/write-file.ts'
import type { Io } from '../io.ts'
import type { CommandModule } from './command-module.ts'

function migrateFile(io: Io, path: string, shown: string, isDry: boolean): ExitCode {
  const result = migrateText(readFileSync(path, 'utf8'))
  switch (result.outcome) {
    case 'none':
      io.out(`${shown}: names no format; it follows its workspace\n`)
      return exitCode.clean
    case 'current':
      io.out(`${shown}: format ${String(result.format)}, nothing to do\n`)
      return exitCode.clean
    case 'newer':
      io.err(
        `${shown}: format ${String(result.format)} is newer than this edition, which writes format ${String(formatNumber)}\n`,
      )
      return exitCode.unusable
    case 'migrated':
      if (!isDry) writeWhole(path, result.text)
      io.out(
        `${shown}: format ${String(result.format)} ${isDry ? 'would become' : 'became'} format ${String(formatNumber)}\n`,
      )
      return exitCode.clean
  }
}

export const migrateCommand: CommandModule = {
  define(command) {
    command
      .argument('[paths...]', 'sets, folders or patterns; default: the workspace here with its sets')
      .option('--dry-run', 'say what would change and change nothing')
  },

  async execute(io, words, options) {
    const inputs = await findSets(words, io)
    const home = findWorkspaceFolder(io.cwd)
    const workspace = home === null ? [] : [join(home, workspaceFile)].filter((path) => existsSync(path))
    const paths = new Set([...workspace, ...inputs.flatMap((input) => (input.path === null ? [] : [input.path]))])
    return worstExit(
      [...paths].map((path) => migrateFile(io, path, relative(io.cwd, path), options['dryRun'] === true)),
    )
  },
}
