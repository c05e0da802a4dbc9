import { Ajv, type ValidateFunction } from 'ajv'
import { describe, expect, it } from 'vitest'
import { parse } from 'yaml'
import { writtenKinds } from '../../../shared/pieces/shape-registry.ts'
import { setSchema } from '../../../shared/template/set-schema.ts'
import { workspaceSchema } from '../../../shared/template/workspace-schema.ts'
import { exampleText } from './support.ts'

const compile = (schema: object): ValidateFunction =>
  new Ajv({ allErrors: true, allowUnionTypes: true, strict: true, strictRequired: false, strictTypes: false }).compile(
    schema,
  )

const set = compile(setSchema())
const workspace = compile(workspaceSchema())

/** An editor reads numbers as numbers. */
const asEditorsRead = (text: string): unknown => parse(text, { version: '1.2' }) as unknown

const errorsOf = (validate: ValidateFunction, data: unknown): readonly string[] => {
  validate(data)
  return (validate.errors ?? []).map(({ instancePath, message }) => `${instancePath} ${message ?? ''}`)
}

interface Node {
  readonly properties?: Readonly<Record<string, Node>>
  readonly items?: Node | readonly Node[]
  readonly anyOf?: readonly Node[]
  readonly additionalProperties?: Node | boolean
  readonly definitions?: Readonly<Record<string, Node>>
  readonly description?: string
  readonly title?: string
}

/** Every key that an editor can complete, with its path. */
function keysOf(node: Node, path = ''): readonly (readonly [string, Node])[] {
  const inner = [...(node.anyOf ?? []), ...(node.items === undefined ? [] : [node.items].flat())] as readonly Node[]
  const own = Object.entries(node.properties ?? {}).flatMap(([key, value]) => [
    [`${path}.${key}`, value] as const,
    ...keysOf(value, `${path}.${key}`),
  ])
  const named = typeof node.additionalProperties === 'object' ? keysOf(node.additionalProperties, `${path}.*`) : []
  const defined = Object.entries(node.definitions ?? {}).flatMap(([name, value]) => keysOf(value, name))
  return [...own, ...named, ...defined, ...inner.flatMap((one) => keysOf(one, path))]
}

describe('the schema of a set', () => {
  it.each(['orchard-notes', 'every-form'] as const)('accepts %s as an editor reads it', (name) => {
    expect(errorsOf(set, asEditorsRead(exampleText(name)))).toEqual([])
  })

  it('says draft 7, which editors know', () => {
    expect(setSchema()).toMatchObject({
      $schema: 'http://json-schema.org/draft-07/schema#',
      required: ['set', 'pieces'],
      additionalProperties: false,
    })
  })

  it('has a definition for every kind of piece', () => {
    expect(Object.keys((setSchema() as { definitions: object }).definitions)).toEqual(Object.keys(writtenKinds))
  })

  it('complains of the kind that is written, and of that one only', () => {
    const data = { set: 'trial', pieces: { lid: { kind: 'lid', stock: 'smooth', wal: 14 } } }
    expect(errorsOf(set, data)).toEqual([
      '/pieces/lid must NOT have additional properties',
      '/pieces/lid must match "then" schema',
    ])
  })

  it.each([
    ['an unknown kind', { set: 'trial', pieces: { p: { kind: 'tin' } } }],
    ['a name in capitals', { set: 'trial', pieces: { Card: { kind: 'insert', stock: 's', size: '3 x 2' } } }],
    [
      'a name that is too long',
      { set: 'trial', pieces: { ['a'.repeat(61)]: { kind: 'insert', stock: 's', size: '3 x 2' } } },
    ],
    ['no pieces', { set: 'trial', pieces: {} }],
    ['a length that is true', { set: 'trial', pieces: { p: { kind: 'box', stock: 's', blank: '3 x 2', wall: true } } }],
    [
      'a waiver without a reason',
      {
        set: 'trial',
        pieces: { p: { kind: 'bought', outside: '3 x 2' } },
        waivers: [{ rule: 'a/b', until: '2027-01-01' }],
      },
    ],
  ])('refuses %s', (_says, data) => {
    expect(errorsOf(set, data)).not.toEqual([])
  })
})

describe('the schema of a workspace', () => {
  it('accepts the example as an editor reads it', () => {
    expect(errorsOf(workspace, asEditorsRead(exampleText('foldgauge')))).toEqual([])
  })

  it('needs the format and knows no pieces', () => {
    expect(errorsOf(workspace, { title: 'Quillfern' })).toEqual([" must have required property 'foldgauge'"])
    expect(errorsOf(workspace, { foldgauge: 1, pieces: {} })).toEqual([' must NOT have additional properties'])
  })

  it('takes names of rules where names of rules belong', () => {
    expect(errorsOf(workspace, { foldgauge: 1, checks: { 'mail/ratio': 'off' } })).toEqual([])
    expect(errorsOf(workspace, { foldgauge: 1, checks: { ratio: 'off' } })).not.toEqual([])
  })
})

describe('what an editor shows', () => {
  it.each([
    ['a set', setSchema() as Node],
    ['a workspace', workspaceSchema() as Node],
  ])('is a title and a description for every key of %s', (_says, schema) => {
    const keys = keysOf(schema)
    expect(keys.length).toBeGreaterThan(30)
    expect(keys.filter(([, { title, description }]) => !title || !description).map(([path]) => path)).toEqual([])
  })
})
