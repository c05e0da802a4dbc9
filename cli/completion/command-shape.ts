import { Command } from 'commander'
import type { CommandEntry } from '../commands/command-registry.ts'

/** An option as shells offer it. */
export interface OptionShape {
  /** With its hyphens: `--report`. */
  readonly name: string
  readonly about: string
  readonly takesValue: boolean
  /** Words its value is one of; none where it is free. */
  readonly values: readonly string[]
}

/** A command as shells offer it, read from its own definition so that it is never out of date. */
export interface CommandShape {
  readonly name: string
  readonly about: string
  readonly options: readonly OptionShape[]
  /** Words its argument is one of; none where files are named. */
  readonly words: readonly string[]
}

/** Values of options and arguments, by `command --option` and `command`. */
export type KnownWords = Readonly<Record<string, readonly string[]>>

/** Loads a command and asks what it takes. */
export async function shapeOf(entry: CommandEntry, known: KnownWords): Promise<CommandShape> {
  const command = new Command(entry.name)
  const module = await entry.load()
  module.define(command)
  const options = command.options.flatMap(({ long, description, required, optional }) =>
    long == null
      ? []
      : [
          {
            name: long,
            about: description,
            takesValue: required || optional,
            values: known[`${entry.name} ${long}`] ?? [],
          },
        ],
  )
  return {
    name: entry.name,
    about: entry.summary,
    options: [...options, { name: '--help', about: 'tell what it takes', takesValue: false, values: [] }],
    words: known[entry.name] ?? [],
  }
}
