import type { JudgedSet } from '../../assembly/judge-set.ts'
import { checkBlank, type BlankFact, type BlankFactName } from '../../pieces/check-blank.ts'
import { drawnBlanks } from '../drawn-blanks.ts'
import { oncePerSet } from '../once-per-set.ts'
import type { Finding } from '../rule.ts'

/** What was measured on the sheets of every piece, by its name. */
const blankFacts = oncePerSet((judged): ReadonlyMap<string, readonly BlankFact[]> => {
  const blanks = drawnBlanks(judged)
  return new Map([...judged.pieces].map(([name, piece]) => [name, checkBlank(piece, blanks.get(name) ?? [])]))
})

/** How much room a fact leaves to its limit; less than nothing where it breaks it. */
const room = (fact: BlankFact): number =>
  fact.sense === 'at-least' ? fact.measured - fact.limit : fact.limit - fact.measured

/** The fact of a kind that stands worst on a piece: broken before kept, then the one with least room. */
function worstOf(facts: readonly BlankFact[], names: readonly BlankFactName[]): BlankFact | undefined {
  return facts
    .filter((fact) => names.includes(fact.fact))
    .toSorted((a, b) => Number(a.holds) - Number(b.holds) || room(a) - room(b))[0]
}

/** What a rule says of one fact about a piece. */
export interface FactWords {
  readonly pass: string
  readonly miss: string
}

/** Findings of a rule about sheets: one for every piece that has such a fact, about the worst of them. */
export function judgeFacts(
  judged: JudgedSet,
  names: readonly BlankFactName[],
  severity: 'warn' | 'fail',
  words: (piece: string, fact: BlankFact) => FactWords,
): readonly Finding[] {
  return [...blankFacts(judged)].flatMap(([piece, facts]) => {
    const fact = worstOf(facts, names)
    if (fact === undefined) return []
    const { pass, miss } = words(piece, fact)
    return [
      {
        subject: piece,
        severity: fact.holds ? 'pass' : severity,
        measure: { actual: fact.measured, limit: fact.limit, sense: fact.sense, unit: fact.unit },
        message: fact.holds ? pass : miss,
        path: ['pieces', piece],
      },
    ]
  })
}
