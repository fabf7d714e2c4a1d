import type { Stage } from '@shared/schemas/job'
import { classes } from './classes'
import { TautLine } from './taut-line'

const way: readonly Stage[] = ['measure', 'check', 'price', 'agreed', 'shop', 'fit', 'done']
const last = way.length - 1

/** Seven words do not fit side by side on a phone: there the ends stand, but where they would touch where the job is. */
const isSeenOnPhone = (i: number, at: number): boolean =>
  i === at || ((i === 0 || i === last) && Math.abs(i - at) > 1)

/** Where a job stands: the line is taut as far as the job has come. */
export function StageStepper({ stage }: { stage: Stage }) {
  if (stage === 'lost') return <p className="font-medium text-soft">This job is lost.</p>
  const at = way.indexOf(stage)
  return (
    <div>
      <TautLine share={at / last} />
      <ol className="figures relative mt-1 h-5 text-sm">
        {way.map((step, i) => {
          const share = `${(i / last) * 100}%`
          return (
            <li
              key={step}
              aria-current={step === stage ? 'step' : undefined}
              // At its share of the line, and by as much of its own width to the left: the ends stay inside.
              style={{ left: share, translate: `-${share} 0` }}
              className={classes(
                'absolute top-0 whitespace-nowrap',
                step === stage ? 'font-semibold text-spruce' : i < at ? 'text-ink' : 'text-soft',
                // Out of sight only: the list is spoken whole.
                !isSeenOnPhone(i, at) && 'opacity-0 md:opacity-100',
              )}
            >
              {step}
            </li>
          )
        })}
      </ol>
    </div>
  )
}
