import type { LayerName } from '../drawing/drawing.ts'

/** A file to write: a name without folders, and what goes in. */
export interface ExportedFile {
  readonly name: string
  readonly content: string | Uint8Array
}

/** A name safe in any folder of any system: lower-case letters, digits, points and hyphens. */
export function fileName(...parts: readonly string[]): string {
  const safe = parts
    .filter((part) => part !== '')
    .map((part) =>
      part
        .toLowerCase()
        .replace(/[^a-z0-9.]+/g, '-')
        .replace(/^[-.]+|[-.]+$/g, ''),
    )
    .filter((part) => part !== '')
    .join('-')
  return safe.slice(0, 120) || 'unnamed'
}

/** Layers a machine works with one at a time, each a file of its own where operations are kept apart. */
export const separateLayers: readonly LayerName[] = ['cut', 'valley', 'mountain', 'perforate', 'glue']
