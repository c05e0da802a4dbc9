import type { CommandModule } from './command-module.ts'

export interface CommandEntry {
  readonly name: string
  readonly summary: string
  load(): Promise<CommandModule>
}

/** Every command; its code is loaded only when it is called. A new command is a file and a line here. */
export const commandEntries: readonly CommandEntry[] = [
  { name: 'check', summary: 'judge template sets', load: async () => (await import('./check.ts')).checkCommand },
]
