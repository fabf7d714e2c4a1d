import type { BayCheck } from '@shared/calculation/checks/check-bay'
import type { RunCheck } from '@shared/calculation/checks/check-run'
import { topSphere } from '@shared/calculation/checks/findings/bay-check-findings'
import { BayPicture } from './bay-picture'
import type { CheckContext } from './context'
import { FigureList } from './figure-list'
import { infillLines, pushLines, wireLines } from './load-lines'
import { openingLines, spanLines, triangleLines } from './opening-lines'
import { foundAt } from './verdict'

interface BaySectionProps {
  bay: BayCheck
  run: RunCheck
  context: CheckContext
  /** Of the guard here, of the post the bay begins at and of the cable, nm. */
  sizes: { guardHeight: number; postWidth: number; diameter: number }
}

/** One bay: its opening picture and the figures an inspector asks for. */
export function BaySection({ bay, run, context, sizes }: BaySectionProps) {
  const { checks, format } = context
  const found = foundAt(checks.findings, { run: run.run, bay: bay.bay })
  const holds = {
    between: !found.has('opening-between'),
    bottom: !found.has('opening-bottom'),
    top: !found.has('opening-top'),
    triangle: !found.has('opening-stair-triangle'),
  }
  const upper = topSphere(bay, checks.guard)
  return (
    <section aria-label={`Bay ${bay.bay}`} className="flex flex-col gap-3">
      <h3 className="font-semibold">
        Bay {bay.bay}
        {bay.isStair ? ', stair' : ''}
      </h3>
      <div className="grid items-start gap-4 lg:grid-cols-2">
        <BayPicture bay={bay} run={run} {...sizes} topSphere={upper} format={format} holds={holds} />
        <FigureList
          lines={[
            ...openingLines(bay, found, context),
            ...spanLines(bay, found, context),
            ...triangleLines(bay, found, context),
            ...pushLines(bay, found, context),
            ...infillLines(bay, { run, found }, context),
            ...wireLines(bay, { run, found }, context),
          ]}
        />
      </div>
    </section>
  )
}
