import { Link, useParams } from 'react-router-dom'
import { explainCable } from '@shared/calculation/explain-cable'
import { ButtonLink } from '@/components/button'
import { CutCautions } from '@/components/cautions'
import { Length } from '@/components/length'
import { Page } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { Working } from '@/features/cut-list/working'
import { useSession } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'
import { inputOf } from '../calculation-input'
import { lengthFormat } from '../length-format'
import { paths } from '../paths'
import { useSurveyData } from '../survey-session'

/** The working of one cut length: no number without its reason. */
export function Component() {
  const { surveyId = '', run = '', cable = '' } = useParams()
  const { company } = useSession()
  const { data, error, retry } = useSurveyData(surveyId)
  if (error) {
    return (
      <Page title="Working">
        <ErrorNote message={messageOf(error)} onRetry={retry} />
      </Page>
    )
  }
  if (!data) return <Loading what="the working" />
  const { survey } = data.record
  const working = explainCable(inputOf(data), { run, cable: Number(cable) })
  return (
    <Page
      title={`Cable ${run}-${cable}`}
      width="narrow"
      above={<Link to={paths.cutList(surveyId)}>Cut list of {survey.title}</Link>}
    >
      {working ? (
        <div className="flex flex-col gap-4">
          {working.result.cut === undefined ? null : (
            <Length
              value={working.result.cut}
              format={lengthFormat(survey.units, company.fraction)}
              look="computed"
              className="text-3xl font-semibold"
            />
          )}
          <Working working={working} units={survey.units} />
          <CutCautions />
        </div>
      ) : (
        <EmptyState
          title="There is no such cable"
          action={<ButtonLink to={paths.cutList(surveyId)}>To the cut list</ButtonLink>}
        >
          The survey has changed since this link was made.
        </EmptyState>
      )}
    </Page>
  )
}
