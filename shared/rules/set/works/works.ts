import type { Finding, Rule } from '../../rule.ts'
import { aboutInWords, outOfHundred } from '../../wording.ts'

export const worksRule: Rule = {
  id: 'set/works',
  level: 'warn',
  title: 'The whole set goes together',
  why: 'Every fit may be good enough by itself and the set still be spoilt in one build of eight, for each has its own bad luck.',
  origin: {
    kind: 'derived',
    source:
      'Joint share of builds in which every fit closes by hand; what pieces share, such as the caliper, is shared there too.',
  },
  remedy: 'Give the fit that closes least a little more room; the report lists them.',
  judge: (judged): readonly Finding[] => {
    const { name, tokens } = judged.set
    const common = { subject: name, path: ['set'] }
    if (judged.fits.length === 0)
      return [{ ...common, severity: 'unchecked', measure: null, message: `${name} has no fits to go together.` }]
    const worst = judged.fits.toSorted((a, b) => a.closes - b.closes)[0]
    const isGood = judged.works >= tokens.target
    const words = `${aboutInWords(judged.works)} ${judged.workmanship}-made sets go together`
    const sets = `${words.charAt(0).toUpperCase()}${words.slice(1)}`
    return [
      {
        ...common,
        severity: isGood ? 'pass' : 'warn',
        measure: { actual: judged.works, limit: tokens.target, sense: 'at-least', unit: 'share' },
        message: isGood
          ? `${sets}.`
          : `${sets}, and ${outOfHundred(tokens.target)} of 100 are wanted. ${worst === undefined ? '' : `${worst.fit.id} closes least, in ${outOfHundred(worst.closes)} of 100: begin there.`}`,
      },
    ]
  },
}
