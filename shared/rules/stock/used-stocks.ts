import type { JudgedSet } from '../../assembly/judge-set.ts'
import type { Stock } from '../../template/template-model.ts'
import { oncePerSet } from '../once-per-set.ts'

/** A stock that something in the set is cut from, and where to point. */
export interface UsedStock {
  readonly stock: Stock
  /** Its entry in the file where it stands there, else the first use of it. */
  readonly path: readonly (string | number)[]
}

type Use = readonly [stock: string, path: readonly (string | number)[]]

function usesOf(judged: JudgedSet): readonly Use[] {
  const uses: Use[] = []
  for (const [name, piece] of judged.set.pieces) {
    const at = (...keys: readonly (string | number)[]) => ['pieces', name, ...keys]
    if (piece.stock !== null) uses.push([piece.stock, at('stock')])
    if ('layers' in piece)
      piece.layers.forEach((layer, index) => uses.push([layer.stock, at('layers', index, 'stock')]))
    if ('insert' in piece && piece.insert !== null) uses.push([piece.insert.stock, at('insert', 'stock')])
    if ('liner' in piece && piece.liner !== null) uses.push([piece.liner, at('liner')])
    if ('covered' in piece && piece.covered !== null) uses.push([piece.covered, at('covered')])
  }
  for (const fit of judged.set.fits)
    fit.papers.forEach((paper, index) => uses.push([paper, ['fits', fit.id, 'paper', index]]))
  return judged.options.paper === undefined ? uses : [...uses, [judged.options.paper, []]]
}

/** Every stock of a set, each once, in the order of its first use. */
export const usedStocks = oncePerSet((judged): readonly UsedStock[] => {
  const used = new Map<string, UsedStock>()
  for (const [name, firstUse] of usesOf(judged)) {
    const stock = judged.set.tokens.stocks.get(name)
    if (stock === undefined || used.has(name)) continue
    const own = ['stocks', name]
    const isWrittenHere = judged.set.placeOf(own).path.length === own.length
    used.set(name, { stock, path: isWrittenHere ? own : firstUse })
  }
  return [...used.values()]
})
