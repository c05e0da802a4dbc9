import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { Command } from 'commander'
import { checkCommand } from '../../../cli/commands/check.ts'

const parsed = (line: readonly string[]): { words: readonly string[]; options: unknown } => {
  const command = new Command().exitOverride()
  checkCommand.define(command)
  command.parse([...line], { from: 'user' })
  return { words: command.args, options: command.opts() }
}

const words = fc.constantFrom(
  'sets/notes.yaml',
  '-',
  '--report',
  'json',
  'text=out.txt',
  '--single',
  '--fail-on',
  'warn',
  '--as-of',
  '2026-12-01',
  '--fixes',
  '--scale=97%',
  '--nothing',
  '--',
  '-h',
)

describe('words read without a parser', () => {
  it('come out as the parser hands them over', () => {
    fc.assert(
      fc.property(fc.array(words, { maxLength: 8 }), (line) => {
        const plain = checkCommand.readPlainly?.(line) ?? null
        if (plain !== null) expect(plain).toEqual(parsed(line))
      }),
    )
  })

  it.each([[['--scale=97%']], [['--nothing']], [['--report']], [['--help']], [['--', 'notes.yaml']]])(
    'are left to the parser where they are not plain: %s',
    (line) => {
      expect(checkCommand.readPlainly?.(line)).toBeNull()
    },
  )

  it('are read for the lines people write', () => {
    expect(
      checkCommand.readPlainly?.([
        'sets/notes.yaml',
        '--report',
        'json',
        '--report',
        'junit=r.xml',
        '--as-of',
        '2026-12-01',
      ]),
    ).toEqual({
      words: ['sets/notes.yaml'],
      options: { report: ['json', 'junit=r.xml'], failOn: 'fail', asOf: '2026-12-01' },
    })
  })
})
