import type { CommandShape } from './command-shape.ts'

type Script = (commands: readonly CommandShape[]) => string

/** A word that a shell takes as it is. */
const quote = (text: string): string => `'${text.replaceAll("'", `'\\''`)}'`
const joined = (words: readonly string[]): string => quote(words.join(' '))

const namesOf = (commands: readonly CommandShape[]): readonly string[] => commands.map(({ name }) => name)
const optionNames = (command: CommandShape): readonly string[] => command.options.map(({ name }) => name)

/** Cases of a shell's `case` for options whose values are known, and for those whose are not. */
const valueCases = (
  commands: readonly CommandShape[],
  offer: (values: readonly string[]) => string,
  files: string,
): string =>
  commands
    .flatMap((command) =>
      command.options
        .filter(({ takesValue }) => takesValue)
        .map(
          ({ name, values }) =>
            `    ${quote(`${command.name} ${name}`)}) ${values.length > 0 ? offer(values) : files} ;;`,
        ),
    )
    .join('\n')

const wordCases = (
  commands: readonly CommandShape[],
  offer: (values: readonly string[]) => string,
  files: string,
): string =>
  commands
    .map((command) => `    ${command.name}) ${command.words.length > 0 ? offer(command.words) : files} ;;`)
    .join('\n')

const bash: Script = (commands) => {
  const offer = (words: readonly string[]): string => `COMPREPLY=($(compgen -W ${joined(words)} -- "$word"))`
  const files = 'COMPREPLY=($(compgen -f -- "$word"))'
  return `# foldgauge completion for bash: eval "$(foldgauge completion bash)"
_foldgauge() {
  local word="\${COMP_WORDS[COMP_CWORD]}" before="\${COMP_WORDS[COMP_CWORD-1]}" command="\${COMP_WORDS[1]}"
  COMPREPLY=()
  if [ "$COMP_CWORD" -eq 1 ]; then ${offer(namesOf(commands))}; return; fi
  case "$command $before" in
${valueCases(commands, (values) => `${offer(values)}; return`, `${files}; return`)}
  esac
  if [ "\${word#-}" != "$word" ]; then
    case "$command" in
${commands.map((command) => `    ${command.name}) ${offer(optionNames(command))} ;;`).join('\n')}
    esac
    return
  fi
  case "$command" in
${wordCases(commands, offer, files)}
  esac
}
complete -o filenames -F _foldgauge foldgauge
`
}

const zsh: Script = (commands) => {
  const offer = (words: readonly string[]): string => `compadd -- ${words.map(quote).join(' ')}`
  return `#compdef foldgauge
# foldgauge completion for zsh: eval "$(foldgauge completion zsh)"
_foldgauge() {
  local command="$words[2]" before="$words[CURRENT-1]"
  if (( CURRENT == 2 )); then
    local -a commands
    commands=(${commands.map(({ name, about }) => quote(`${name}:${about}`)).join(' ')})
    _describe command commands
    return
  fi
  case "$command $before" in
${valueCases(commands, (values) => `${offer(values)}; return`, '_files; return')}
  esac
  if [[ "$words[CURRENT]" == -* ]]; then
    case "$command" in
${commands.map((command) => `    ${command.name}) ${offer(optionNames(command))} ;;`).join('\n')}
    esac
    return
  fi
  case "$command" in
${wordCases(commands, offer, '_files')}
  esac
}
compdef _foldgauge foldgauge
`
}

/** In single quotes fish takes a backslash and a quote only behind a backslash. */
const quoteFish = (text: string): string => `'${text.replaceAll('\\', '\\\\').replaceAll("'", "\\'")}'`

const fish: Script = (commands) => {
  const lines = commands.flatMap((command) => {
    const inCommand = `complete -c foldgauge -n '__fish_seen_subcommand_from ${command.name}'`
    return [
      `complete -c foldgauge -n __fish_use_subcommand -f -a ${command.name} -d ${quoteFish(command.about)}`,
      ...command.options.map(({ name, about, takesValue, values }) => {
        const value = !takesValue ? '' : values.length > 0 ? ` -x -a ${quoteFish(values.join(' '))}` : ' -r'
        return `${inCommand} -l ${name.slice(2)}${value} -d ${quoteFish(about)}`
      }),
      ...(command.words.length > 0 ? [`${inCommand} -f -a ${quoteFish(command.words.join(' '))}`] : []),
    ]
  })
  return `# foldgauge completion for fish: foldgauge completion fish | source\n${lines.join('\n')}\n`
}

/** A completion script for each shell, from what the commands take. */
export const completionScripts = { bash, zsh, fish } as const
