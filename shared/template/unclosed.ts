import { isMap, isPair, isScalar, isSeq } from 'yaml'
import { rangeOf, type TreeNode } from './plain-data.ts'

/** What ends a value that begins with one of these. */
const closing: Readonly<Record<string, string>> = { '{': '}', '[': ']', '"': '"', "'": "'" }

const deepestSearch = 200

/**
 * The bracket or quotation mark that a file opens and does not close: the parser finds out at the end of what it
 * opened, a reader looks for its beginning.
 * @param offset where the parser noticed
 */
export function findUnclosed(
  root: TreeNode | null,
  code: string,
  text: string,
  offset: number,
): readonly [number, number] | null {
  if (code !== 'yaml-bracket' && code !== 'yaml-quote') return null
  const openers = code === 'yaml-bracket' ? '{[' : '"\''
  let found: number | null = null
  const visit = (node: unknown, depth: number): void => {
    if (depth > deepestSearch) return
    if (isPair(node)) {
      visit(node.key, depth + 1)
      visit(node.value, depth + 1)
      return
    }
    if (!isMap(node) && !isSeq(node) && !isScalar(node)) return
    const [start, end] = rangeOf(node as TreeNode)
    const opener = text.charAt(start)
    const isOpen =
      start < offset && openers.includes(opener) && (end - start < 2 || text.charAt(end - 1) !== closing[opener])
    if (isOpen && start > (found ?? -1)) found = start
    if (!isScalar(node)) for (const item of node.items) visit(item, depth + 1)
  }
  visit(root, 0)
  return found === null ? null : [found, found + 1]
}
