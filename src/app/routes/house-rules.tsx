import { useQuery } from '@tanstack/react-query'
import { ButtonLink } from '@/components/button'
import { Page } from '@/components/page'
import { ErrorNote, Loading } from '@/components/states'
import { houseRulesQuery } from '@/features/hardware/api/read-house-rules'
import { HouseRulesFacts } from '@/features/hardware/house-rules-facts'
import { HouseRulesForm } from '@/features/hardware/house-rules-form'
import { useMay, useSession } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'
import { lengthFormat } from '../length-format'
import { paths } from '../paths'

export function Component() {
  const { company } = useSession()
  const mayEdit = useMay('house-rules:edit')
  const { data, error, isPending, refetch } = useQuery(houseRulesQuery)
  const units = { force: company.units.force, format: lengthFormat(company.units, 64) }
  return (
    <Page title="House rules" actions={<ButtonLink to={paths.guardRules}>Guard rules</ButtonLink>}>
      <p className="mb-4 text-soft">
        {mayEdit
          ? 'Tolerances, limits and defaults of your company. Every cut list is worked out with them.'
          : 'Tolerances, limits and defaults every cut list is worked out with. An owner of your company changes them.'}
      </p>
      {isPending ? <Loading what="the house rules" /> : null}
      {error ? <ErrorNote message={messageOf(error)} onRetry={() => void refetch()} /> : null}
      {data && mayEdit ? <HouseRulesForm rules={data} units={units} /> : null}
      {data && !mayEdit ? <HouseRulesFacts rules={data} units={units} /> : null}
    </Page>
  )
}
