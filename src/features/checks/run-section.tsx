import type { RunCheck } from '@shared/calculation/checks/check-run'
import type { Hardware } from '@shared/schemas/hardware'
import type { Survey } from '@shared/schemas/survey'
import { inches } from '@shared/units/length'
import { BaySection } from './bay-section'
import type { CheckContext } from './context'
import { PostSection } from './post-section'
import { RunFigures } from './run-figures'

interface RunSectionProps {
  run: RunCheck
  survey: Survey
  hardware: Hardware
  context: CheckContext
}

/** Where a post's size was not taken: a nominal 4x4. */
const USUAL_POST = inches(3.5)

/** A run: its tension, its bays one by one, and the posts at its ends. */
export function RunSection({ run, survey, hardware, context }: RunSectionProps) {
  const { checks } = context
  const { guard } = survey
  const cable = hardware.cables.find(({ id }) => id === run.cable)
  return (
    <section aria-label={`Run ${run.run}`} className="flex flex-col gap-6">
      <div className="flex flex-col gap-2">
        <h2 className="text-lg font-semibold">Run {run.run}</h2>
        <p className="text-soft">
          {run.heights.length} × {cable?.name ?? run.cable}
        </p>
        <RunFigures run={run} context={context} />
      </div>
      {checks.bays
        .filter((bay) => bay.run === run.run)
        .map((bay) => {
          const from = survey.bays.find(({ id }) => id === bay.bay)?.from
          const sizes = {
            guardHeight: bay.isStair ? (guard.stair?.height ?? guard.height) : guard.height,
            postWidth: survey.posts.find(({ id }) => id === from)?.along ?? USUAL_POST,
            diameter: cable?.diameter ?? 0,
          }
          return <BaySection key={bay.bay} bay={bay} run={run} context={context} sizes={sizes} />
        })}
      <div className="grid gap-6 lg:grid-cols-2">
        {checks.posts
          .filter((post) => post.run === run.run)
          .map((post) => (
            <PostSection
              key={post.post}
              check={post}
              post={survey.posts.find(({ id }) => id === post.post)}
              context={context}
            />
          ))}
      </div>
    </section>
  )
}
