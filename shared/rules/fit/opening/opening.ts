import type { JudgedFit } from '../../../assembly/judge-fit.ts'
import type { JudgedSet } from '../../../assembly/judge-set.ts'
import { modelDefaults } from '../../../pieces/model-defaults.ts'
import type { Finding, Rule } from '../../rule.ts'
import { inSetUnits } from '../../wording.ts'

function hasNotch(judged: JudgedSet, piece: string): boolean {
  const given = judged.set.pieces.get(piece)
  return (given?.kind === 'box' || given?.kind === 'lid') && given.thumbNotch
}

function judgeOpening(judged: JudgedSet, fit: JudgedFit): readonly Finding[] {
  const { seat } = fit
  if (seat === null || fit.clearances.fitCase !== 'lid') return []
  const least = modelDefaults.openingExposed.value
  const shown = inSetUnits(judged, seat.exposed)
  const isNotched = hasNotch(judged, seat.lid) || hasNotch(judged, seat.base)
  const isOpened = seat.exposed >= least - 1e-9
  const message = isNotched
    ? `${seat.lid} comes off ${seat.base} by its thumb notch.`
    : isOpened
      ? `${seat.lid} leaves ${shown} of ${seat.base} to hold it by.`
      : `${seat.lid} leaves ${shown} of ${seat.base} showing, and ${inSetUnits(judged, least)} are wanted to hold it by. Score ${seat.lid} shallower by ${inSetUnits(judged, least - seat.exposed)}, or give it a thumb notch (thumb-notch: true).`
  return [
    {
      subject: fit.fit.id,
      severity: isNotched || isOpened ? 'pass' : 'warn',
      measure: { actual: seat.exposed, limit: least, sense: 'at-least', unit: 'mm' },
      message,
      path: ['fits', fit.fit.id],
    },
  ]
}

export const openingRule: Rule = {
  id: 'fit/opening',
  level: 'warn',
  title: 'A closed box can be opened again',
  why: 'A lid that reaches the table leaves nothing to hold the base by; people then pull at the walls until a corner gives.',
  origin: {
    kind: 'common practice',
    source: 'Box makers leave five to ten millimetres of the base showing, or cut a thumb notch.',
  },
  remedy: 'Make the lid shallower than the base, or add a thumb notch.',
  judge: (judged) => judged.fits.flatMap((fit) => judgeOpening(judged, fit)),
}
