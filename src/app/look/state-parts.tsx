import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { CutCautions } from '@/components/cautions'
import { Card } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { sayDone } from '@/components/toast'
import { offline } from '@/lib/api-error'

export function StateParts() {
  return (
    <Card title="States">
      <div className="grid gap-4">
        <Banner>No connection. What is on the screen stays; nothing new can be fetched or sent.</Banner>
        <Loading what="the jobs" />
        <EmptyState title="No jobs yet" action={<Button look="primary">New job</Button>}>
          A job is one customer, one site, one piece of work.
        </EmptyState>
        <ErrorNote message={offline().message} onRetry={() => sayDone('Tried again.')} />
        <CutCautions />
      </div>
    </Card>
  )
}
