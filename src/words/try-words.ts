import { plural } from './plural.ts'

/** Words of trying changes out. */
export const tryWords = {
  title: 'Try it',
  explain: 'Judged in this browser by the same engine, as you type. Nothing is stored until you push it.',
  set: 'Set',
  choose: 'Choose a set to begin from',
  blank: 'an empty set of its own',
  begin: 'Begin with',
  editor: 'Text of the set',
  workspace: 'Judged with the workspace of this version.',
  alone: 'Judged alone, without a workspace.',
  paper: 'Paper for every piece',
  asGiven: 'as each piece says',
  thickness: 'Its thickness',
  thicknessNote: 'Changes the caliper of this paper wherever it is used.',
  thicknessOf: 'Paper',
  scale: 'Print scale',
  bar: 'Measured bar',
  barOf: (nominal: string) => `The bar of ${nominal} on your page measures`,
  scaleNote: 'Only pieces that are printed follow it.',
  maker: 'Workmanship',
  usual: (name: string) => `as the set says: ${name}`,
  reset: 'As the text says',
  survive: (count: number, all: number) => `${String(count)} of ${plural(all, 'fit', 'fits')} pass`,
  works: (share: number) => `${String(Math.round(share * 100))} of 100 whole sets go together`,
  problems: 'What cannot be understood',
  verdicts: 'Verdicts',
  push: 'Push this text',
  pushNote: 'Stored as a new version, judged without the changes of the sliders.',
  pushed: (number: number) => `Stored as version ${String(number)}.`,
  wasThere: (number: number) => `This very text is version ${String(number)} already.`,
  open: 'Open it',
  branch: 'Branch',
  branchHint: 'Empty takes the team’s main branch.',
  discard: 'Back to the stored text',
  kept: 'What you typed is kept in this browser.',
  judged: (ms: number) => `judged in ${ms < 10 ? ms.toFixed(1) : String(Math.round(ms))} ms`,
  starter: `foldgauge: 1
set: first-box
title: A box and its lid
units: mm
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid:  { kind: lid, stock: cover, blank: 190 x 149, wall: 14 }
fits:
  lid-on-base: { put: lid, over: base }
`,
} as const
