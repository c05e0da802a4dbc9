import { formatNumber } from '../edition.ts'
import type { Path, ReportProblem } from '../pieces/reading/report-problem.ts'
import { createValueReader, type ValueReader } from '../pieces/reading/value-reader.ts'
import { builtInSize } from '../stock/built-in-sizes.ts'
import { sheetByName } from '../stock/sheets.ts'
import { checkContainment } from './check-containment.ts'
import { completeWraps } from './complete-wraps.ts'
import { createProblemList } from './problem-list.ts'
import { isRawMap } from './raw-value.ts'
import { readFits } from './read-fits.ts'
import { readFrame } from './read-frame.ts'
import { checkName } from './read-names.ts'
import { readPieces } from './read-pieces.ts'
import { readSheet, type Sheet } from './read-sheet.ts'
import { readTokens } from './read-tokens.ts'
import { readWaivers } from './read-waivers.ts'
import { checkFormat, reportIn } from './read-workspace.ts'
import { readYaml, type SourceTree } from './read-yaml.ts'
import { setGroups, setKeys } from './set-shape.ts'
import type { NamedSize, SetReading, Tokens, Workspace } from './template-model.ts'

const groups = ['pieces', ...Object.keys(setGroups), 'waivers']

/** Keys that only a workspace has: their place is said, where "unknown" would puzzle. */
const workspaceOnly = ['sets', 'families']

function refuseWorkspaceKeys(tree: SourceTree, report: ReportProblem): void {
  for (const key of workspaceOnly) {
    if (!tree.isWritten([key])) continue
    report(
      [key],
      'unknown-key',
      `“${key}” has no place in a set.`,
      'Write it in “foldgauge.yaml”, the file of the workspace.',
      'key',
    )
  }
}

function requireKeys(tree: SourceTree, workspace: Workspace, report: ReportProblem): void {
  const needed = [
    { key: 'set', hint: 'Write “set” with its name, such as “set: orchard-notes”.' },
    { key: 'pieces', hint: 'Write “pieces” with a map of names and pieces.' },
  ]
  for (const { key, hint } of needed) {
    if (!tree.isWritten([key])) report([key], 'missing-key', `A set needs “${key}”.`, hint, 'key')
  }
  if (isRawMap(tree.data.pieces) && Object.keys(tree.data.pieces).length === 0) {
    report(['pieces'], 'empty-value', 'The set has no pieces.', 'Write at least one piece below “pieces”.', 'key')
  }
  if (workspace.file === null && !tree.isWritten(['foldgauge'])) {
    report(
      ['foldgauge'],
      'missing-key',
      'A set that stands alone needs “foldgauge”, the version of its format.',
      `Write “foldgauge: ${String(formatNumber)}” in its first line, or put the set below a folder with “foldgauge.yaml”.`,
      'key',
    )
  }
}

/** What blanks are cut from where a set does not say: the common sheet of its unit. */
function usualSheet(tokens: Tokens): Sheet {
  const name = tokens.units === 'mm' ? 'a4' : 'letter'
  return { ...(sheetByName(name) ?? { length: NaN, width: NaN }), name }
}

/** Sizes a family keeps to; those built in need no entry under `sizes`. */
function familySizesOf(family: string | undefined, workspace: Workspace): ReadonlyMap<string, NamedSize> {
  const names = family === undefined ? [] : (workspace.families.get(family)?.sizes ?? [])
  return new Map(
    names.flatMap((name) => {
      const size = workspace.tokens.sizes.get(name) ?? builtInSize(name)
      return size === null ? [] : [[name, size] as const]
    }),
  )
}

function checkFamily(
  family: string | undefined,
  workspace: Workspace,
  read: ValueReader,
  nearest: (word: string, names: Iterable<string>) => string | null,
): void {
  if (family === undefined || workspace.families.has(family)) return
  const meant = nearest(family, workspace.families.keys())
  read.report(
    ['family'],
    'unknown-family',
    `There is no family called “${family}”.`,
    meant === null ? 'Add it under “families” in “foldgauge.yaml”.' : `Did you mean “${meant}”?`,
    'value',
  )
}

/**
 * Reads a set: its text, the tokens that hold for it, its pieces and fits.
 * @param file path it is reported under
 * @param workspace tokens that hold where the set says nothing; its own `problems` are not repeated
 * @param knownRules identities of all rules, to find misspelt ones; only their form is looked at without
 * @returns the set, or every problem found; never throws, whatever the text
 */
export function readSet(
  text: string,
  file: string,
  workspace: Workspace,
  knownRules: readonly string[] | null = null,
): SetReading {
  const problems = createProblemList()
  const tree = readYaml(text, file, problems)
  if (tree === null) return { set: null, problems: problems.inOrder(), open: [] }
  const report = reportIn(tree, problems)
  const open: Path[] = []

  // Said before what is merely unknown is looked for: of two problems at one place the first is kept.
  refuseWorkspaceKeys(tree, report)
  const frame = readFrame(tree.data, setKeys, groups, 'a set', report)
  requireKeys(tree, workspace, report)
  checkFormat(frame.foldgauge, report)
  if (frame.set !== undefined) checkName(frame.set, ['set'], 'value', report)

  const { tokens, vocabulary } = readTokens(tree.data, frame, workspace.tokens, knownRules, report)
  const read = createValueReader([], vocabulary, report, () => undefined)
  const given = readPieces(tree.data, vocabulary, report, (path) => open.push(path))
  const fits = readFits(tree.data, tokens.clearances, vocabulary, report)
  checkContainment(given, fits, report)
  const pieces = completeWraps(given, fits, report)
  const waivers = readWaivers(tree.data, knownRules, vocabulary, report)
  checkFamily(frame.family, workspace, read, vocabulary.nearest)
  const sheet = frame.sheet === undefined ? usualSheet(tokens) : readSheet(['sheet'], frame.sheet, read)

  if (!problems.isEmpty) return { set: null, problems: problems.inOrder(), open }
  const name = frame.set ?? ''
  return {
    set: {
      file,
      text,
      name,
      title: frame.title ?? name,
      family: frame.family ?? null,
      familySizes: familySizesOf(frame.family, workspace),
      sheet,
      mail: frame.mail ?? null,
      tokens,
      pieces,
      fits,
      waivers,
      steps: frame.steps ?? 'auto',
      placeOf: tree.placeOfKey,
    },
    problems: [],
    open,
  }
}
