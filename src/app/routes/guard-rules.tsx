import { useQuery } from '@tanstack/react-query'
import { publishedRules } from '@shared/calculation/guard-rules/published-rules'
import { GuardCautions } from '@/components/cautions'
import { Page } from '@/components/page'
import { ErrorNote, Loading } from '@/components/states'
import { guardRulesQuery } from '@/features/guard-rules/api/list-guard-rules'
import { GuardRulesList } from '@/features/guard-rules/guard-rules-list'
import { useMay } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'
import { paths } from '../paths'

/** The height, opening and load rules that surveys may follow. */
export function Component() {
  const mayEdit = useMay('guard-rules:edit')
  const { data, error, isPending, refetch } = useQuery(guardRulesQuery)
  const own = (retired: boolean) =>
    data?.filter((each) => each.retired === retired).map(({ rules }) => rules) ?? []
  return (
    <Page title="Guard rules">
      <p className="mb-4 text-soft">
        What a survey’s guard is held to: heights, openings and loads, each with its section. Confirm with the
        authority having jurisdiction.
      </p>
      <div className="flex flex-col gap-8">
        <section className="flex flex-col gap-3">
          <h2 className="text-lg font-semibold">Own rules</h2>
          {isPending ? <Loading what="your own rules" /> : null}
          {error ? <ErrorNote message={messageOf(error)} onRetry={() => void refetch()} /> : null}
          {data && own(false).length === 0 ? (
            <p className="text-soft">
              {mayEdit
                ? 'None yet. Where your town asks for more, open published rules below and copy them.'
                : 'None yet. An owner of your company makes them.'}
            </p>
          ) : null}
          <GuardRulesList label="Own rules" rules={own(false)} pathOf={paths.guardRulesOf} />
          {own(true).length > 0 ? (
            <details>
              <summary className="min-h-12 py-3 font-medium text-soft">Retired ({own(true).length})</summary>
              <GuardRulesList label="Own rules, retired" rules={own(true)} pathOf={paths.guardRulesOf} />
            </details>
          ) : null}
        </section>
        <section className="flex flex-col gap-3">
          <h2 className="text-lg font-semibold">Published rules</h2>
          <GuardRulesList label="Published rules" rules={publishedRules} pathOf={paths.guardRulesOf} />
        </section>
        <GuardCautions />
      </div>
    </Page>
  )
}
