import { useParams } from 'react-router-dom'
import { ErrorNote, Loading } from '@/components/states'
import { messageOf } from '@/lib/api-error'
import { SurveyScreen } from '../survey-screen/survey-screen'
import { useSurveyData } from '../survey-session'

/** The survey on its photo. */
export function Component() {
  const { surveyId = '' } = useParams()
  const { data, error, retry } = useSurveyData(surveyId)
  if (error) {
    return (
      <main className="p-4">
        <ErrorNote message={messageOf(error)} onRetry={retry} />
      </main>
    )
  }
  if (!data) return <Loading what="the survey" />
  return <SurveyScreen key={data.record.id} loaded={data} />
}
