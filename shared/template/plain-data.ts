import {
  isAlias,
  isMap,
  isScalar,
  isSeq,
  type Alias,
  type Pair,
  type ParsedNode,
  type Scalar,
  type YAMLMap,
  type YAMLSeq,
} from 'yaml'
import type { Path } from '../pieces/reading/report-problem.ts'
import type { RawMap, RawValue } from './raw-value.ts'

/** Deeper than any template needs, and shallow enough that nothing runs out of stack. */
const deepest = 24
/** Values in a file once its aliases are filled in: some twenty times the largest set in use. */
const mostValues = 20_000

export type TreeNode = ParsedNode | Scalar | YAMLMap | YAMLSeq | Alias

export interface PlainData {
  readonly root: RawValue
  /** What each alias stands for. */
  readonly aliasTargets: ReadonlyMap<Alias, TreeNode>
  /** Maps that are not what their author meant; nothing more is said about what is in them. */
  readonly damaged: readonly Path[]
}

export type ReportAt = (
  code: string,
  message: string,
  hint: string,
  range: readonly [number, number],
  path: Path,
) => void

export const rangeOf = (node: TreeNode): readonly [number, number] => {
  const range = node.range
  return range ? [range[0], range[1]] : [0, 0]
}

const emptyWords = new Set(['', '~', 'null', 'Null', 'NULL'])
const trueWords = new Set(['true', 'True', 'TRUE'])
const falseWords = new Set(['false', 'False', 'FALSE'])

function plainScalar(node: Scalar): string | boolean | null {
  const text = String(node.value)
  if (node.type !== 'PLAIN') return text
  if (emptyWords.has(text)) return null
  if (trueWords.has(text)) return true
  return falseWords.has(text) ? false : text
}

const isPlain = (node: TreeNode): node is Scalar => isScalar(node) && node.type === 'PLAIN'

/** Whether a node is written at all: `{ a }` and `a:` have empty ones. */
function isEmpty(node: TreeNode | null): boolean {
  return node === null || (isPlain(node) && node.value === '' && rangeOf(node)[0] === rangeOf(node)[1])
}

/**
 * Turns the parsed nodes of a file into plain data, filling aliases in and refusing what a template has no use for.
 * @param text the file's text, to see whether a comma is a decimal one
 */
