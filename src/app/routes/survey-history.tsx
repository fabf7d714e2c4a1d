import { useInfiniteQuery, useQuery } from '@tanstack/react-query'
import { Link, useParams } from 'react-router-dom'
import { Button } from '@/components/button'
import { Page } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { useSession } from '@/features/session/session'
import { describeOperation } from '@/features/survey-editor/table/describe-operation'
import { historyQuery } from '@/features/surveys/api/read-history'
import { surveyQuery } from '@/features/surveys/api/read-survey'
import { messageOf } from '@/lib/api-error'
import { lengthFormat } from '../length-format'
import { paths } from '../paths'

/** Every change of a survey, with who and when. */
export function Component() {
  const { surveyId = '' } = useParams()
  const { company } = useSession()
  const survey = useQuery(surveyQuery(surveyId))
  const history = useInfiniteQuery(historyQuery(surveyId))
  const error = survey.error ?? history.error
  const retry = () => {
    void survey.refetch()
    void history.refetch()
  }
  if (error) {
    return (
      <Page title="History">
        <ErrorNote message={messageOf(error)} onRetry={retry} />
      </Page>
    )
  }
  if (!survey.data || !history.data) return <Loading what="the history" />
  const format = lengthFormat(survey.data.survey.units, company.fraction)
  const entries = history.data.pages.flatMap((page) => page.entries)
  return (
    <Page
      title="History"
      width="narrow"
      above={<Link to={paths.survey(surveyId)}>{survey.data.survey.title}</Link>}
    >
      {entries.length === 0 ? <EmptyState title="Nothing has been changed yet" /> : null}
      <ol className="divide-y divide-rule">
        {entries.map(({ changeId, revision, by, at, operation }) => (
          <li key={changeId} className="grid grid-cols-[3rem_1fr] gap-x-3 py-3">
            <span className="figures text-right text-soft">{revision}</span>
            <span>
              <strong className="font-medium">{by}</strong> {describeOperation(operation, format)}.
              <time dateTime={at} className="block text-sm text-soft">
                {new Date(at).toLocaleString()}
              </time>
            </span>
          </li>
        ))}
      </ol>
      {history.hasNextPage ? (
        <Button busy={history.isFetchingNextPage} onClick={() => void history.fetchNextPage()}>
          Show older changes
        </Button>
      ) : null}
    </Page>
  )
}
