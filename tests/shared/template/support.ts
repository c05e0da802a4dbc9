import { readFileSync } from 'node:fs'
import { readSet } from '../../../shared/template/read-set.ts'
import { emptyWorkspace, readWorkspace } from '../../../shared/template/read-workspace.ts'
import type { TemplateSet, Workspace } from '../../../shared/template/template-model.ts'

export const exampleText = (name: 'foldgauge' | 'orchard-notes' | 'every-form'): string =>
  readFileSync(new URL(`./examples/${name}.yaml`, import.meta.url), 'utf8')

export const exampleWorkspace = (): Workspace => readWorkspace(exampleText('foldgauge'), 'foldgauge.yaml')

/** The set a sound text gives; its problems where it is not sound. */
export function soundSet(text: string, workspace: Workspace = emptyWorkspace()): TemplateSet {
  const { set, problems } = readSet(text, 'sets/trial.yaml', workspace)
  if (set === null)
    throw new Error(problems.map(({ message, hint, at }) => `${String(at.line)}: ${message} ${hint}`).join('\n'))
  return set
}

/** A set of one piece, whose keys are given, on a workspace in millimetres. */
export const onePiece = (keys: string): string =>
  `foldgauge: 1\nset: trial\nstocks: { smooth: { caliper: 0.3 mm } }\npieces:\n  piece: { ${keys} }\n`
