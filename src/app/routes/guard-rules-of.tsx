import { useQuery } from '@tanstack/react-query'
import { Link, useNavigate, useParams } from 'react-router-dom'
import { findRules, rulesName } from '@shared/calculation/guard-rules/published-rules'
import type { OwnGuardRules } from '@shared/schemas/catalogue'
import { Button, ButtonLink } from '@/components/button'
import { Page } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { sayDone, sayProblem } from '@/components/toast'
import { guardRulesQuery } from '@/features/guard-rules/api/list-guard-rules'
import { useRetireGuardRules } from '@/features/guard-rules/api/retire-guard-rules'
import { GuardRulesFacts } from '@/features/guard-rules/guard-rules-facts'
import { GuardRulesForm } from '@/features/guard-rules/guard-rules-form'
import { useMay } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'
import { paths } from '../paths'

/** One set of guard rules: to read, and where it is the company's own, to change. */
export function Component() {
  const { id = '' } = useParams()
  const mayEdit = useMay('guard-rules:edit')
  const navigate = useNavigate()
  const { data, error, isPending, refetch } = useQuery(guardRulesQuery)
  const own = data?.find(({ rules }) => rules.id === id)
  const rules = own?.rules ?? findRules(id)
  return (
    <Page
      title={rules ? rulesName(rules) : 'Guard rules'}
      width={own && mayEdit ? 'narrow' : 'wide'}
      above={<Link to={paths.guardRules}>Guard rules</Link>}
      actions={
        rules && mayEdit ? (
          <>
            {own ? <RetireButton own={own} /> : null}
            <ButtonLink to={paths.newGuardRules(id)}>Copy and edit</ButtonLink>
          </>
        ) : null
      }
    >
      <p className="mb-4 text-soft">
        {rules?.basedOn ? `Made from ${rules.basedOn}. ` : ''}Confirm with the authority having jurisdiction.
      </p>
      {isPending && !rules ? <Loading what="the guard rules" /> : null}
      {error && !rules ? <ErrorNote message={messageOf(error)} onRetry={() => void refetch()} /> : null}
      {data && !rules ? <EmptyState title="There are no such guard rules" /> : null}
      {own && mayEdit ? (
        <GuardRulesForm
          key={own.key}
          known={own.key}
          start={own.rules}
          onSaved={() => {
            sayDone('The guard rules are saved.')
            void navigate(paths.guardRules)
          }}
        />
      ) : rules ? (
        <GuardRulesFacts rules={rules} />
      ) : null}
    </Page>
  )
}

function RetireButton({ own: { key, retired, rules } }: { own: OwnGuardRules }) {
  const retire = useRetireGuardRules()
  const turn = (next: boolean, done?: () => void) =>
    retire.mutate(
      { key, retired: next },
      { onSuccess: done, onError: (error) => sayProblem(messageOf(error)) },
    )
  return (
    <Button
      busy={retire.isPending}
      onClick={() =>
        turn(!retired, () =>
          sayDone(retired ? `${rules.name} is offered again.` : `${rules.name} is retired.`, () =>
            turn(retired),
          ),
        )
      }
    >
      {retired ? 'Offer again' : 'Retire'}
    </Button>
  )
}
