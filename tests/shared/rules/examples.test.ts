import { describe, expect, it } from 'vitest'
import { checkTemplate } from '../../../shared/check-template.ts'
import type { Report, Verdict } from '../../../shared/report/report.ts'
import { ruleExamples } from '../../../shared/rules/example-registry.ts'
import { exampleOptions, type RuleExample } from '../../../shared/rules/rule.ts'
import { rules } from '../../../shared/rules/rule-registry.ts'
import { emptyWorkspace, readWorkspace } from '../../../shared/template/read-workspace.ts'

const judge = (example: RuleExample): Report =>
  checkTemplate(
    example.set,
    example.workspace === undefined ? emptyWorkspace() : readWorkspace(example.workspace, 'foldgauge.yaml'),
    { file: 'example.yaml', ...exampleOptions },
  )

const verdictOf = (report: Report, rule: string, subject: string): Verdict | undefined =>
  report.verdicts.find((verdict) => verdict.rule === rule && verdict.subject === subject)

/** The last name in a subject that the file writes: an axis is not written, a waiver is pointed at by its place. */
const nameIn = (subject: string): string => subject.split('#')[0]?.split(':')[0] ?? subject

describe('the registry of rules', () => {
  it('names every rule once, family by family, waivers last', () => {
    const ids = rules.map((rule) => rule.id)
    expect(new Set(ids).size).toBe(ids.length)
    const families = ids.map((id) => id.split('/')[0])
    expect([...new Set(families)]).toEqual(['fit', 'stock', 'blank', 'sheet', 'ruler', 'mail', 'set', 'waiver'])
    expect(families).toEqual(families.toSorted((a, b) => families.indexOf(a) - families.indexOf(b)))
  })

  it('has examples for every rule, in the same order', () => {
    expect(ruleExamples.map((examples) => examples.rule)).toEqual(rules.map((rule) => rule.id))
  })

  it.each(rules.map((rule) => [rule.id, rule] as const))(
    'says of %s why it exists, where it comes from and what helps',
    (_, rule) => {
      for (const text of [rule.title, rule.why, rule.origin.source, rule.remedy])
        expect(text.length).toBeGreaterThan(10)
      for (const text of [rule.why, rule.origin.source, rule.remedy]) expect(text).toMatch(/\.$/)
      expect(rule.title).not.toMatch(/\.$/)
    },
  )
})

describe.each(ruleExamples.map((examples) => [examples.rule, examples] as const))('%s', (rule, examples) => {
  it('has an example that passes and one that does not', () => {
    expect(examples.passing.every((example) => example.expect.status === 'pass')).toBe(true)
    expect(examples.failing.every((example) => example.expect.status !== 'pass')).toBe(true)
    expect(Math.min(examples.passing.length, examples.failing.length)).toBeGreaterThan(0)
  })

  it.each([...examples.passing, ...examples.failing].map((example) => [example.title, example] as const))(
    'judges as it should: %s',
    (_, example) => {
      const report = judge(example)
      expect(report.errors).toEqual([])
      expect(report.summary.crashed).toBe(0)
      const verdict = verdictOf(report, rule, example.expect.subject)
      expect(verdict).toBeDefined()
      expect({ status: verdict?.status, line: verdict?.at.line, column: verdict?.at.column }).toEqual({
        status: example.expect.status,
        line: example.expect.line,
        column: example.expect.column,
      })
      const line = example.set.split('\n')[example.expect.line - 1] ?? ''
      expect(line).toContain(nameIn(example.expect.subject) === report.set ? '' : nameIn(example.expect.subject))
    },
  )

  it('says in every message the fact in one or more whole sentences, with no number left unreadable', () => {
    for (const example of [...examples.passing, ...examples.failing]) {
      for (const verdict of judge(example).verdicts) {
        expect(verdict.message).toMatch(/[.?]$/)
        expect(verdict.message).not.toMatch(/NaN|Infinity|undefined|null|\d\.\d{5,}|\.\./)
      }
    }
  })
})
