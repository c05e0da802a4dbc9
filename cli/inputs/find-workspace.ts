import { existsSync } from 'node:fs'
import { dirname, join, relative } from 'node:path'
import { emptyWorkspace, readWorkspace } from '../../shared/template/read-workspace.ts'
import { rules } from '../../shared/rules/rule-registry.ts'
import type { Workspace } from '../../shared/template/template-model.ts'
import { readText } from './read-text.ts'

const ruleNames = rules.map((rule) => rule.id)

export const workspaceFile = 'foldgauge.yaml'

/** A workspace with the folder it stands in; `null` where a set stands alone. */
export interface FoundWorkspace {
  readonly workspace: Workspace
  readonly folder: string | null
  /** The text of `foldgauge.yaml`, for pushing. */
  readonly text: string | null
}

/** The folder of the nearest `foldgauge.yaml` at or above a folder. */
export function findWorkspaceFolder(from: string): string | null {
  let folder = from
  for (;;) {
    if (existsSync(join(folder, workspaceFile))) return folder
    const above = dirname(folder)
    if (above === folder) return null
    folder = above
  }
}

const found = new Map<string, FoundWorkspace>()

/** The workspace that holds for files in a folder; each is read once. */
export function workspaceAt(folder: string, cwd: string): FoundWorkspace {
  const home = findWorkspaceFolder(folder)
  if (home === null) return { workspace: emptyWorkspace(), folder: null, text: null }
  const file = join(home, workspaceFile)
  const known = found.get(file)
  if (known !== undefined) return known
  const shown = relative(cwd, file) || workspaceFile
  const text = readText(file, shown)
  const made = { workspace: readWorkspace(text, shown, ruleNames), folder: home, text }
  found.set(file, made)
  return made
}

/** Forgets what was read, so that a changed workspace is read again. */
export const forgetWorkspaces = (): void => {
  found.clear()
}
