import { createHash } from 'node:crypto'
import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { engineVersion, rulesEdition } from '../../shared/edition.ts'
import type { PushBody } from '../features/push/push.service.ts'

/** One commit of the demo workspace: who pushed it when, and how its files read then. */
export interface DemoCommit {
  readonly daysAgo: number
  readonly branch: string
  readonly body: PushBody
}

const commitOf = (name: string): string => createHash('sha1').update(`quillfern ${name}`).digest('hex')

interface Files {
  readonly workspace: string
  readonly sets: ReadonlyMap<string, string>
}

function readDemo(folder: string): Files & { readonly failing: string } {
  const names = readdirSync(join(folder, 'sets')).filter((name) => name.endsWith('.yaml'))
  return {
    workspace: readFileSync(join(folder, 'foldgauge.yaml'), 'utf8'),
    sets: new Map(names.map((name) => [`sets/${name}`, readFileSync(join(folder, 'sets', name), 'utf8')])),
    failing: readFileSync(join(folder, 'failing', 'fern-notes.yaml'), 'utf8'),
  }
}

const notes = 'sets/fern-notes.yaml'

/** The demo's own story: a lid is scored deeper, stops clearing its box, and is mended; a branch tries thicker paper. */
export function demoHistory(folder: string): readonly DemoCommit[] {
  const demo = readDemo(folder)
  const now: Files = demo
  const withNotes = (text: string): Files => ({ ...now, sets: new Map([...now.sets, [notes, text]]) })
  const broken = withNotes(demo.failing)
  const titled = withNotes((now.sets.get(notes) ?? '').replace('six cards in a box', 'six cards with a lid'))
  const thicker: Files = { ...now, workspace: now.workspace.replace('caliper: 3.2 mm / 10', 'caliper: 3.7 mm / 10') }
  const story: readonly (readonly [
    name: string,
    daysAgo: number,
    branch: string,
    files: Files,
    base: string | null,
  ])[] = [
    ['first', 40, 'main', titled, null],
    ['words', 33, 'main', now, null],
    ['deeper-lid', 24, 'main', broken, null],
    ['mended', 21, 'main', now, null],
    ['thicker-cover', 12, 'thicker-cover', thicker, 'mended'],
  ]
  return story.map(([name, daysAgo, branch, files, base], index) => ({
    daysAgo,
    branch,
    body: {
      workspace: { file: 'foldgauge.yaml', text: files.workspace },
      sets: [...files.sets].map(([file, text]) => ({ file, text, digest: null, verdict: null })),
      engine: engineVersion,
      rules: rulesEdition,
      judging: { asOf: '2026-12-01', workmanship: null, paper: null, scale: 1 },
      branch,
      commit: commitOf(name),
      ancestors: story
        .slice(0, index)
        .map(([earlier]) => commitOf(earlier))
        .toReversed(),
      mergeBase: base === null ? null : commitOf(base),
      link: null,
    },
  }))
}
