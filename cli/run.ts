import { engineVersion, formatNumber, rulesEdition } from '../shared/edition.ts'
import { nearestName } from '../shared/units/did-you-mean.ts'
import { commandEntries } from './commands/command-registry.ts'
import { exitCode, type ExitCode } from './exit-code.ts'
import { UsageError, type Io } from './io.ts'

const version = `foldgauge ${engineVersion}, rules ${rulesEdition}, template format ${String(formatNumber)}\n`

function overview(): string {
  const width = Math.max(...commandEntries.map(({ name }) => name.length))
  const lines = commandEntries.map(({ name, summary }) => `  ${name.padEnd(width)}  ${summary}`)
  return `Foldgauge checks that paper templates fit into one another when strangers build them.

  foldgauge check                      judge every set of the workspace here
  foldgauge check sets/notes.yaml      judge one set
  foldgauge check --report json        the same for a program to read

Commands
${lines.join('\n')}

foldgauge COMMAND --help tells a command's options. Exit codes: 0 nothing failed, 1 a check failed,
2 usage or a template that cannot be read, 3 checks ran but the push failed, 70 a defect in Foldgauge.
`
}

function unknownCommand(io: Io, word: string): ExitCode {
  if (word.startsWith('-')) {
    io.err(`foldgauge: “${word}” stands where a command is expected\n`)
    io.err('Write the command first, such as foldgauge check --report json.\n')
    return exitCode.unusable
  }
  const near = nearestName(
    word,
    commandEntries.map(({ name }) => name),
  )
  io.err(`foldgauge: there is no command “${word}”${near === null ? '' : `; did you mean ${near}?`}\n`)
  io.err('Run foldgauge --help to see the commands.\n')
  return exitCode.unusable
}

/** Runs the command line. @returns the exit code; never throws */
export async function run(words: readonly string[], io: Io): Promise<ExitCode> {
  const [first, ...rest] = words
  if (first === 'help' && rest[0] !== undefined) return run([rest[0], '--help'], io)
  if (first === undefined || first === '--help' || first === '-h' || first === 'help') {
    io.out(overview())
    return exitCode.clean
  }
  if (first === '--version' || first === '-V') {
    io.out(version)
    return exitCode.clean
  }
  const entry = commandEntries.find(({ name }) => name === first)
  if (entry === undefined) return unknownCommand(io, first)
  try {
    const module = await entry.load()
    const given = module.readPlainly?.(rest) ?? null
    if (given !== null) return await module.execute(io, given.words, given.options)
    const { parseAndExecute } = await import('./context/parse-words.ts')
    return await parseAndExecute(io, entry.name, entry.summary, module, rest)
  } catch (error) {
    return explain(io, entry.name, error)
  }
}

function explain(io: Io, command: string, error: unknown): ExitCode {
  if (error instanceof UsageError) {
    io.err(`foldgauge ${command}: ${error.message}\n${error.hint === null ? '' : `${error.hint}\n`}`)
    return exitCode.unusable
  }
  return tellDefect(io, error)
}

/** Tells of something nobody foresaw in one line; where it happened only to those who ask. */
export function tellDefect(io: Pick<Io, 'env' | 'err'>, error: unknown): ExitCode {
  const message = error instanceof Error ? error.message : String(error)
  io.err(`foldgauge: this is a defect in Foldgauge, not in your template: ${message}\n`)
  if (io.env['FOLDGAUGE_DEBUG'] === '1' && error instanceof Error) io.err(`${error.stack ?? ''}\n`)
  return exitCode.defect
}
