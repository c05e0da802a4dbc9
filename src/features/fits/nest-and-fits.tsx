import { useState, type JSX, type ReactNode } from 'react'
import type { Report } from '../../../shared/report/report.ts'
import { StripLegend } from '../../ui/hundred-strip.tsx'
import { Empty } from '../../ui/loaded.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { fitWords } from '../../words/fit-words.ts'
import { nestWords } from '../../words/nest-words.ts'
import { FitCard } from './fit-card.tsx'

const rank = { fail: 0, warn: 1, pass: 2 } as const

/** The nest and the fits it shows: pointing at either shows the other. */
export function NestAndFits({
  report,
  nest,
  aside,
}: {
  readonly report: Report
  readonly nest: (shown: string | null, point: (fit: string | null) => void) => ReactNode
  readonly aside?: (fit: string) => ReactNode
}): JSX.Element {
  const [shown, setShown] = useState<string | null>(null)
  const fits = report.fits.toSorted((a, b) => rank[a.verdict] - rank[b.verdict])
  return (
    <>
      <Sheet title={nestWords.heading}>{nest(shown, setShown)}</Sheet>
      <Sheet title={fitWords.heading} aside={<StripLegend />} id="fits">
        {fits.length === 0 ? (
          <Empty title={fitWords.none} />
        ) : (
          <div className="space-y-7">
            {fits.map((fit) => (
              <FitCard key={fit.id} fit={fit} isShown={shown === fit.id} onPoint={setShown} aside={aside?.(fit.id)} />
            ))}
          </div>
        )}
      </Sheet>
    </>
  )
}
