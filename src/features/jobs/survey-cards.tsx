import type { SurveySummary } from '@shared/schemas/survey-record'
import { Button, ButtonLink } from '@/components/button'

interface SurveyCardsProps {
  surveys: readonly SurveySummary[]
  thumbnailOf: (photoId: string) => string
  paths: {
    survey: (id: string) => string
    cutList: (id: string) => string
    findings: (id: string) => string
    surveyTable: (id: string) => string
  }
  /** Address of the survey file. */
  fileOf: (surveyId: string) => string
  /** Asks whether to put a survey away; left out for those who may not. */
  onRemove?: (survey: SurveySummary) => void
}

const count = (number: number, one: string, more: string): string => `${number} ${number === 1 ? one : more}`

/** A job's surveys: what each shows, what it misses, and where to go. */
export function SurveyCards({ surveys, thumbnailOf, paths, fileOf, onRemove }: SurveyCardsProps) {
  return (
    <ul className="grid gap-3 md:grid-cols-2 lg:grid-cols-1 xl:grid-cols-2">
      {surveys.map((survey) => {
        const { id, title, posts, bays, gaps, thumbnailPhotoId } = survey
        return (
          <li key={id} className="flex flex-col overflow-hidden rounded border border-rule bg-card">
            {thumbnailPhotoId ? (
              <img
                src={thumbnailOf(thumbnailPhotoId)}
                alt=""
                loading="lazy"
                className="aspect-[5/2] w-full object-cover"
              />
            ) : null}
            <div className="flex flex-1 flex-col gap-3 p-4">
              <div>
                <h3 className="text-lg font-semibold">{title}</h3>
                <p className="text-soft">
                  {count(posts, 'post', 'posts')}, {count(bays, 'bay', 'bays')} ·{' '}
                  {gaps === 0 ? 'nothing missing' : count(gaps, 'thing missing', 'things missing')}
                </p>
              </div>
              <div className="mt-auto flex flex-wrap gap-2">
                <ButtonLink look="primary" to={paths.survey(id)} aria-label={`Open survey ${title}`}>
                  Open survey
                </ButtonLink>
                <ButtonLink to={paths.cutList(id)} aria-label={`Cut list of ${title}`}>
                  Cut list
                </ButtonLink>
                <ButtonLink to={paths.findings(id)} look="quiet" aria-label={`Findings of ${title}`}>
                  Findings
                </ButtonLink>
                <ButtonLink to={paths.surveyTable(id)} look="quiet" aria-label={`Table of ${title}`}>
                  Table
                </ButtonLink>
                <a
                  href={fileOf(id)}
                  download
                  className="inline-flex min-h-12 items-center px-3 font-medium text-spruce"
                  aria-label={`Survey file of ${title}`}
                >
                  Survey file
                </a>
                {onRemove ? (
                  <Button
                    look="quiet"
                    onClick={() => onRemove(survey)}
                    aria-label={`Put away survey ${title}`}
                  >
                    Put away
                  </Button>
                ) : null}
              </div>
            </div>
          </li>
        )
      })}
    </ul>
  )
}
