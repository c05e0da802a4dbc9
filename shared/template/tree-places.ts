import { isAlias, isMap, isScalar, isSeq, type Alias, type Pair } from 'yaml'
import { rangeOf, type TreeNode } from './plain-data.ts'
import type { Path } from '../pieces/reading/report-problem.ts'

/** Offsets of a thing in the text, and how much of the path leads to something that is written. */
export interface Found {
  readonly range: readonly [number, number]
  /** Whole where the thing itself is written; else the path of what encloses it. */
  readonly path: Path
}

/** The first key of the file stands for the whole. */
function startOf(root: TreeNode): readonly [number, number] {
  const first = isMap(root) ? (root.items[0]?.key as TreeNode | null | undefined) : null
  return first ? rangeOf(first) : [rangeOf(root)[0], rangeOf(root)[0]]
}

/**
 * Where the thing at a path is written: its key (or the entry of a list), or its value. What is not written is placed
 * at the nearest thing that encloses it; what lies behind an alias at the alias.
 */
export function findInTree(
  root: TreeNode,
  aliasTargets: ReadonlyMap<Alias, TreeNode>,
  path: Path,
  side: 'key' | 'value',
): Found {
  let node: TreeNode | null = root
  let range = startOf(root)
  let isBehindAlias = false
  for (const [index, step] of path.entries()) {
    while (node !== null && isAlias(node)) {
      isBehindAlias = true
      node = aliasTargets.get(node) ?? null
    }
    let next: TreeNode | null = null
    let key: TreeNode | null = null
    if (isMap(node)) {
      const pair = node.items.find((item) => isScalar(item.key) && String(item.key.value) === String(step)) as
        Pair | undefined
      key = (pair?.key ?? null) as TreeNode | null
      next = (pair?.value ?? null) as TreeNode | null
    } else if (isSeq(node) && typeof step === 'number') {
      next = (node.items[step] ?? null) as TreeNode | null
    }
    if (key === null && next === null) return { range, path: path.slice(0, index) }
    if (!isBehindAlias) {
      const isWritten = next !== null && rangeOf(next)[1] > rangeOf(next)[0]
      const wanted = key === null || (side === 'value' && index === path.length - 1 && isWritten) ? next : key
      range = rangeOf(wanted ?? root)
    }
    node = next
  }
  return { range, path }
}
