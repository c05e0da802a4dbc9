import { shapeOfMap } from '../pieces/shape/map-spec.ts'
import { writtenKinds } from '../pieces/shape-registry.ts'
import { schemaOf, schemaOfFile, type JsonSchema } from './editor-schema.ts'
import { namePatternText } from './read-names.ts'
import { setGroups, setKeys, waiverSpec } from './set-shape.ts'

const kinds = Object.entries(writtenKinds)

/** A piece has the shape of its kind: editors choose it by the `kind` that is written, and complain of that one only. */
const pieceSchema: JsonSchema = {
  type: 'object',
  title: 'Piece',
  description: 'One part: what it is made from and how large.',
  required: ['kind'],
  properties: {
    kind: { enum: kinds.map(([kind]) => kind), title: 'Kind of piece', description: 'What kind of piece this is.' },
  },
  allOf: kinds.map(([kind]) => ({
    if: { properties: { kind: { const: kind } }, required: ['kind'] },
    then: { $ref: `#/definitions/${kind}` },
  })),
}

/** JSON Schema (draft 7) of a set, with titles, descriptions and examples for editors. */
export function setSchema(): JsonSchema {
  const frame = schemaOfFile(setKeys, setGroups, ['set'], {
    title: 'Set',
    description: 'The pieces and fits that are published together.',
  })
  return {
    ...frame,
    required: ['set', 'pieces'],
    properties: {
      ...(frame.properties as JsonSchema),
      pieces: {
        type: 'object',
        title: 'Pieces',
        description: 'The pieces, by name.',
        minProperties: 1,
        propertyNames: { pattern: namePatternText },
        additionalProperties: pieceSchema,
      },
      waivers: {
        type: 'array',
        title: 'Waivers',
        description: 'Verdicts that are known and may stand for a time.',
        items: schemaOf(shapeOfMap(waiverSpec)),
      },
    },
    definitions: Object.fromEntries(kinds.map(([kind, { spec }]) => [kind, schemaOf(shapeOfMap(spec))])),
  }
}
