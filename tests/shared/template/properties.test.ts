import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { isMap, isScalar, parseDocument, stringify, visit, type Scalar, type YAMLMap } from 'yaml'
import { readSet } from '../../../shared/template/read-set.ts'
import type { Place, TemplateSet, Workspace } from '../../../shared/template/template-model.ts'
import { emptyWorkspace } from '../../../shared/template/read-workspace.ts'
import { exampleText, exampleWorkspace, soundSet } from './support.ts'

const examples: readonly (readonly [string, Workspace])[] = [
  [exampleText('orchard-notes'), exampleWorkspace()],
  [exampleText('every-form'), emptyWorkspace()],
]

const textAt = (text: string, { line, column, endLine, endColumn }: Place): string => {
  const lines = text.split('\n')
  const offset = (row: number, col: number): number =>
    lines.slice(0, row - 1).reduce((sum, one) => sum + one.length + 1, 0) + col - 1
  return text.slice(offset(line, column), offset(endLine, endColumn))
}

/** Everything a set means, in an order of its own. */
const meaning = ({ text: _, placeOf: __, fits, ...rest }: TemplateSet) => ({
  ...rest,
  fits: [...fits].sort((a, b) => a.id.localeCompare(b.id)),
})

type Json = string | readonly Json[] | { readonly [key: string]: Json }

/** The same data with the keys of every map in another order. */
function reordered(data: Json, next: () => number): Json {
  if (typeof data === 'string') return data
  if (Array.isArray(data)) return data.map((item: Json) => reordered(item, next))
  const entries = Object.entries(data).map(([key, value]) => [next(), key, reordered(value, next)] as const)
  return Object.fromEntries(entries.sort((a, b) => a[0] - b[0]).map(([, key, value]) => [key, value]))
}

describe('the order of keys', () => {
  it.each(examples)('changes nothing of what a set means', (text, workspace) => {
    const data = parseDocument(text, { schema: 'failsafe' }).toJS() as Json
    const before = meaning(soundSet(text, workspace))
    fc.assert(
      fc.property(fc.infiniteStream(fc.double({ min: 0, max: 1, noNaN: true })), (numbers) => {
        const shuffled = stringify(
          reordered(data, () => numbers.next().value as number),
          { schema: 'failsafe', lineWidth: 0 },
        )
        expect(meaning(soundSet(shuffled, workspace))).toEqual(before)
      }),
      { numRuns: 40 },
    )
  })
})

describe('the place of a problem', () => {
  it.each(examples)('is that of a key that has no place, wherever it is written', (text, workspace) => {
    const count = (() => {
      let maps = 0
      visit(parseDocument(text), { Map: () => void (maps += 1) })
      return maps
    })()
    fc.assert(
      fc.property(fc.nat(count - 1), fc.nat(9), (which, where) => {
        const document = parseDocument(text)
        const maps: YAMLMap[] = []
        visit(document, { Map: (_, map) => void maps.push(map) })
        const map = maps[which]
        map?.items.splice(where % (map.items.length + 1), 0, document.createPair('zzzz', 'qqqq'))
        const changed = document.toString({ lineWidth: 0 })
        const { set, problems } = readSet(changed, 'trial.yaml', workspace)
        expect(set).toBeNull()
        expect(problems).not.toEqual([])
        for (const { at } of problems) expect(['zzzz', 'qqqq']).toContain(textAt(changed, at))
      }),
      { numRuns: 150 },
    )
  })

  it.each(examples)('is that of a value that means nothing, wherever it is written', (text, workspace) => {
    const scalars = (document: ReturnType<typeof parseDocument>): readonly Scalar[] => {
      const found: Scalar[] = []
      visit(document, { Pair: (_, pair) => void (isScalar(pair.value) && found.push(pair.value)) })
      return found
    }
    const count = scalars(parseDocument(text)).length
    fc.assert(
      fc.property(fc.nat(count - 1), (which) => {
        const document = parseDocument(text)
        const scalar = scalars(document)[which]
        if (scalar !== undefined) scalar.value = '?qq qq?'
        const changed = document.toString({ lineWidth: 0 })
        const { set, problems } = readSet(changed, 'trial.yaml', workspace)
        expect(set === null).toBe(problems.length > 0)
        for (const { at } of problems) expect(textAt(changed, at)).toMatch(/^["']?\?qq qq\?["']?$/)
      }),
      { numRuns: 150 },
    )
  })

  it('of a path that is written is the last key of that path', () => {
    for (const [text, workspace] of examples) {
      const set = soundSet(text, workspace)
      visit(parseDocument(text), {
        Pair: (_, pair, ancestors) => {
          const keys = ancestors.flatMap((node) =>
            'key' in node && isScalar(node.key) ? [String(node.key.value)] : [],
          )
          const isInList = ancestors.some((node) => !isMap(node) && 'items' in node)
          const key = isScalar(pair.key) ? String(pair.key.value) : ''
          if (!isInList) expect(textAt(text, set.placeOf([...keys, key]))).toBe(key)
        },
      })
    }
  })
})
