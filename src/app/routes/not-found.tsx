import { ButtonLink } from '@/components/button'
import { Page } from '@/components/page'
import { Brand } from '@/components/taut-line'
import { paths } from '../paths'

export function Component() {
  return (
    <main>
      <Page title="There is nothing at this address" above={<Brand />} width="narrow">
        <p className="mb-4 text-soft">The link may be old or mistyped.</p>
        <ButtonLink look="primary" to={paths.jobs}>
          To the jobs
        </ButtonLink>
      </Page>
    </main>
  )
}
