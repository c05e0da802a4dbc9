import { describe, expect, it } from 'vitest'
import { readSet } from '../../../shared/template/read-set.ts'
import { emptyWorkspace, readWorkspace } from '../../../shared/template/read-workspace.ts'
import type { Place } from '../../../shared/template/template-model.ts'
import { exampleText, exampleWorkspace, onePiece, soundSet } from './support.ts'

const range = ({ line, column, endLine, endColumn }: Place): string =>
  `${String(line)}:${String(column)}-${String(endLine)}:${String(endColumn)}`

describe('the place of a thing in a set', () => {
  const set = soundSet(exampleText('orchard-notes'), exampleWorkspace())

  it('is the key that names it, counted from one', () => {
    expect(set.placeOf(['fits', 'lid-on-base'])).toEqual({
      file: 'sets/trial.yaml',
      line: 15,
      column: 3,
      endLine: 15,
      endColumn: 14,
      path: ['fits', 'lid-on-base'],
    })
    expect(range(set.placeOf(['pieces', 'base', 'wall']))).toBe('9:63-9:67')
    expect(range(set.placeOf(['pieces', 'base', 'tabs', 'at']))).toBe('9:81-9:83')
  })

  it('is the whole entry of a list', () => {
    const place = set.placeOf(['waivers', 0])
    expect(range(place)).toBe('18:5-18:111')
  })

  it('is the nearest thing that encloses what is not written', () => {
    expect(range(set.placeOf(['pieces', 'base', 'corner']))).toBe('9:3-9:7')
    expect(range(set.placeOf(['pieces', 'drawer', 'wall']))).toBe('6:1-6:7')
    expect(range(set.placeOf(['fits', 'lid-on-base', 'clearance', 'sides', 3]))).toBe('15:45-15:54')
    expect(range(set.placeOf(['nothing', 'of', 'the', 'kind']))).toBe('1:1-1:4')
    expect(range(set.placeOf([]))).toBe('1:1-1:4')
  })

  it('keeps the path that was asked for', () => {
    expect(set.placeOf(['pieces', 'base', 'corner']).path).toEqual(['pieces', 'base', 'corner'])
  })
})

describe('columns', () => {
  const problemAt = (text: string): string =>
    readSet(text, 'trial.yaml', emptyWorkspace())
      .problems.map(({ at }) => range(at))
      .join(' ')
  const wrongWall = (before: string): string =>
    `foldgauge: 1\nset: trial\nstocks: { smooth: { caliper: 0.3 } }\npieces: { p: { ${before}kind: box, stock: smooth, blank: 200 x 158, wall: 0 } }\n`

  it('count UTF-16 units, so a character beyond the first plane is two', () => {
    expect(problemAt(wrongWall('note: "a", '))).toBe('4:77-4:78')
    expect(problemAt(wrongWall('note: "🍐", '))).toBe('4:78-4:79')
    expect(problemAt(wrongWall('note: "é", '))).toBe('4:77-4:78')
  })

  it('do not count a byte order mark', () => {
    expect(problemAt(`\uFEFF${wrongWall('note: "a", ')}`)).toBe('4:77-4:78')
    expect(problemAt('\uFEFFfoldgauge: 2\nset: trial\npieces: { p: { kind: bought, outside: 3 x 2 } }\n')).toBe(
      '1:12-1:13',
    )
  })

  it('are the same with Windows line ends', () => {
    expect(problemAt(wrongWall('note: "a", ').replaceAll('\n', '\r\n'))).toBe('4:77-4:78')
  })
})

describe('an alias', () => {
  const text = (wall: string): string =>
    `foldgauge: 1\nset: trial\nstocks: { smooth: { caliper: 0.3 } }\npieces:\n  base: { kind: box, stock: smooth, blank: 200 x 158, wall: &wall ${wall} }\n  lid: { kind: lid, stock: smooth, blank: 190 x 149, wall: *wall }\n`

  it('stands for what it names', () => {
    const set = soundSet(text('{ length: 20, width: 22 }'))
    expect(set.pieces.get('lid')).toMatchObject({ by: { wall: { length: [20, 20], width: [22, 22] } } })
  })

  it('is positioned where it is used', () => {
    const set = soundSet(text('20'))
    expect(range(set.placeOf(['pieces', 'lid', 'wall']))).toBe('6:54-6:58')
    const { problems } = readSet(text('0'), 'trial.yaml', emptyWorkspace())
    expect(problems.map(({ code, at }) => `${code} ${range(at)}`)).toEqual([
      'length-zero 5:67-5:68',
      'length-zero 6:60-6:65',
    ])
  })

  it('is where a mistake inside what it stands for is shown too', () => {
    const { problems } = readSet(text('{ length: 20, width: 0 }'), 'trial.yaml', emptyWorkspace())
    expect(problems.map(({ at }) => range(at))).toEqual(['5:88-5:89', '6:54-6:58'])
  })
})

describe('a workspace', () => {
  it('tells where each token is written, and nothing of those built in', () => {
    const workspace = exampleWorkspace()
    expect(workspace.placeOf(['stocks', 'smooth-270'])).toMatchObject({
      file: 'foldgauge.yaml',
      line: 6,
      column: 3,
      endColumn: 13,
    })
    expect(workspace.placeOf(['makers', 'home'])).toBeNull()
    expect(emptyWorkspace().placeOf(['stocks'])).toBeNull()
  })

  it('that cannot be read holds what is wrong with it', () => {
    const workspace = readWorkspace('foldgauge: 1\nstocks: [\n', 'foldgauge.yaml')
    expect(workspace.problems).toMatchObject([
      { code: 'yaml-bracket', at: { file: 'foldgauge.yaml', line: 2, column: 9 } },
    ])
    expect(workspace.tokens.makers.has('home')).toBe(true)
  })
})

describe('several problems', () => {
  it('are all reported at once, in the order of the file', () => {
    const { set, problems } = readSet(
      `${onePiece('kind: card, stock: smoth, folded: 148, raised: -1').replace('trial', 'Trial')}shet: a4\nfits: { f: { put: piece, in: drawer, count: 0 } }\n`,
      'trial.yaml',
      emptyWorkspace(),
    )
    expect(set).toBeNull()
    expect(problems.map(({ code }) => code)).toEqual([
      'bad-name',
      'unknown-stock',
      'size-parts',
      'length-negative',
      'unknown-key',
      'unknown-piece',
      'not-a-number',
    ])
  })
})
