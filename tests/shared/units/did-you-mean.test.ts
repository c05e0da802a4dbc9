import { describe, expect, it } from 'vitest'
import { nearestName } from '../../../shared/units/did-you-mean.ts'

const names = ['envelope', 'base', 'lid', 'band', 'insert']

describe('the name a word was probably meant to be', () => {
  it.each([
    ['envelop', 'envelope'],
    ['enevlope', 'envelope'],
    ['envelpoe', 'envelope'],
    ['bsae', 'base'],
    ['lidd', 'lid'],
    ['ild', 'lid'],
    ['inserts', 'insert'],
  ])('%s: %s', (word, name) => {
    expect(nearestName(word, names)).toBe(name)
  })

  it('is none where the word is too far from all of them', () => {
    for (const word of ['sleeve', 'box', 'envel', 'xxlid', '']) expect(nearestName(word, names)).toBeNull()
    expect(nearestName('lid', [])).toBeNull()
  })

  it('is none where not one letter agrees', () => {
    expect(nearestName('f', ['x', '"'])).toBeNull()
  })

  it('is the nearest of several, and the first of equally near ones', () => {
    expect(nearestName('band', ['bend', 'band'])).toBe('band')
    expect(nearestName('bund', ['bend', 'band'])).toBe('bend')
  })

  it('takes longer words with more slips, three at most', () => {
    expect(nearestName('clearence-hedspase', ['clearance-headspace'])).toBe('clearance-headspace')
    expect(nearestName('klearence-hedspase', ['clearance-headspace'])).toBeNull()
  })
})