export function toPlainData(contents: TreeNode, text: string, report: ReportAt): PlainData {
  const anchors = new Map<string, TreeNode>()
  const open = new Set<TreeNode>()
  const aliasTargets = new Map<Alias, TreeNode>()
  const damaged: Path[] = []
  let values = 0
  let isTooMuch = false

  function refuseTag(node: TreeNode, path: Path): void {
    const tag = isAlias(node) ? undefined : node.tag
    if (tag === undefined || tag === 'tag:yaml.org,2002:str') return
    const shown = tag.replace('tag:yaml.org,2002:', '!!')
    const start = text.lastIndexOf(shown, rangeOf(node)[0])
    const range = start === -1 ? rangeOf(node) : ([start, start + shown.length] as const)
    report('yaml-tag', `“${shown}” is a tag, which a template has no use for.`, 'Take the tag out.', range, path)
  }

  function ofAlias(node: Alias, path: Path, depth: number): RawValue {
    const target = anchors.get(node.source)
    if (target === undefined || open.has(target)) {
      report(
        'yaml-alias',
        target === undefined
          ? `“*${node.source}” stands for nothing.`
          : `“*${node.source}” stands inside what it stands for.`,
        target === undefined
          ? `Write “&${node.source}” before a value further up in this file.`
          : 'Write the value out.',
        rangeOf(node),
        path,
      )
      damaged.push(path)
      return null
    }
    aliasTargets.set(node, target)
    return valueOf(target, path, depth)
  }

  function keyOf(pair: Pair, path: Path): string | null {
    const key = pair.key as TreeNode | null
    if (key !== null && isScalar(key)) {
      if (key.anchor) anchors.set(key.anchor, key)
      if (!isEmpty(key)) return String(key.value)
    }
    report(
      'bad-key',
      'A key is missing, or is not a word.',
      'Write the name, a colon and a space before the value.',
      key === null ? [0, 0] : rangeOf(key),
      path,
    )
    damaged.push(path)
    return null
  }

  /** True where the key is no key but something YAML made of what its author meant; says so. */
  function isMistakenKey(map: YAMLMap, index: number, key: string, path: Path): boolean {
    const pair = map.items[index] as Pair | undefined
    const node = pair?.key as TreeNode
    if (!isPlain(node)) return false
    if (key === '<<') {
      report(
        'yaml-merge-key',
        'Merge keys (“<<”) are not read.',
        'Write the entries out, or give each value an alias of its own.',
        rangeOf(node),
        [...path, key],
      )
      return true
    }
    if (!isEmpty((pair?.value ?? null) as TreeNode | null)) return false
    const range = rangeOf(node)
    if (/^\d/.test(key) && map.flow) {
      const before = map.items[index - 1] as Pair | undefined
      const value = (before?.value ?? null) as TreeNode | null
      const isOneNumber = value !== null && isPlain(value) && text.slice(rangeOf(value)[1], range[0]) === ','
      const from = isOneNumber ? rangeOf(value)[0] : range[0]
      const shown = text.slice(from, range[1])
      const owner = isOneNumber && isScalar(before?.key) ? [...path, String(before.key.value)] : [...path, key]
      report(
        'yaml-decimal-comma',
        isOneNumber
          ? `“${shown}” is written with a decimal comma.`
          : `“${shown}” stands here as a name without a value.`,
        isOneNumber
          ? `Write a point: “${shown.replace(',', '.')}”.`
          : 'Write decimals with a point, as in “0.5”, and put a value that holds a comma in quotes.',
        [from, range[1]],
        owner,
      )
      return true
    }
    if (/^[a-z-]+:\S/.test(key)) {
      report(
        'yaml-colon',
        `There is no space after the colon of “${key}”.`,
        `Write “${key.replace(':', ': ')}”.`,
        range,
        [...path, key],
      )
      return true
    }
    return false
  }

  function ofMap(node: YAMLMap, path: Path, depth: number): RawMap {
    const entries: Record<string, RawValue> = Object.create(null) as Record<string, RawValue>
    node.items.forEach((item, index) => {
      const pair = item as Pair
      const key = keyOf(pair, path)
      if (key === null) return
      if (isMistakenKey(node, index, key, path)) {
        damaged.push(path)
        return
      }
      const inner = [...path, key]
      const value = pair.value as TreeNode | null
      const read = value === null ? null : valueOf(value, inner, depth + 1)
      if (Object.hasOwn(entries, key)) {
        const group = path[path.length - 1]
        report(
          'duplicate-key',
          `“${key}” is written twice${typeof group === 'string' ? ` in “${group}”` : ''}.`,
          'Take one of the two out, or give it a name of its own.',
          rangeOf(pair.key as TreeNode),
          inner,
        )
      } else entries[key] = read
    })
    return entries
  }

  function valueOf(node: TreeNode, path: Path, depth: number): RawValue {
    values += 1
    if (values > mostValues) {
      if (!isTooMuch) {
        report(
          'too-many-values',
          `The file holds more than ${String(mostValues)} values once its aliases are filled in.`,
          'Split it into several sets, and use aliases sparingly.',
          rangeOf(node),
          path,
        )
      }
      isTooMuch = true
      return null
    }
    if (depth > deepest) {
      report(
        'too-deep',
        'Maps and lists are nested too deep.',
        'A template never needs more than ten levels.',
        rangeOf(node),
        path,
      )
      damaged.push([])
      return null
    }
    if (isAlias(node)) return ofAlias(node, path, depth)
    refuseTag(node, path)
    if (node.anchor) anchors.set(node.anchor, node)
    if (isScalar(node)) return plainScalar(node)
    open.add(node)
    const read = isMap(node)
      ? ofMap(node, path, depth)
      : isSeq(node)
        ? node.items.map((item, index) => valueOf(item as TreeNode, [...path, index], depth + 1))
        : null
    open.delete(node)
    return read
  }

  const root = valueOf(contents, [], 0)
  return { root, aliasTargets, damaged: isTooMuch ? [[]] : damaged }
}
