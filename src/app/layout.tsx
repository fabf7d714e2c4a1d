import { useQuery } from '@tanstack/react-query'
import { lazy, Suspense } from 'react'
import { Navigate, Outlet, ScrollRestoration, useLocation, useMatches } from 'react-router-dom'
import { Button } from '@/components/button'
import { ErrorNote, Loading } from '@/components/states'
import { SessionContext, sessionQuery } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'
import { paths } from './paths'

const Frame = lazy(() => import('./frame'))
const Toasts = lazy(() => import('./toasts'))

export function RootLayout() {
  return (
    <>
      <Outlet />
      <ScrollRestoration />
    </>
  )
}

/** Everything behind sign-in; somebody who is not signed in comes back to where they wanted to go. */
export function SignedInLayout() {
  const { data: session, isPending, error, refetch } = useQuery(sessionQuery)
  const location = useLocation()
  const fullBleed = useMatches().some(
    ({ handle }) => (handle as { fullBleed?: boolean } | undefined)?.fullBleed,
  )
  if (isPending) return <Loading what="your book" />
  if (error) {
    return (
      <main className="p-4">
        <ErrorNote message={messageOf(error)} onRetry={() => void refetch()} />
        <Button className="mt-4" onClick={() => window.location.reload()}>
          Reload
        </Button>
      </main>
    )
  }
  if (!session) {
    const next = `${location.pathname}${location.search}`
    return <Navigate to={`${paths.signIn}?next=${encodeURIComponent(next)}`} replace />
  }
  return (
    <SessionContext value={session}>
      <Suspense fallback={<Loading what="the page" />}>
        {fullBleed ? <Outlet /> : <Frame session={session} />}
      </Suspense>
      {/* Here and not around the sign-in page, which says everything at its fields and stays light. */}
      <Suspense>
        <Toasts />
      </Suspense>
    </SessionContext>
  )
}
