import { isAlias, isCollection, isScalar, parseDocument } from 'yaml'

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
