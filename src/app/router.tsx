import type { ReactNode } from 'react'
import { createBrowserRouter, type RouteObject } from 'react-router-dom'
import { Waiting } from '../ui/loaded.tsx'
import { ErrorPage } from './error-page.tsx'
import { Home } from './home.tsx'
import { OutsideLayout } from './outside-layout.tsx'
import { SignedInLayout } from './team-layout.tsx'

/** A page whose code is fetched when it is opened. */
const page = (path: string, lazy: () => Promise<{ readonly default: () => ReactNode }>): RouteObject => ({
  path,
  lazy: async () => ({ Component: (await lazy()).default }),
})

const outside: RouteObject[] = [
  page('/sign-in', () => import('../pages/outside/sign-in-page.tsx')),
  page('/password', () => import('../pages/outside/ask-reset-page.tsx')),
  page('/password/:secret', () => import('../pages/outside/reset-page.tsx')),
  page('/email/:secret', () => import('../pages/outside/confirm-email-page.tsx')),
  page('/invitations/:secret', () => import('../pages/outside/invitation-page.tsx')),
  page('/test/:key', () => import('../pages/builds/test-form-page.tsx')),
  page('/public/:page', () => import('../pages/outside/public-page.tsx')),
]

const team: RouteObject[] = [
  page('sets', () => import('../pages/sets/sets-page.tsx')),
  page('holds', () => import('../pages/sets/holds-page.tsx')),
  page('upload', () => import('../pages/sets/upload-page.tsx')),
  page('try', () => import('../pages/try/try-page.tsx')),
  page('sets/:set', () => import('../pages/sets/set-page.tsx')),
  page('sets/:set/versions/:number', () => import('../pages/version/version-page.tsx')),
  page('sets/:set/versions/:number/compare', () => import('../pages/version/compare-page.tsx')),
  page('sets/:set/versions/:number/review', () => import('../pages/version/review-page.tsx')),
  page('sets/:set/versions/:number/numbers', () => import('../pages/version/numbers-page.tsx')),
  page('sets/:set/versions/:number/builds', () => import('../pages/builds/version-builds-page.tsx')),
  page('team', () => import('../pages/team/people-page.tsx')),
  page('papers', () => import('../pages/team/papers-page.tsx')),
  page('tokens', () => import('../pages/team/tokens-page.tsx')),
  page('notices', () => import('../pages/team/notices-page.tsx')),
  page('webhooks', () => import('../pages/team/webhooks-page.tsx')),
  page('audit', () => import('../pages/team/audit-page.tsx')),
  page('settings', () => import('../pages/team/settings-page.tsx')),
]

export const router = createBrowserRouter([
  {
    errorElement: <ErrorPage />,
    hydrateFallbackElement: <Waiting />,
    children: [
      { element: <OutsideLayout />, children: outside },
      {
        element: <SignedInLayout />,
        children: [
          { index: true, element: <Home /> },
          page('/account', () => import('../pages/outside/account-page.tsx')),
          page('/builds', () => import('../pages/builds/my-builds-page.tsx')),
          { path: '/teams/:team', children: team },
        ],
      },
    ],
  },
])
