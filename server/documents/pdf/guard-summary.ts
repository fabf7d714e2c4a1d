import { rulesName } from '@shared/calculation/guard-rules/published-rules'
import { CAUTIONS } from '../cautions'
import type { GuardSummaryDocument } from '../guard-summary-document'
import { drawBay } from './guard-summary-drawing'
import { assumptionLines, findingLines } from './guard-summary-lines'
import { guardTable, postTable, runTable } from './guard-summary-tables'
import { finish, makeRoom, MARGIN, newPdf, type Pdf, SOFT, INK, widthOf, writable } from './page'
import { printed } from './quantities'
import { heading } from './table'

/** The page an inspector is handed: what was asked for, what is built, what it was reckoned from, and who decides. */
export function guardSummaryPdf(document: GuardSummaryDocument): Promise<Buffer> {
  const { survey, jobNumber, jobTitle, revision } = document
  const text = {
    title: `Guard summary, job ${jobNumber} ${jobTitle}`,
    foot: `Job ${jobNumber} ${jobTitle}, ${survey.title}, revision ${revision}, ${document.made}. Arithmetic on what was entered: the authority having jurisdiction decides.`,
  }
  const pdf = newPdf(survey.units, text)
  const figures = printed(survey.units)
  head(pdf, document)
  const top = pdf.y
  guardTable(pdf, document, figures)
  const below = pdf.y
  drawBay(pdf, document, { x: MARGIN + widthOf(pdf) * 0.7, y: top + 6, width: widthOf(pdf) * 0.3, figures })
  pdf.y = Math.max(below, pdf.y)
  runTable(pdf, document, figures)
  postTable(pdf, document, figures)
  list(pdf, 'Stops and checks', findingLines(document))
  list(pdf, 'Assumed', assumptionLines(document, figures))
  list(pdf, 'Cautions', CAUTIONS)
  return finish(pdf, text)
}

function head(
  pdf: Pdf,
  { company, jobNumber, jobTitle, survey, revision, made, measured, checks }: GuardSummaryDocument,
) {
  const width = widthOf(pdf)
  pdf
    .font('strong')
    .fontSize(17)
    .fillColor(INK)
    .text('Guard summary', MARGIN, MARGIN, { width: width / 2 })
  pdf
    .font('plain')
    .fontSize(9)
    .text(writable(company), MARGIN + width / 2, MARGIN + 6, { width: width / 2, align: 'right' })
  pdf.y = MARGIN + 24
  const line = (text: string, colour = INK) =>
    pdf.font('plain').fontSize(9).fillColor(colour).text(writable(text), MARGIN, pdf.y, { width })
  line(`Job ${jobNumber}, ${jobTitle}. Survey ${survey.title}, revision ${revision}, printed ${made}.`)
  line(
    measured.length === 0
      ? 'Nothing was measured yet.'
      : `Measured by ${measured.map(({ by, from, to }) => `${by} (${from === to ? from : `${from} to ${to}`})`).join(', ')}.`,
    SOFT,
  )
  const { rules } = checks.guard
  pdf.moveDown(0.3)
  pdf.font('strong').fontSize(10).fillColor(INK)
  pdf.text(
    rules
      ? `Guard rules: ${writable(rulesName(rules))}. Confirm with the authority having jurisdiction.`
      : `Guard rules: ${writable(survey.guard.rules)}, not known here. Ask the authority having jurisdiction.`,
    MARGIN,
    pdf.y,
    { width },
  )
}

function list(pdf: Pdf, title: string, lines: readonly string[]): void {
  heading(pdf, title)
  pdf.font('plain').fontSize(8).fillColor(INK)
  for (const text of lines) {
    const options = { width: widthOf(pdf) - 10 }
    makeRoom(pdf, pdf.heightOfString(writable(text), options) + 2)
    const { y } = pdf
    pdf.text('–', MARGIN, y, { lineBreak: false })
    pdf.text(writable(text), MARGIN + 10, y, options)
    pdf.y += 1.5
  }
}
