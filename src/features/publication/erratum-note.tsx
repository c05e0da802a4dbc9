import type { JSX } from 'react'
import { dayText } from '../../lib/dates.ts'
import { outsideWords } from '../../words/outside-words.ts'
import { publicationWords } from '../../words/publication-words.ts'
import type { Erratum } from './publication-queries.ts'

/** One correction as makers read it. */
export function ErratumNote({ erratum }: { readonly erratum: Erratum }): JSX.Element {
  return (
    <div className="border-l-4 border-warn bg-warn-wash p-3 text-sm">
      <p className="font-semibold">
        {erratum.symptom} <span className="label">({publicationWords.severities[erratum.severity]})</span>
      </p>
      {erratum.wrong === '' && erratum.right === '' ? null : (
        <p className="figure">{outsideWords.wrongRight(erratum.wrong, erratum.right)}</p>
      )}
      {erratum.pieces.length === 0 ? null : <p>{erratum.pieces.join(', ')}</p>}
      {erratum.workaround === '' ? null : <p>{erratum.workaround}</p>}
      {erratum.pages.length === 0 ? null : (
        <p>
          {outsideWords.reprint}: {erratum.pages.join(', ')}
        </p>
      )}
      <p>{outsideWords.mates(erratum.oldPiecesMate)}</p>
      <p className="label">
        {erratum.labels.join(', ')} · {dayText(erratum.reportedAt)}
        {erratum.thanks === '' ? '' : ` · ${erratum.thanks}`}
      </p>
    </div>
  )
}
