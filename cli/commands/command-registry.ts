import type { CommandModule } from './command-module.ts'

export interface CommandEntry {
  readonly name: string
  readonly summary: string
  load(): Promise<CommandModule>
}

/** Every command; its code is loaded only when it is called. A new command is a file and a line here. */
export const commandEntries: readonly CommandEntry[] = [
  { name: 'check', summary: 'judge template sets', load: async () => (await import('./check.ts')).checkCommand },
  {
    name: 'size',
    summary: 'work out the sizes a set leaves open',
    load: async () => (await import('./size.ts')).sizeCommand,
  },
  {
    name: 'export',
    summary: 'write printable templates, drawings for machines, and the steps',
    load: async () => (await import('./export.ts')).exportCommand,
  },
  {
    name: 'compare',
    summary: 'tell what changed between two sets',
    load: async () => (await import('./compare.ts')).compareCommand,
  },
  {
    name: 'push',
    summary: 'send what was checked to the server of your team',
    load: async () => (await import('./push.ts')).pushCommand,
  },
  {
    name: 'login',
    summary: 'keep a token for a server',
    load: async () => (await import('./login.ts')).loginCommand,
  },
  {
    name: 'explain',
    summary: 'tell why a rule exists and where a figure comes from',
    load: async () => (await import('./explain.ts')).explainCommand,
  },
  {
    name: 'init',
    summary: 'write a whole sized workspace to begin with',
    load: async () => (await import('./init.ts')).initCommand,
  },
  {
    name: 'migrate',
    summary: 'bring templates to the present format',
    load: async () => (await import('./migrate.ts')).migrateCommand,
  },
  {
    name: 'completion',
    summary: 'print a completion script for a shell',
    load: async () => (await import('./completion.ts')).completionCommand,
  },
  {
    name: 'schema',
    summary: 'print a JSON Schema for editors',
    load: async () => (await import('./schema.ts')).schemaCommand,
  },
]
