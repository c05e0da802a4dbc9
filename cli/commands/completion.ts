import { rules } from '../../shared/rules/rule-registry.ts'
import { shapeOf, type KnownWords } from '../completion/command-shape.ts'
import { completionScripts } from '../completion/completion-scripts.ts'
import { exitCode } from '../exit-code.ts'
import { reporterNames } from '../reporters/reporter-registry.ts'
import { oneOf } from './check.ts'
import type { CommandModule } from './command-module.ts'
import { commandEntries } from './command-registry.ts'

const shells = ['bash', 'zsh', 'fish'] as const

const known: KnownWords = {
  'check --report': reporterNames,
  'check --fail-on': ['fail', 'warn', 'regression'],
  'check --units': ['mm', 'in'],
  'compare --report': ['text', 'json', 'markdown'],
  'compare --fail-on': ['regression', 'never'],
  'export --format': ['pdf', 'svg', 'dxf', 'steps'],
  'export --sheet': ['a4', 'letter', '12x12in'],
  'export --units': ['mm', 'in'],
  'push --fail-on': ['fail', 'warn', 'never'],
  'size --report': ['text', 'json'],
  explain: [...rules.map((rule) => rule.id), 'defaults'],
  schema: ['set', 'workspace', 'report'],
  completion: shells,
}

export const completionCommand: CommandModule = {
  define(command) {
    command.argument('<shell>', shells.join(', '))
  },

  async execute(io, words) {
    const shell = oneOf('completion', words[0] ?? '', shells)
    const shapes = await Promise.all(commandEntries.map((entry) => shapeOf(entry, known)))
    io.out(completionScripts[shell](shapes))
    return exitCode.clean
  },
}
