import { describe, expect, it } from 'vitest'
import { exitOf } from '../../cli/commands/check.ts'
import { worstExit } from '../../cli/exit-code.ts'
import type { Report } from '../../shared/report/report.ts'
import { boxedNotes } from '../support/boxed-notes.ts'
import { checkText } from '../support/check-text.ts'

const passing = checkText(boxedNotes())
const failing = checkText(boxedNotes({ lidWall: 16 }))
const warning: Report = { ...passing, summary: { ...passing.summary, warn: 1, verdict: 'warn' } }
const invalid: Report = { ...passing, summary: { ...passing.summary, verdict: 'invalid' } }
const crashed: Report = { ...passing, summary: { ...passing.summary, crashed: 1 } }

describe('exit codes', () => {
  it.each([
    ['nothing failed', [passing], 'fail', 0],
    ['a warning', [passing, warning], 'fail', 0],
    ['a warning that counts', [passing, warning], 'warn', 1],
    ['a failure', [passing, failing], 'fail', 1],
    ['a failure and an invalid set', [failing, invalid], 'fail', 2],
    ['a crashed rule, whatever else', [failing, invalid, crashed], 'fail', 70],
  ] as const)('%s', (_name, reports, failOn, code) => {
    expect(exitOf(reports, failOn)).toBe(code)
  })

  it('of several at once the worst counts: a defect, unusable input, a failed push, a failed check', () => {
    expect(worstExit([1, 3])).toBe(3)
    expect(worstExit([1, 3, 2])).toBe(2)
    expect(worstExit([1, 3, 2, 70])).toBe(70)
    expect(worstExit([])).toBe(0)
  })
})
