import { exitCode } from '../exit-code.ts'
import { reporterNames } from '../reporters/reporter-registry.ts'
import { oneOf } from './check.ts'
import type { CommandModule } from './command-module.ts'
import { commandEntries } from './command-registry.ts'

const options = [
  '--report',
  '--single',
  '--fail-on',
  '--against',
  '--workmanship',
  '--paper',
  '--scale',
  '--units',
  '--as-of',
  '--fixes',
  '--scales',
  '--fix',
  '--watch',
  '--help',
]

const names = (): string => commandEntries.map(({ name }) => name).join(' ')

const bash = (): string => `_foldgauge() {
  local word="\${COMP_WORDS[COMP_CWORD]}" before="\${COMP_WORDS[COMP_CWORD-1]}"
  if [ "$COMP_CWORD" -eq 1 ]; then COMPREPLY=($(compgen -W "${names()}" -- "$word")); return; fi
  case "$before" in
    --report) COMPREPLY=($(compgen -W "${reporterNames.join(' ')}" -- "$word")); return ;;
    --fail-on) COMPREPLY=($(compgen -W "fail warn regression" -- "$word")); return ;;
    --units) COMPREPLY=($(compgen -W "mm in" -- "$word")); return ;;
  esac
  if [ "\${word#-}" != "$word" ]; then COMPREPLY=($(compgen -W "${options.join(' ')}" -- "$word"))
  else COMPREPLY=($(compgen -f -- "$word")); fi
}
complete -o filenames -F _foldgauge foldgauge
`

const zsh = (): string => `#compdef foldgauge
_foldgauge() {
  if (( CURRENT == 2 )); then compadd -- ${names()}; return; fi
  case "$words[CURRENT-1]" in
    --report) compadd -- ${reporterNames.join(' ')} ;;
    --fail-on) compadd -- fail warn regression ;;
    --units) compadd -- mm in ;;
    *) if [[ "$words[CURRENT]" == -* ]]; then compadd -- ${options.join(' ')}; else _files; fi ;;
  esac
}
compdef _foldgauge foldgauge
`

const fish = (): string =>
  [
    `complete -c foldgauge -n "__fish_is_first_arg" -f -a "${names()}"`,
    ...options.map((option) => `complete -c foldgauge -l ${option.slice(2)}`),
    `complete -c foldgauge -l report -x -a "${reporterNames.join(' ')}"`,
    '',
  ].join('\n')

export const completionCommand: CommandModule = {
  define(command) {
    command.argument('<shell>', 'bash, zsh, fish')
  },

  execute(io, words) {
    const shell = oneOf('completion', words[0] ?? '', ['bash', 'zsh', 'fish'])
    io.out({ bash, zsh, fish }[shell]())
    return Promise.resolve(exitCode.clean)
  },
}
