import { useQueryClient } from '@tanstack/react-query'
import type { Finding } from '@shared/schemas/finding'
import type { SurveyRecord } from '@shared/schemas/survey-record'
import type { SurveyOperation } from '@shared/survey/survey-operation'
import { sayProblem } from '@/components/toast'
import type { Overruler } from '@/features/findings/judged-finding'
import { useMay, useSession } from '@/features/session/session'
import { changeSurvey } from '@/features/surveys/api/change-survey'
import { surveyQuery } from '@/features/surveys/api/read-survey'
import { ApiError, messageOf } from '@/lib/api-error'

/** Lets stops of a survey pass and makes them stand again; undefined for those who may not. */
export function useOverruler({ id, revision }: SurveyRecord): Overruler | undefined {
  const queries = useQueryClient()
  const { person } = useSession()
  const may = useMay('finding:overrule')
  const send = async (operation: SurveyOperation): Promise<boolean> => {
    let kept = true
    try {
      await changeSurvey(id, { revision, changes: [{ id: crypto.randomUUID(), operation }] })
    } catch (error) {
      kept = false
      sayProblem(
        error instanceof ApiError && error.code === 'survey-moved'
          ? 'Somebody changed the survey meanwhile. It was read again: look whether the stop is still the same, and try once more.'
          : messageOf(error),
      )
    }
    await queries.invalidateQueries({ queryKey: surveyQuery(id).queryKey })
    return kept
  }
  if (!may) return undefined
  return {
    overrule: ({ code, where, text }: Finding, reason) =>
      send({ type: 'stop.overrule', overrule: { code, where, text, reason, by: person.name } }),
    uphold: ({ code, where }) => send({ type: 'stop.uphold', code, where }),
  }
}
