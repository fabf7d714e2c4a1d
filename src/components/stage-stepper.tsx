import type { Stage } from '@shared/schemas/job'
import { classes } from './classes'
import { TautLine } from './taut-line'

const way: readonly Stage[] = ['measure', 'check', 'price', 'agreed', 'shop', 'fit', 'done']

/** Where a job stands: the line is taut as far as the job has come. */
export function StageStepper({ stage }: { stage: Stage }) {
  if (stage === 'lost') return <p className="font-medium text-soft">This job is lost.</p>
  const at = way.indexOf(stage)
  return (
    <div>
      <TautLine share={at / (way.length - 1)} />
      <ol className="figures mt-1 flex justify-between text-xs md:text-sm">
        {way.map((step, i) => (
          <li
            key={step}
            aria-current={step === stage ? 'step' : undefined}
            className={classes(
              step === stage ? 'font-semibold text-spruce' : i < at ? 'text-ink' : 'text-soft',
            )}
          >
            {step}
          </li>
        ))}
      </ol>
    </div>
  )
}
