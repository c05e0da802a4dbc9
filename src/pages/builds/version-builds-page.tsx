import { useState, type JSX } from 'react'
import { BuildList } from '../../features/builds/build-list.tsx'
import { buildsCsvAddress } from '../../features/builds/build-queries.ts'
import { ImportForm } from '../../features/builds/import-form.tsx'
import { InvitationList } from '../../features/builds/invitation-list.tsx'
import { InviteForm } from '../../features/builds/invite-form.tsx'
import { StudyView } from '../../features/builds/study-view.tsx'
import { SetNav } from '../../features/sets/set-nav.tsx'
import { useMay } from '../../features/team/team-queries.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Sheet } from '../../ui/sheet.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { buildWords } from '../../words/build-words.ts'
import { commonWords } from '../../words/common-words.ts'
import { versionWords } from '../../words/version-words.ts'

/** Test builds of a version: predicted against measured, who builds, what they said. */
export default function VersionBuildsPage(): JSX.Element {
  const place = { team: usePart('team'), set: usePart('set'), number: Number(usePart('number')) }
  const may = useMay(place.team)
  const [isInviting, setIsInviting] = useState(false)
  useTitle(`${buildWords.builds}: ${place.set}`)
  return (
    <>
      <SetNav {...place} />
      <TitleBlock
        title={buildWords.builds}
        above={`${place.set} · ${versionWords.version(place.number)}`}
        actions={
          <>
            <a className="button" href={buildsCsvAddress(place)} download>
              {commonWords.csv}
            </a>
            {may('builds:invite') ? (
              <button type="button" className="button" data-kind="main" onClick={() => setIsInviting(true)}>
                {buildWords.invite}
              </button>
            ) : null}
          </>
        }
      />
      <div className="space-y-5">
        <StudyView place={place} />
        <Sheet title={buildWords.builds}>
          <BuildList place={place} />
        </Sheet>
        <Sheet title={buildWords.invitations}>
          <InvitationList place={place} canRevoke={may('builds:invite')} />
        </Sheet>
        {may('builds:submit') ? (
          <Sheet title={buildWords.importTitle}>
            <ImportForm place={place} />
          </Sheet>
        ) : null}
      </div>
      <InviteForm place={place} isOpen={isInviting} onClose={() => setIsInviting(false)} />
    </>
  )
}
