import type { Rule } from '../../rule.ts'

export const unusedPieceRule: Rule = {
  id: 'set/unused-piece',
  level: 'warn',
  title: 'Every piece is in a fit',
  why: 'A piece that no fit names is never checked against anything, which nobody notices while everything else passes.',
  origin: { kind: 'common practice', source: 'The fits of the set.' },
  remedy: 'Add the fit it belongs to, or take the piece out.',
  judge: (judged) => {
    const used = new Set(
      judged.set.fits.flatMap((fit) => [
        ...fit.put.map((entry) => entry.piece),
        fit.to,
        ...(fit.holding === null ? [] : [fit.holding]),
      ]),
    )
    return [...judged.set.pieces.keys()].map((name) => ({
      subject: name,
      severity: used.has(name) ? 'pass' : 'warn',
      measure: null,
      message: used.has(name)
        ? `${name} is in a fit.`
        : `${name} is in no fit, so nothing is checked of how it goes with the rest. Add a fit under “fits”, or take the piece out.`,
      path: ['pieces', name],
    }))
  },
}
