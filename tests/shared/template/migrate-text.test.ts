import { describe, expect, it } from 'vitest'
import { formatOf, migrateText, type MigrationStep } from '../../../shared/template/migrate-text.ts'

// Steps of an invented future, so that the way through is proved before it is needed.
const steps: readonly MigrationStep[] = [
  { from: 1, migrate: (text) => text.replace('foldgauge: 1', 'foldgauge: 2').replace('wall:', 'depth-of-wall:') },
  { from: 2, migrate: (text) => text.replace('foldgauge: 2', 'foldgauge: 3') },
]

describe('bringing a template to another format', () => {
  it('leaves the present one alone', () => {
    expect(migrateText('foldgauge: 1\ntitle: A\n')).toEqual({ outcome: 'current', format: 1 })
  })

  it('goes from the first to the third in one go and keeps comments', () => {
    expect(migrateText('foldgauge: 1   # old\nwall: 3\n', steps, 3)).toEqual({
      outcome: 'migrated',
      format: 1,
      text: 'foldgauge: 3   # old\ndepth-of-wall: 3\n',
    })
  })

  it('refuses what is newer than itself', () => {
    expect(migrateText('foldgauge: 4\n', steps, 3)).toEqual({ outcome: 'newer', format: 4 })
  })

  it('names no format where a set names none', () => {
    expect(formatOf('set: a\n')).toBeNull()
    expect(migrateText('set: a\n')).toEqual({ outcome: 'none' })
  })
})
