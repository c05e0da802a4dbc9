import { modelDefaults } from '../../../pieces/model-defaults.ts'
import type { Rule } from '../../rule.ts'
import { fitInWords } from '../../wording.ts'

export const dependsOnCareRule: Rule = {
  id: 'set/depends-on-care',
  level: 'info',
  title: 'The verdict is the same for careful and for hasty hands',
  why: 'Half-widths of hand work are guesses. Where a verdict turns on them, a test build tells more than a figure.',
  origin: {
    kind: 'guess',
    source: `Cut, score and fence errors taken ${String(modelDefaults.careLow.value)} and ${String(modelDefaults.careHigh.value)} times, and the fit judged again.`,
  },
  remedy: 'Have it test-built before you publish, or leave more clearance.',
  judge: (judged) =>
    judged.fits.map((fit) => {
      const thing = fitInWords(fit)
      return {
        subject: fit.fit.id,
        severity: fit.dependsOnCare ? 'info' : 'pass',
        measure: null,
        message: fit.dependsOnCare
          ? `${thing} depends on care: its verdict changes between careful and hasty hands. Have it test-built before you publish.`
          : `${thing} is judged alike for careful and hasty hands.`,
        path: ['fits', fit.fit.id],
      }
    }),
}
