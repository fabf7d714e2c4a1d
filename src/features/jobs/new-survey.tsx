import { type FormEvent, useState } from 'react'
import { Button } from '@/components/button'
import { TextField } from '@/components/field'
import { ErrorNote } from '@/components/states'
import { fieldError, messageOf } from '@/lib/api-error'
import { ApiError } from '@/lib/api-error'
import { useAddSurvey, useImportSurvey } from './api/add-survey'

interface NewSurveyProps {
  jobId: string
  onBegun: (surveyId: string) => void
}

/** Begins a survey by its title, or from a survey file. */
export function NewSurvey({ jobId, onBegun }: NewSurveyProps) {
  const add = useAddSurvey(jobId)
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const title = new FormData(event.currentTarget).get('title')
    add.mutate(typeof title === 'string' ? title.trim() : '', { onSuccess: ({ id }) => onBegun(id) })
  }
  return (
    <div className="flex flex-col gap-6">
      <form onSubmit={submit} className="flex flex-col gap-3">
        {add.error ? <ErrorNote message={messageOf(add.error)} /> : null}
        <TextField
          label="Title"
          name="title"
          required
          maxLength={120}
          hint="Such as Back deck"
          error={fieldError(add.error, 'title')}
        />
        <Button type="submit" look="primary" busy={add.isPending}>
          Begin the survey
        </Button>
      </form>
      <ImportSurvey jobId={jobId} onBegun={onBegun} />
    </div>
  )
}

function ImportSurvey({ jobId, onBegun }: NewSurveyProps) {
  const [unreadable, setUnreadable] = useState<string>()
  const bring = useImportSurvey(jobId)
  const read = async (file: File | undefined) => {
    if (!file) return
    setUnreadable(undefined)
    try {
      bring.mutate(JSON.parse(await file.text()) as unknown)
    } catch {
      setUnreadable(
        `${file.name} is no survey file: it is not readable as JSON. Export it again where it came from.`,
      )
    }
  }
  const faults = bring.error instanceof ApiError ? bring.error.fields : []
  return (
    <section aria-label="From a survey file" className="flex flex-col gap-3 border-t border-rule pt-4">
      <label className="text-sm font-medium text-soft">
        Or from a survey file (JSON, at most 2 MB)
        <input
          type="file"
          accept="application/json,.json"
          className="mt-1 block min-h-12 w-full py-2"
          onChange={(event) => void read(event.target.files?.[0])}
        />
      </label>
      {bring.isPending ? <p role="status">Checking the file …</p> : null}
      {unreadable ? <ErrorNote message={unreadable} /> : null}
      {bring.error ? <ErrorNote message={`${messageOf(bring.error)} Nothing was imported.`} /> : null}
      {faults.length > 0 ? (
        <ul className="figures list-disc pl-5 text-sm">
          {faults.map(({ path, message }) => (
            <li key={`${path} ${message}`}>
              {path ? `${path}: ` : ''}
              {message}
            </li>
          ))}
        </ul>
      ) : null}
      {bring.data ? (
        <div role="status" className="flex flex-col gap-2">
          <p className="font-medium">Imported as {bring.data.survey.survey.title}.</p>
          <ul className="list-disc pl-5 text-sm">
            {bring.data.notes.map((note) => (
              <li key={note}>{note}</li>
            ))}
          </ul>
          <Button look="primary" onClick={() => onBegun(bring.data.survey.id)}>
            Open it
          </Button>
        </div>
      ) : null}
    </section>
  )
}
