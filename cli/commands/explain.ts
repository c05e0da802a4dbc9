import { modelDefaults, type ModelDefault } from '../../shared/pieces/model-defaults.ts'
import { languageDefaults } from '../../shared/pieces/language-defaults.ts'
import { ruleLimits } from '../../shared/rules/rule-limits.ts'
import { rules } from '../../shared/rules/rule-registry.ts'
import { nearestName } from '../../shared/units/did-you-mean.ts'
import { exitCode } from '../exit-code.ts'
import { UsageError } from '../io.ts'
import { wrapText } from '../reporters/wrap-text.ts'
import type { CommandModule } from './command-module.ts'

const defaultsTable = (): string =>
  Object.entries({ ...modelDefaults, ...languageDefaults, ...ruleLimits } as Readonly<Record<string, ModelDefault>>)
    .map(([name, { value, unit, origin, what }]) =>
      [`${name}: ${String(value)} ${unit} (${origin})`, ...wrapText(what, 78, '  ')].join('\n'),
    )
    .join('\n')

function list(): string {
  const width = Math.max(...rules.map((rule) => rule.id.length))
  return `${rules.map((rule) => `${rule.id.padEnd(width)}  ${rule.level.padEnd(4)}  ${rule.title}`).join('\n')}\n\nfoldgauge explain RULE tells why a rule exists; foldgauge explain defaults lists every figure of the model.\n`
}

export const explainCommand: CommandModule = {
  define(command) {
    command.argument(
      '[rule]',
      'a rule such as fit/clearance, or `defaults` for every figure of the model and where it comes from',
    )
  },

  async execute(io, words) {
    const [id] = words
    if (id === undefined) {
      io.out(list())
      return exitCode.clean
    }
    if (id === 'defaults') {
      io.out(`${defaultsTable()}\n`)
      return exitCode.clean
    }
    const rule = rules.find((candidate) => candidate.id === id)
    if (rule === undefined) {
      const near = nearestName(id, [...rules.map((candidate) => candidate.id), 'defaults'])
      throw new UsageError(
        `there is no rule “${id}”`,
        near === null ? 'foldgauge explain lists them.' : `Did you mean ${near}?`,
      )
    }
    const { ruleExamples } = await import('../../shared/rules/example-registry.ts')
    const examples = ruleExamples.find((candidate) => candidate.rule === id)
    const block = (title: string, text: string): string => `${title}\n${wrapText(text, 78, '  ').join('\n')}\n`
    io.out(`${rule.id}: ${rule.title}\nLevel: ${rule.level}\n\n`)
    io.out(
      `${block('Why', rule.why)}\n${block(`Origin (${rule.origin.kind})`, rule.origin.source)}\n${block('What usually helps', rule.remedy)}`,
    )
    for (const [word, shown] of [
      ['A set that passes', examples?.passing[0]],
      ['A set that does not', examples?.failing[0]],
    ] as const) {
      if (shown !== undefined) io.out(`\n${word}: ${shown.title}\n${shown.set.trimEnd().replace(/^/gm, '  ')}\n`)
    }
    return exitCode.clean
  },
}
