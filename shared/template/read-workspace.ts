import { formatNumber } from '../edition.ts'
import type { Path, ReportProblem } from '../pieces/reading/report-problem.ts'
import { createValueReader, type Vocabulary } from '../pieces/reading/value-reader.ts'
import { builtInTokens } from './built-in-tokens.ts'
import { checkMap } from './check-shape.ts'
import { createProblemList, type ProblemList } from './problem-list.ts'
import type { RawMap } from './raw-value.ts'
import { readFrame, readNamedGroup } from './read-frame.ts'
import { readTokens } from './read-tokens.ts'
import { readYaml, type SourceTree } from './read-yaml.ts'
import type { Family, Workspace } from './template-model.ts'
import { familySpec, workspaceGroups, workspaceKeys } from './workspace-shape.ts'

/** Where sets are looked for in a workspace that does not say. */
const usualSets = ['sets/*.yaml']

/** The tokens that hold for a set without a workspace. */
export function emptyWorkspace(): Workspace {
  return {
    file: null,
    title: null,
    tokens: builtInTokens(),
    families: new Map(),
    sets: [],
    problems: [],
    placeOf: () => null,
  }
}

/** Reports at places of a tree, and nothing about what is damaged already. */
export function reportIn(tree: SourceTree, problems: ProblemList): ReportProblem {
  const isDamaged = (path: Path): boolean => tree.damaged.some((at) => at.every((step, index) => path[index] === step))
  return (path, code, message, hint, side) => {
    if (!problems.isFull && !isDamaged(path))
      problems.report(code, message, hint, side === 'key' ? tree.placeOfKey(path) : tree.placeOfValue(path))
  }
}

/** Reports a format that this engine does not read. */
export function checkFormat(written: string | undefined, report: ReportProblem): void {
  if (written === undefined || written === String(formatNumber)) return
  report(
    ['foldgauge'],
    'unknown-format',
    `Format “${written.slice(0, 20)}” is not known here.`,
    `Write “foldgauge: ${String(formatNumber)}”.`,
    'value',
  )
}

function readFamilies(data: RawMap, vocabulary: Vocabulary, report: ReportProblem): ReadonlyMap<string, Family> {
  const families = new Map<string, Family>()
  for (const [name, raw] of readNamedGroup(data, 'families', 'families', report)) {
    const written = checkMap(familySpec, raw, ['families', name], 'a family', report)
    if (written === null) continue
    const read = createValueReader(['families', name], vocabulary, report, () => undefined)
    const sizes = written.sizes ?? []
    sizes.forEach((size, index) => read.parse(['sizes', index], size, vocabulary.sizeNamed))
    families.set(name, { name, title: written.title ?? null, mark: written.mark ?? null, sizes })
  }
  return families
}

/**
 * Reads `foldgauge.yaml`.
 * @param file path it is reported under
 * @param knownRules identities of all rules, to find misspelt ones; only their form is looked at without
 * @returns always a workspace; where it has `problems`, sets cannot be judged with it
 */
export function readWorkspace(text: string, file: string, knownRules: readonly string[] | null = null): Workspace {
  const problems = createProblemList()
  const tree = readYaml(text, file, problems)
  if (tree === null) return { ...emptyWorkspace(), file, problems: problems.inOrder() }
  const report = reportIn(tree, problems)
  const groups = Object.keys(workspaceGroups)
  const frame = readFrame(tree.data, workspaceKeys, groups, 'a workspace', report)
  if (frame.foldgauge === undefined && !tree.isWritten(['foldgauge'])) {
    report(
      ['foldgauge'],
      'missing-key',
      'A workspace needs “foldgauge”, the version of its format.',
      `Write “foldgauge: ${String(formatNumber)}” in its first line.`,
      'key',
    )
  }
  checkFormat(frame.foldgauge, report)
  const { tokens, vocabulary } = readTokens(tree.data, frame, builtInTokens(), knownRules, report)
  const families = readFamilies(tree.data, vocabulary, report)
  return {
    file,
    title: frame.title ?? null,
    tokens,
    families,
    sets: frame.sets ?? usualSets,
    problems: problems.inOrder(),
    placeOf: (path) => (tree.isWritten(path) ? tree.placeOfKey(path) : null),
  }
}
