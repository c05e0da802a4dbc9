import { useMemo, type JSX } from 'react'
import type { Report } from '../../../shared/report/report.ts'
import { useUnits } from '../../lib/units.ts'
import { Empty } from '../../ui/loaded.tsx'
import { nestWords } from '../../words/nest-words.ts'
import { NestView } from './nest-view.tsx'
import { planPictures } from './plan-pictures.ts'
import { sectionPictures } from './section-pictures.ts'

/** The pieces of a set in one another: boxes cut through, pockets from above. */
export function Nest({
  report,
  shown,
  onPoint,
}: {
  readonly report: Report
  readonly shown: string | null
  readonly onPoint: (fit: string | null) => void
}): JSX.Element {
  const units = useUnits()
  const pictures = useMemo(() => [...sectionPictures(report), ...planPictures(report)], [report])
  if (pictures.length === 0) return <Empty title={nestWords.none} />
  return (
    <>
      <div className="grid items-end gap-x-8 gap-y-6 md:grid-cols-2">
        {pictures.map((picture) => (
          <NestView key={picture.id} picture={picture} units={units} shown={shown} onPoint={onPoint} />
        ))}
      </div>
      <p className="mt-3 text-sm text-soft">{nestWords.explain}</p>
    </>
  )
}
