import { type ChangeEvent, useState } from 'react'
import { Button } from '@/components/button'
import { Field } from '@/components/field'
import { ErrorNote } from '@/components/states'
import { ApiError, messageOf } from '@/lib/api-error'
import { useImportSurvey } from './api/import-survey'

interface ImportSurveyProps {
  jobId: string
  onBegun: (surveyId: string) => void
}

/** Begins a survey from a survey file; a refused file's faults are all listed, and nothing of it is kept. */
export function ImportSurvey({ jobId, onBegun }: ImportSurveyProps) {
  const [unreadable, setUnreadable] = useState<string>()
  const [name, setName] = useState('')
  const bring = useImportSurvey(jobId)
  const read = async ({ target }: ChangeEvent<HTMLInputElement>) => {
    const file = target.files?.[0]
    if (!file) return
    setName(file.name)
    setUnreadable(undefined)
    bring.reset()
    try {
      bring.mutate(JSON.parse(await file.text()) as unknown)
    } catch {
      setUnreadable(
        `${file.name} is no survey file: it cannot be read as JSON. Export it again where it came from. Nothing was imported.`,
      )
    }
    // So that the same file, mended, can be chosen again.
    target.value = ''
  }
  return (
    <section aria-label="From a survey file" className="flex flex-col gap-3 border-t border-rule pt-4">
      <Field label="Or from a survey file" hint="A JSON file of at most 2 MB, as Tautbook writes it.">
        {(control) => (
          <input
            {...control}
            type="file"
            accept="application/json,.json"
            className={
              'min-h-12 w-full text-transparent file:mr-3 file:min-h-12 file:rounded file:border file:border-steel ' +
              'file:bg-card file:px-4 file:font-medium file:text-ink'
            }
            onChange={(event) => void read(event)}
          />
        )}
      </Field>
      {bring.isPending ? <p role="status">Checking {name} …</p> : null}
      {unreadable ? <ErrorNote message={unreadable} /> : null}
      {bring.error ? <Refused error={bring.error} name={name} /> : null}
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

function Refused({ error, name }: { error: Error; name: string }) {
  const faults = error instanceof ApiError ? error.fields : []
  return (
    <>
      <ErrorNote message={`${name}: ${messageOf(error)}`} />
      <ul aria-label="What is wrong in the file" className="figures list-disc pl-5 text-sm">
        {faults.map(({ path, message }) => (
          <li key={`${path} ${message}`}>
            {path ? `${path}: ` : ''}
            {message}
          </li>
        ))}
      </ul>
    </>
  )
}
