import type { BayCheck } from '@shared/calculation/checks/check-bay'
import type { GuardSummaryDocument } from '../guard-summary-document'
import { INK, type Pdf, RULE, SOFT } from './page'
import type { Printed } from './quantities'

interface Place {
  x: number
  y: number
  width: number
  figures: Printed
}

/** The bay with the widest opening between two cables. */
const widestBay = (bays: readonly BayCheck[]): BayCheck | undefined =>
  bays
    .filter(({ openings, isStair }) => openings.between !== undefined && !isStair)
    .sort((a, b) => (b.openings.between ?? 0) - (a.openings.between ?? 0))[0]

const POST = 88.9e6

/** One level bay to scale, its cables and the sphere that must not pass; nothing where there is none. */
export function drawBay(pdf: Pdf, document: GuardSummaryDocument, { x, y, width, figures }: Place): void {
  const { checks, survey } = document
  const bay = widestBay(checks.bays)
  const heights = checks.runs.find(({ run }) => run === bay?.run)?.heights
  if (!bay || !heights) return
  const { guard } = survey
  const rail = guard.topRailUnderside ?? guard.height - 38.1e6
  const scale = Math.min((width - 4) / (bay.length + 2 * POST), 96 / guard.height)
  const floor = y + guard.height * scale
  const left = x + (width - (bay.length + 2 * POST) * scale) / 2
  const inner = left + POST * scale
  const at = (height: number) => floor - height * scale
  pdf.lineWidth(0.6).strokeColor(INK)
  for (const post of [left, inner + bay.length * scale]) {
    pdf.rect(post, at(rail), POST * scale, rail * scale).stroke()
  }
  pdf.rect(left, y, (bay.length + 2 * POST) * scale, (guard.height - rail) * scale).stroke()
  pdf
    .moveTo(x, floor)
    .lineTo(x + width, floor)
    .stroke()
  pdf.lineWidth(0.4).strokeColor(RULE)
  for (const height of heights) {
    pdf
      .moveTo(inner, at(height))
      .lineTo(inner + bay.length * scale, at(height))
      .stroke()
  }
  const lower = heights[(bay.openings.above ?? 1) - 1] ?? 0
  const upper = heights[bay.openings.above ?? 1] ?? lower
  pdf.lineWidth(0.8).strokeColor(INK)
  pdf.circle(inner + (bay.length * scale) / 2, at((lower + upper) / 2), (bay.sphere / 2) * scale).stroke()
  pdf.font('plain').fontSize(7.5).fillColor(SOFT)
  pdf.text(
    `Bay ${bay.bay} to scale: widest opening ${figures.length(bay.openings.between)}, the sphere of ${figures.length(bay.sphere)} in it.`,
    x,
    floor + 4,
    { width, align: 'center' },
  )
}
