import { Page } from '@/components/page'
import { CompanyFacts } from '@/features/company/company-facts'
import { CompanyForm } from '@/features/company/company-form'
import { useMay, useSession } from '@/features/session/session'

export function Component() {
  const { company } = useSession()
  const mayEdit = useMay('company:edit')
  return (
    <Page title="Company" width="narrow">
      {mayEdit ? (
        <CompanyForm company={company} />
      ) : (
        <>
          <CompanyFacts company={company} />
          <p className="mt-6 text-soft">An owner of your company changes these.</p>
        </>
      )}
    </Page>
  )
}
