import type { Blank } from '../../../pieces/blank.ts'
import { drawnBlanks } from '../../drawn-blanks.ts'
import type { Finding, Rule } from '../../rule.ts'

/** The one direction all folds of a sheet run in; `null` where there are none or they run both ways. */
function foldsRun(blank: Blank): 'x' | 'y' | null {
  const directions = new Set(
    blank.scores.map(({ from, to }) => {
      const run = Math.abs(to.x - from.x)
      const rise = Math.abs(to.y - from.y)
      return rise < 1e-6 * run ? 'x' : run < 1e-6 * rise ? 'y' : 'slanting'
    }),
  )
  const [only] = directions
  return directions.size === 1 && only !== undefined && only !== 'slanting' ? only : null
}

function judgePiece(name: string, blank: Blank | undefined): readonly Finding[] {
  if (blank === undefined || blank.stock === null) return []
  const runs = foldsRun(blank)
  if (runs === null) return []
  const common = { subject: name, measure: null, path: ['pieces', name] }
  if (blank.grain === null)
    return [
      {
        ...common,
        severity: 'unchecked',
        message: `Which way the grain of ${blank.stock} runs is not said (grain: long or short).`,
      },
    ]
  const isAcross = blank.grain !== runs
  return [
    {
      ...common,
      severity: isAcross ? 'info' : 'pass',
      message: isAcross
        ? `${name} is folded across the grain of ${blank.stock}. Most advice is to fold along it, creased board is said to fold better across: score a test strip both ways before you choose.`
        : `${name} is folded along the grain of ${blank.stock}.`,
    },
  ]
}

export const grainAcrossFoldRule: Rule = {
  id: 'stock/grain-across-fold',
  level: 'info',
  title: 'Folds run along the grain',
  why: 'Across the grain some papers crack and spring open, and a sheet that leaves no other way shows it only when it is cut.',
  origin: {
    kind: 'published',
    source:
      'Sources disagree: printers advise folding along the grain, makers of board creasing across it. Nothing was found on card scored by hand.',
  },
  remedy: 'Cut the piece the other way round on the sheet, or score a test strip first.',
  judge: (judged) => [...drawnBlanks(judged)].flatMap(([name, blanks]) => judgePiece(name, blanks[0])),
}
