import type { JSX } from 'react'
import { Outlet } from 'react-router-dom'
import { AwayBanner } from './away-banner.tsx'
import { PageHead } from './page-head.tsx'

/** Pages that need no account. */
export function OutsideLayout(): JSX.Element {
  return (
    <>
      <AwayBanner />
      <PageHead me={null} />
      <main id="page" tabIndex={-1} className="mx-auto max-w-3xl px-4 py-8 outline-none">
        <Outlet />
      </main>
    </>
  )
}
