import { schemaOfFile, type JsonSchema } from './editor-schema.ts'
import { workspaceGroups, workspaceKeys } from './workspace-shape.ts'

/** JSON Schema (draft 7) of `foldgauge.yaml`, with titles, descriptions and examples for editors. */
export const workspaceSchema = (): JsonSchema =>
  schemaOfFile(workspaceKeys, workspaceGroups, ['foldgauge'], {
    title: 'Workspace',
    description: 'The design tokens that all sets below this folder share.',
  })
