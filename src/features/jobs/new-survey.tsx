import type { FormEvent } from 'react'
import { Button } from '@/components/button'
import { TextField } from '@/components/field'
import { ErrorNote } from '@/components/states'
import { useFirstFault } from '@/components/use-first-fault'
import { fieldError } from '@/lib/api-error'
import { formMessage } from '@/lib/form-message'
import { useAddSurvey } from './api/add-survey'
import { ImportSurvey } from './import-survey'

interface NewSurveyProps {
  jobId: string
  onBegun: (surveyId: string) => void
}

/** Begins a survey by its title, or from a survey file. */
export function NewSurvey({ jobId, onBegun }: NewSurveyProps) {
  const add = useAddSurvey(jobId)
  const form = useFirstFault(add.error)
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const title = new FormData(event.currentTarget).get('title')
    add.mutate(typeof title === 'string' ? title.trim() : '', { onSuccess: ({ id }) => onBegun(id) })
  }
  const message = formMessage(add.error, ['title'])
  return (
    <div className="flex flex-col gap-6">
      <form ref={form} onSubmit={submit} className="flex flex-col gap-3">
        <TextField
          label="Title"
          name="title"
          required
          maxLength={120}
          hint="Such as Back deck"
          error={fieldError(add.error, 'title')}
        />
        {message ? <ErrorNote message={message} /> : null}
        <Button type="submit" look="primary" busy={add.isPending}>
          Begin the survey
        </Button>
      </form>
      <ImportSurvey jobId={jobId} onBegun={onBegun} />
    </div>
  )
}
