import { readFileSync, readdirSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { join } from 'node:path'
import { readWorkspace } from '../../shared/template/read-workspace.ts'
import type { Workspace } from '../../shared/template/template-model.ts'

const folder = fileURLToPath(new URL('../../shared/demo/', import.meta.url))

/** The demo workspace's own text. */
export const demoWorkspaceText = (): string => readFileSync(join(folder, 'foldgauge.yaml'), 'utf8')

export const demoWorkspace = (): Workspace => readWorkspace(demoWorkspaceText(), 'foldgauge.yaml')

export interface DemoSet {
  readonly file: string
  readonly text: string
}

/** Sets of a folder of the demo, in the order of their names. */
export const demoSets = (name: 'sets' | 'failing' = 'sets'): readonly DemoSet[] =>
  readdirSync(join(folder, name))
    .filter((file) => file.endsWith('.yaml'))
    .toSorted()
    .map((file) => ({ file: `${name}/${file}`, text: readFileSync(join(folder, name, file), 'utf8') }))
