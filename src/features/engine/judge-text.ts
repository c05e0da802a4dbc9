import { checkTemplate } from '../../../shared/check-template.ts'
import { judgeSet } from '../../../shared/assembly/judge-set.ts'
import type { CheckOptions } from '../../../shared/check-options.ts'
import type { Blank } from '../../../shared/pieces/blank.ts'
import type { Report } from '../../../shared/report/report.ts'
import { drawnBlanks } from '../../../shared/rules/drawn-blanks.ts'
import { rules } from '../../../shared/rules/rule-registry.ts'
import { readSet } from '../../../shared/template/read-set.ts'
import { emptyWorkspace, readWorkspace } from '../../../shared/template/read-workspace.ts'
import type { Workspace } from '../../../shared/template/template-model.ts'

/** The workspace as text; null for a set that stands alone. */
export interface WorkspaceText {
  readonly file: string
  readonly text: string
}

let last: { readonly text: string; readonly read: Workspace } | null = null

/** While somebody types in a set its workspace stays the same: it is read once. */
export function workspaceOf(given: WorkspaceText | null): Workspace {
  if (given === null) return emptyWorkspace()
  if (last?.text !== given.text) last = { text: given.text, read: readWorkspace(given.text, given.file, ruleNames) }
  return last.read
}

const ruleNames = rules.map(({ id }) => id)

/** Judges a text here, with the very engine of the command line and the server. */
export const judgeText = (text: string, workspace: WorkspaceText | null, options: CheckOptions): Report =>
  checkTemplate(text, workspaceOf(workspace), options)

/** Papers and makers that a set may be judged with. */
export interface Choices {
  readonly papers: readonly string[]
  readonly makers: readonly string[]
  readonly workmanship: string
}

export function choicesOf(text: string, workspace: WorkspaceText | null, file: string): Choices {
  const read = workspaceOf(workspace)
  const tokens = readSet(text, file, read, ruleNames).set?.tokens ?? read.tokens
  return { papers: [...tokens.stocks.keys()], makers: [...tokens.makers.keys()], workmanship: tokens.workmanship }
}

/** The flat sheets of every piece, drawn by the present engine; none where the text is not understood. */
export function blanksOf(
  text: string,
  workspace: WorkspaceText | null,
  options: CheckOptions,
): ReadonlyMap<string, readonly Blank[]> {
  const { set } = readSet(text, options.file, workspaceOf(workspace), ruleNames)
  if (set === null) return new Map()
  try {
    return drawnBlanks(judgeSet(set, options))
  } catch {
    // A piece that cannot be folded has no sheet; the report says why.
    return new Map()
  }
}
