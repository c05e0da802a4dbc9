/** An option as commander words it. */
export interface OptionUsage {
  /** Such as `--single` or `--report <kind>`. */
  readonly flags: string
  readonly about: string
  readonly initial?: string
  /** Every use adds to a list. */
  readonly isRepeated?: true
}

/** Words and options of a command as commander hands them over. */
export interface GivenWords {
  readonly words: readonly string[]
  readonly options: Readonly<Record<string, unknown>>
}

const keyOf = (name: string): string => name.slice(2).replace(/-(\w)/g, (_, letter: string) => letter.toUpperCase())

/**
 * Reads what is written plainly: options spelt out as they are listed, values as words of their own. Loading a parser
 * takes longer than judging a set, so it waits for lines that need one.
 * @returns `null` for anything else, help and mistakes included
 */
export function readPlainWords(usages: readonly OptionUsage[], line: readonly string[]): GivenWords | null {
  const words: string[] = []
  const options: Record<string, unknown> = {}
  const usageOf = new Map(usages.map((usage) => [usage.flags.split(' ')[0] ?? '', usage]))
  for (const [name, { initial, isRepeated }] of usageOf) {
    if (isRepeated === true) options[keyOf(name)] = []
    else if (initial !== undefined) options[keyOf(name)] = initial
  }
  for (let index = 0; index < line.length; index += 1) {
    const word = line[index] ?? ''
    if (word === '-' || !word.startsWith('-')) {
      words.push(word)
      continue
    }
    const usage = usageOf.get(word)
    if (usage === undefined) return null
    const key = keyOf(word)
    if (!usage.flags.includes('<')) {
      options[key] = true
      continue
    }
    index += 1
    const value = line[index]
    if (value === undefined || value.startsWith('-')) return null
    options[key] = usage.isRepeated === true ? [...(options[key] as readonly string[]), value] : value
  }
  return { words, options }
}
