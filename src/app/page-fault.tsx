import { useRouteError } from 'react-router-dom'
import { Button } from '@/components/button'

/** What a page shows instead of itself when it broke: what happened, what was kept, what to do. */
export function PageFault() {
  const error = useRouteError()
  // A new version was put in place while this page was open, and the piece it wanted is gone.
  const outdated = error instanceof TypeError && /import|fetch/i.test(error.message)
  return (
    <main role="alert" className="mx-auto max-w-xl px-4 py-16">
      <h1 className="text-xl font-semibold">
        {outdated ? 'This page could not be fetched' : 'This page broke'}
      </h1>
      <p className="mt-2 text-soft">
        {outdated
          ? 'Either there is no connection, or Tautbook was renewed while this page was open. Check the signal and reload.'
          : 'What was saved before is safe. Reload the page; if it breaks again, tell the owner of your company what you did.'}
      </p>
      <div className="mt-4 flex gap-2">
        <Button look="primary" onClick={() => window.location.reload()}>
          Reload
        </Button>
        <Button onClick={() => window.location.assign('/jobs')}>To the jobs</Button>
      </div>
    </main>
  )
}
