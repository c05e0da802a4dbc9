import { commonWords } from './common-words.ts'
import { plural } from './plural.ts'

type Axis = keyof typeof commonWords.axes

const relations = { in: 'in', over: 'over', around: 'around' } as const

/** Words of fits and how they were judged. */
export const fitWords = {
  heading: 'Fits',
  none: 'This set has pieces but no fit: nothing is put into anything.',
  what: (put: string, relation: keyof typeof relations, to: string, count: number, holding: string | null) =>
    `${count > 1 ? `${String(count)} × ` : ''}${put}${holding === null ? '' : ` holding ${holding}`} ${relations[relation]} ${to}`,
  closes: (share: number) => `${String(Math.round(share * 100))} of 100 go together`,
  axis: 'Axis',
  clearance: 'Clearance',
  perSide: 'each side',
  allowed: 'Allowed',
  hundred: 'A hundred builds',
  costs: 'What costs most',
  from: (name: string) => (name === 'default' ? 'usual' : name === 'set' ? 'given here' : name),
  share: (share: number, words: string) => `${String(Math.round(share * 100))} % ${words}`,
  care: 'Depends on care: a steadier or less steady hand changes this verdict.',
  turned: 'Put in turned by a quarter.',
  give: (name: string, axis: Axis) => `${name === 'snug' ? 'Snug' : 'Push-on'} along the ${commonWords.axes[axis]}.`,
  exposed: (length: string) => `${length} of the base shows below the lid.`,
  scales: (min: string, max: string) => `Holds where printed between ${min} and ${max}.`,
  papers: (stock: string, verdict: string, share: number) =>
    `With ${stock}: ${verdict}, ${String(Math.round(share * 100))} of 100.`,
  axisName: (axis: Axis) => commonWords.axes[axis],
  count: (count: number) => plural(count, 'fit', 'fits'),
} as const
