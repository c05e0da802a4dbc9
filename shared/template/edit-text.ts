import { isAlias, isCollection, isMap, isNode, isScalar, parseDocument } from 'yaml'

type Path = readonly (string | number)[]

/** Where the value at a path stands in a YAML text; `null` where there is none or where it is only an alias of another. */
function valueRange(text: string, path: Path): readonly [number, number] | null {
  const document = parseDocument(text)
  const node = document.getIn(path, true)
  if (isAlias(node) || !(isScalar(node) || isCollection(node))) return null
  const range = node.range
  return range == null ? null : [range[0], range[1]]
}

/** The value at a path as its author wrote it. */
export function valueTextAt(text: string, path: Path): string | null {
  const range = valueRange(text, path)
  return range === null ? null : text.slice(range[0], range[1])
}

/**
 * The text with the value at a path replaced and everything else, comments and layout too, as it was.
 * @returns `null` where there is no such value, or only an alias of another
 */
export function replaceValueAt(text: string, path: Path, value: string): string | null {
  const range = valueRange(text, path)
  if (range === null) return null
  const old = text.slice(range[0], range[1])
  // A block value ends after its line break, which is not part of what is replaced.
  const tail = /\s*$/.exec(old)?.[0] ?? ''
  return text.slice(0, range[0]) + value + tail + text.slice(range[1])
}

/** One key and its value, as text. */
export type PairText = readonly [key: string, value: string]

/**
 * The text with one pair of a mapping replaced by others, in the mapping's own layout; no pairs take it out.
 * @returns `null` where there is no such pair
 */
export function replacePairAt(text: string, path: Path, pairs: readonly PairText[]): string | null {
  const document = parseDocument(text)
  const map = path.length === 1 ? document.contents : document.getIn(path.slice(0, -1), true)
  if (!isMap(map)) return null
  const index = map.items.findIndex((item) => isScalar(item.key) && item.key.value === path.at(-1))
  const pair = map.items[index]
  if (pair === undefined || !isNode(pair.key) || pair.key.range == null) return null
  const start = pair.key.range[0]
  const valueEnd = isNode(pair.value) && pair.value.range != null ? pair.value.range[1] : pair.key.range[1]
  const end = start + text.slice(start, valueEnd).trimEnd().length
  if (pairs.length > 0) {
    const lineStart = text.lastIndexOf('\n', start - 1) + 1
    const separator = map.flow === true ? ', ' : `\n${' '.repeat(start - lineStart)}`
    return text.slice(0, start) + pairs.map(([key, value]) => `${key}: ${value}`).join(separator) + text.slice(end)
  }
  if (map.flow === true) {
    const after = /^\s*,\s*/.exec(text.slice(end))?.[0].length ?? 0
    if (after > 0) return text.slice(0, start) + text.slice(end + after)
    const before = /,\s*$/.exec(text.slice(0, start))?.[0].length ?? 0
    return text.slice(0, start - before) + text.slice(end)
  }
  const lineStart = text.lastIndexOf('\n', start - 1) + 1
  const lineEnd = text.indexOf('\n', end)
  return text.slice(0, lineStart) + (lineEnd === -1 ? '' : text.slice(lineEnd + 1))
}
