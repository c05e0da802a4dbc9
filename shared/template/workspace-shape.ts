import { mapSpec, shapeOfMap, type WrittenBy } from '../pieces/shape/map-spec.ts'
import { listShape, nameShape, textShape } from '../pieces/shape/shape-parts.ts'
import { tokenGroups, tokenKeys } from './token-shapes.ts'

export const familySpec = mapSpec(
  {},
  {
    title: () => textShape({ title: 'Title', description: 'What people call the family.', examples: ['Orchard'] }),
    mark: () => textShape({ title: 'Mark', description: 'The mark it is told apart by.', examples: ['pear'] }),
    sizes: () =>
      listShape(nameShape('a size', { description: 'A size that the family keeps to.' }), 'a list of names of sizes', {
        title: 'Sizes',
        description: 'The sizes that its sets keep to.',
        examples: [['note']],
      }),
  },
  'a map of `title`, `mark` and `sizes`',
  { title: 'Family', description: 'Sets that share sizes.' },
)

/** Keys of `foldgauge.yaml` that hold one value each. */
export const workspaceKeys = {
  ...tokenKeys,
  sets: () =>
    listShape(
      textShape({ description: 'Path or pattern of set files.' }),
      'a list of patterns, such as `[ "sets/*.yaml" ]`',
      {
        title: 'Sets',
        description: 'Where the sets are, relative to this file.',
        examples: [['sets/*.yaml']],
      },
    ),
} as const

/** Keys of `foldgauge.yaml` that hold entries by name. */
export const workspaceGroups = {
  ...tokenGroups,
  families: {
    entry: () => shapeOfMap(familySpec),
    words: { title: 'Families', description: 'Families of sets, by name.' },
  },
} as const

export type FamilyWritten = WrittenBy<typeof familySpec>
