import { describe, expect, it } from 'vitest'
import { readSet } from '../../../../shared/template/read-set.ts'
import { emptyWorkspace, readWorkspace } from '../../../../shared/template/read-workspace.ts'
import type { Problem } from '../../../../shared/template/template-model.ts'
import type { MalformedCase } from './malformed-case.ts'
import { malformedKeys } from './malformed-keys.ts'
import { malformedLengths } from './malformed-lengths.ts'
import { malformedMeaning } from './malformed-meaning.ts'
import { malformedYaml } from './malformed-yaml.ts'

const all = [...malformedYaml, ...malformedLengths, ...malformedKeys, ...malformedMeaning]

const placeOf = (text: string): string => {
  const lines = text.split('\n')
  return `${String(lines.length)}:${String((lines.at(-1) ?? '').length + 1)}`
}

/** The text without its marks, and the places they stood at as `line:column-line:column`. */
function unmark(marked: string): { readonly text: string; readonly places: readonly string[] } {
  let text = ''
  let start = ''
  const places: string[] = []
  for (const part of marked.split(/([«»])/)) {
    if (part === '«') start = placeOf(text)
    else if (part === '»') places.push(`${start}-${placeOf(text)}`)
    else text += part
  }
  return { text, places }
}

const problemsOf = (text: string, as: MalformedCase['as']): readonly Problem[] =>
  as === 'workspace'
    ? readWorkspace(text, 'trial.yaml').problems
    : readSet(text, 'trial.yaml', emptyWorkspace()).problems

const written = ({ at }: Problem): string =>
  `${String(at.line)}:${String(at.column)}-${String(at.endLine)}:${String(at.endColumn)}`

/** Words of the parser and of the program, which no author should meet. */
const insideWords =
  /\b(undefined|NaN|null|token|scalar|implicit|invalid|expected|received|union|object|array|string|boolean|zod|parse\w*|regex)\b/i

describe('a malformed template', () => {
  it('is tried in at least a hundred ways, each named once', () => {
    expect(all.length).toBeGreaterThanOrEqual(100)
    expect(new Set(all.map(({ says }) => says)).size).toBe(all.length)
  })

  it.each(all.map((one) => [one.says, one] as const))(
    'is refused at the place of %s',
    (_says, { text: marked, codes, words = [], as }) => {
      const { text, places } = unmark(marked)
      const problems = problemsOf(text, as)
      expect(problems.map((problem) => `${problem.code} ${written(problem)}`)).toEqual(
        codes.map((code, index) => `${code} ${places[index] ?? 'nowhere'}`),
      )
      const said = problems.map(({ message, hint }) => `${message} ${hint}`).join(' ')
      for (const word of words) expect(said).toContain(word)
    },
  )

  it.each(all.map((one) => [one.says, one] as const))(
    'says in plain sentences what to do about %s',
    (_says, { text, as }) => {
      for (const { message, hint } of problemsOf(unmark(text).text, as)) {
        for (const sentence of [message, hint]) {
          expect(sentence).toMatch(/^[A-Z“0-9].*[.!?]”?$/su)
          expect(sentence.length).toBeLessThan(450)
          expect(sentence.replace(/“[^”]*”/g, '')).not.toMatch(insideWords)
          expect(sentence).not.toContain('`')
        }
      }
    },
  )
})
