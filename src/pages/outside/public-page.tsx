import { useQuery } from '@tanstack/react-query'
import type { JSX, ReactNode } from 'react'
import { Link } from 'react-router-dom'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { publicationEndpoints } from '../../../shared/api/publication-endpoints.ts'
import { ErratumNote } from '../../features/publication/erratum-note.tsx'
import { publicPageQuery } from '../../features/publication/publication-queries.ts'
import { dayText } from '../../lib/dates.ts'
import { markIn, useUnits } from '../../lib/units.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Loaded } from '../../ui/loaded.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { outsideWords } from '../../words/outside-words.ts'
import { publicationWords } from '../../words/publication-words.ts'
import { setsWords } from '../../words/sets-words.ts'

type Page = AnswerOf<typeof publicationEndpoints.publicPage>

function Content({ page, own }: { readonly page: Page; readonly own: string }): JSX.Element {
  const units = useUnits()
  useTitle(page.title)
  return (
    <>
      <TitleBlock
        title={page.title}
        above={page.team}
        cells={[
          { label: publicationWords.label, value: <span className="figure">{page.label}</span> },
          { label: publicationWords.at, value: dayText(page.publishedAt) },
        ]}
      />
      <div className="space-y-5">
        {page.recalled === null ? null : (
          <div role="alert" className="border-l-4 border-fail bg-fail-wash p-4">
            <p className="font-semibold">
              <StateMark state="recalled">{outsideWords.recalledTitle}</StateMark>
            </p>
            <p>{page.recalled.reason}</p>
          </div>
        )}
        {page.photo === null ? null : (
          <img src={page.photo} alt={setsWords.photoOf(page.title)} className="w-full border border-hair" />
        )}
        {page.notes === '' ? null : <p className="whitespace-pre-wrap">{page.notes}</p>}
        {page.errata.length === 0 ? null : (
          <Sheet title={outsideWords.errata}>
            <div className="space-y-3">
              {page.errata.map((erratum) => (
                <ErratumNote key={erratum.id} erratum={erratum} />
              ))}
            </div>
          </Sheet>
        )}
        <Sheet title={outsideWords.pieces}>
          <DataTable
            caption={outsideWords.pieces}
            rows={page.pieces}
            keyOf={(piece) => piece.name}
            columns={[
              { name: outsideWords.pieceName, isHead: true, cell: (piece) => piece.name },
              { name: outsideWords.paper, cell: (piece) => piece.stock ?? '–' },
              {
                name: outsideWords.blankSize,
                isFigure: true,
                cell: (piece) =>
                  piece.blank === null
                    ? '–'
                    : `${markIn(piece.blank.length, units)} × ${markIn(piece.blank.width, units)}`,
              },
              { name: outsideWords.make, isFigure: true, cell: (piece) => piece.make },
            ]}
          />
        </Sheet>
        {page.recalled === null ? (
          <Sheet title={outsideWords.files}>
            <p className="mb-3 border-l-4 border-warn bg-warn-wash p-3 text-sm">{outsideWords.publicCaution}</p>
            {page.files.length === 0 ? (
              <p className="text-sm">{outsideWords.noFiles}</p>
            ) : (
              <ul className="text-sm sm:columns-2">
                {page.files.map((file) => (
                  <li key={file.name}>
                    <a href={file.path} download>
                      {file.name}
                    </a>
                  </li>
                ))}
              </ul>
            )}
          </Sheet>
        ) : null}
        <Sheet title={outsideWords.fits}>
          <p className="mb-2">{outsideWords.worksSentence(page.works, page.workmanship)}</p>
          <ul className="text-sm">
            {page.fits.map((fit) => (
              <li key={fit.id}>
                {fit.id}: <span className="figure">{setsWords.works(fit.closes)}</span>
              </li>
            ))}
          </ul>
        </Sheet>
        <Sheet title={outsideWords.licence}>
          <p className="whitespace-pre-wrap text-sm">{page.licence}</p>
        </Sheet>
        {page.others.length === 0 ? null : (
          <Sheet title={outsideWords.others}>
            <ul className="flex flex-wrap gap-4 text-sm">
              {page.others.map((other) => (
                <li key={other.label}>
                  <Link to={`/public/${own}?label=${other.label}`}>{other.label}</Link>
                  {other.isRecalled ? ` (${outsideWords.recalledEdition})` : ''}
                </li>
              ))}
            </ul>
          </Sheet>
        )}
      </div>
    </>
  )
}

/** What anybody may read about a published set. */
export default function PublicPage(): ReactNode {
  const own = usePart('page')
  const { value } = useAddressFilter()
  const page = useQuery(publicPageQuery(own, value('label')))
  return (
    <Loaded query={page} lines={8}>
      {(data) => <Content page={data} own={own} />}
    </Loaded>
  )
}
