import { ButtonLink } from '@/components/button'
import { EmptyState } from '@/components/states'
import { paths } from '../paths'

export function Component() {
  return (
    <main className="mx-auto max-w-xl p-4 pt-16">
      <EmptyState
        title="There is nothing at this address"
        action={
          <ButtonLink look="primary" to={paths.jobs}>
            To the jobs
          </ButtonLink>
        }
      >
        The link may be old or mistyped.
      </EmptyState>
    </main>
  )
}
