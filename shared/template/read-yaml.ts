import { parseDocument, type YAMLError } from 'yaml'
import type { Path } from '../pieces/reading/report-problem.ts'
import { toPlainData, type TreeNode } from './plain-data.ts'
import type { ProblemList } from './problem-list.ts'
import { isRawMap, rawValueAt, type RawMap } from './raw-value.ts'
import { createSourceText, type SourceText } from './source-text.ts'
import type { Place } from './template-model.ts'
import { findInTree } from './tree-places.ts'
import { findUnclosed } from './unclosed.ts'
import { explainYamlError, tabFinding } from './yaml-errors.ts'

/** Longer than any set or workspace; keeps hostile files from taking the parser's time. */
const longestText = 256 * 1024
/** Mistakes of YAML beget others; the first few are the true ones. */
const mostYamlErrors = 5

/** A file as data, with the place of everything in it. */
export interface SourceTree {
  readonly data: RawMap
  readonly damaged: readonly Path[]
  isWritten(path: Path): boolean
  /** Place of the key that names a thing, or of a list's entry. */
  placeOfKey(path: Path): Place
  /** Place of the value, for what is wrong with the value. */
  placeOfValue(path: Path): Place
}

const codeOf = (character: string): string =>
  `U+${(character.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0')}`

/** Characters that no text editor writes: a file in another encoding, or no text at all. */
function findStrayCharacter(source: SourceText, problems: ProblemList): boolean {
  const found = /[\u0000-\u0008\u000B\u000C\u000E-\u001F\u007F\uFFFD\uFFFE\uFFFF]|\r(?!\n)/.exec(source.text)
  if (found === null) return false
  const isReturn = found[0] === '\r'
  problems.report(
    'not-text',
    isReturn
      ? 'A line ends with a carriage return alone.'
      : `The character ${codeOf(found[0])} cannot stand in a template.`,
    isReturn ? 'Save the file with Unix or Windows line ends.' : 'Save the file as plain text in UTF-8.',
    source.placeAt(found.index, found.index + 1, []),
  )
  return true
}

/** Lines that begin with `%` before the first entry; only the one for YAML 1.2 changes nothing. */
function refuseDirectives(source: SourceText, problems: ProblemList): boolean {
  let offset = 0
  for (const line of source.text.split('\n')) {
    const written = line.trimEnd()
    if (written.startsWith('%') && !/^%YAML[ \t]+1\.2$/.test(written)) {
      const isVersion = written.startsWith('%YAML')
      problems.report(
        'yaml-directive',
        isVersion
          ? `“${written}” asks for another version of YAML.`
          : `“${written}” is a directive, which a template has no use for.`,
        isVersion ? 'Take the line out, or write “%YAML 1.2”.' : 'Take the line out.',
        source.placeAt(offset, offset + written.length, []),
      )
      return true
    }
    if (!/^([%#].*)?$/.test(written.trimStart())) return false
    offset += line.length + 1
  }
  return false
}

/** A tab that indents the line of an offset. */
function findTab(text: string, offset: number): number | null {
  const start = text.lastIndexOf('\n', offset - 1) + 1
  const indent = /^[ \t]*/.exec(text.slice(start, offset + 1))?.[0] ?? ''
  const tab = indent.indexOf('\t')
  return tab === -1 ? null : start + tab
}

/** Reports the first mistakes, one a line: what follows on a line is mostly begotten by the first. */
function reportYamlErrors(
  errors: readonly YAMLError[],
  contents: TreeNode | null,
  source: SourceText,
  problems: ProblemList,
): void {
  const worst = errors.filter((error) => error.code === 'RESOURCE_EXHAUSTION').slice(0, 1)
  const lines = new Set<number>()
  for (const error of (worst.length > 0 ? worst : errors).slice(0, mostYamlErrors)) {
    const [start, end] = error.pos
    const tab = error.code === 'BAD_INDENT' ? findTab(source.text, start) : null
    const found =
      tab === null ? explainYamlError(error, source.text.slice(start, start + 200), end - start) : tabFinding
    const [from, to] =
      tab !== null
        ? [tab, tab + 1]
        : (findUnclosed(contents, found.code, source.text, start) ?? [start, Math.max(end, start + 1)])
    // What is shown is the mistaken text on its first line, without the space after it.
    const firstLine = source.text.slice(from, to).split('\n', 1)[0] ?? ''
    const at = source.placeAt(from, from + (firstLine.trimEnd().length || Math.min(firstLine.length, 1)), [])
    if (lines.has(at.line)) continue
    lines.add(at.line)
    problems.report(found.code, found.message, found.hint, at)
  }
}

/** Reads a file's YAML into plain data; `null` where it is not YAML, or no map. Every mistake is reported. */
export function readYaml(text: string, file: string, problems: ProblemList): SourceTree | null {
  const source = createSourceText(text, file)
  if (source.text.length > longestText) {
    problems.report(
      'too-large',
      'The file is longer than 256 KiB.',
      'Split it into several sets.',
      source.placeAt(0, 0, []),
    )
    return null
  }
  if (findStrayCharacter(source, problems) || refuseDirectives(source, problems)) return null
  const document = parseDocument(source.text, {
    version: '1.2',
    schema: 'failsafe',
    uniqueKeys: false,
    merge: false,
    prettyErrors: false,
    logLevel: 'error',
  })
  if (document.errors.length > 0) {
    reportYamlErrors(document.errors, document.contents as TreeNode | null, source, problems)
    return null
  }
  const contents = document.contents as TreeNode | null
  const isEmpty =
    contents === null || (contents.range?.[0] === contents.range?.[1] && contents.range?.[0] !== undefined)
  if (isEmpty) {
    problems.report(
      'empty-file',
      'There is nothing in this file.',
      'Begin with “set:” and the name of the set, or with “foldgauge: 1” for a workspace.',
      source.placeAt(0, 0, []),
    )
    return null
  }
  const plain = toPlainData(contents, source.text, (code, message, hint, range, path) => {
    if (!problems.isFull) problems.report(code, message, hint, source.placeAt(range[0], range[1], path))
  })
  if (!isRawMap(plain.root)) {
    problems.report(
      'not-a-map',
      'The file is not a map of keys and values.',
      'Write entries such as “set: orchard-notes”, each on a line of its own, with a space after the colon.',
      source.placeAt(contents.range?.[0] ?? 0, contents.range?.[1] ?? 0, []),
    )
    return null
  }
  const placeIn = (path: Path, side: 'key' | 'value'): Place => {
    const found = findInTree(contents, plain.aliasTargets, path, side)
    return source.placeAt(found.range[0], found.range[1], path)
  }
  return {
    data: plain.root,
    damaged: plain.damaged,
    isWritten: (path) => rawValueAt(plain.root, path) !== undefined,
    placeOfKey: (path) => placeIn(path, 'key'),
    placeOfValue: (path) => placeIn(path, 'value'),
  }
}
