import type { SurveySummary } from '@shared/schemas/survey-record'
import { Button } from '@/components/button'
import { Sheet } from '@/components/sheet'
import { ErrorNote } from '@/components/states'
import { sayDone } from '@/components/toast'
import { messageOf } from '@/lib/api-error'
import { useRemoveSurvey } from './api/remove-survey'

interface RemoveSurveyProps {
  survey: SurveySummary
  onClose: () => void
}

/** The question before a survey is put away, because there is no button that brings it back. */
export function RemoveSurvey({ survey, onClose }: RemoveSurveyProps) {
  const remove = useRemoveSurvey()
  const putAway = () =>
    remove.mutate(survey.id, {
      onSuccess: () => {
        sayDone(`${survey.title} is put away.`)
        onClose()
      },
    })
  return (
    <Sheet
      open
      onOpenChange={onClose}
      place="middle"
      title={`Put away ${survey.title}?`}
      description="It leaves this job and cannot be opened again. To keep a copy, download its survey file first."
    >
      {remove.error ? (
        <div className="mb-4">
          <ErrorNote message={messageOf(remove.error)} />
        </div>
      ) : null}
      <div className="flex flex-wrap gap-2">
        <Button look="danger" busy={remove.isPending} onClick={putAway}>
          Put it away
        </Button>
        <Button onClick={onClose}>Keep it</Button>
      </div>
    </Sheet>
  )
}
