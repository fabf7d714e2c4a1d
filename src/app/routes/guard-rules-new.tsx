import { useQuery } from '@tanstack/react-query'
import { Link, useNavigate, useSearchParams } from 'react-router-dom'
import { findRules, rulesName } from '@shared/calculation/guard-rules/published-rules'
import { Page } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { sayDone } from '@/components/toast'
import { guardRulesQuery } from '@/features/guard-rules/api/list-guard-rules'
import { GuardRulesForm } from '@/features/guard-rules/guard-rules-form'
import { ownCopy } from '@/features/guard-rules/own-copy'
import { useMay } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'
import { paths } from '../paths'

/** Own guard rules, begun as a copy of others. */
export function Component() {
  const [search] = useSearchParams()
  const navigate = useNavigate()
  const mayEdit = useMay('guard-rules:edit')
  const { data, error, isPending, refetch } = useQuery(guardRulesQuery)
  const own = data?.map(({ rules }) => rules) ?? []
  const from = findRules(search.get('from') ?? 'irc-2021', own)
  return (
    <Page title="Own guard rules" width="narrow" above={<Link to={paths.guardRules}>Guard rules</Link>}>
      {isPending ? <Loading what="the guard rules" /> : null}
      {error ? <ErrorNote message={messageOf(error)} onRetry={() => void refetch()} /> : null}
      {!mayEdit ? <EmptyState title="An owner of your company makes own rules" /> : null}
      {data && mayEdit && !from ? <EmptyState title="There are no such guard rules to copy" /> : null}
      {data && mayEdit && from ? (
        <>
          <p className="mb-4 text-soft">
            A copy of {rulesName(from)}. Figures you change are marked as your own; confirm them with the
            authority having jurisdiction.
          </p>
          <GuardRulesForm
            start={ownCopy(from, own)}
            onSaved={() => {
              sayDone('The guard rules are saved.')
              void navigate(paths.guardRules)
            }}
          />
        </>
      ) : null}
    </Page>
  )
}
