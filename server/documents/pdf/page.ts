import { createRequire } from 'node:module'
import PDFDocument from 'pdfkit'
import type { Units } from '@shared/schemas/quantities'

export type Pdf = PDFKit.PDFDocument

const fontFile = (weight: 400 | 600): string =>
  createRequire(import.meta.url).resolve(`@fontsource/barlow/files/barlow-latin-${weight}-normal.woff`)

export const MARGIN = 40
export const INK = '#111111'
export const SOFT = '#444444'
export const RULE = '#999999'

interface PageText {
  title: string
  /** At the foot of every page, beside its number. */
  foot: string
}

/** A document of Letter or A4 pages by the survey's units, black on white, in the program's own face. */
export function newPdf({ length }: Units, { title }: PageText): Pdf {
  const pdf = new PDFDocument({
    size: length === 'in' ? 'LETTER' : 'A4',
    margin: MARGIN,
    bufferPages: true,
    info: { Title: title, Creator: 'Tautbook' },
  })
  pdf.registerFont('plain', fontFile(400))
  pdf.registerFont('strong', fontFile(600))
  return pdf.font('plain').fontSize(9).fillColor(INK)
}

/** The inner width of a page, points. */
export const widthOf = (pdf: Pdf): number => pdf.page.width - 2 * MARGIN

/** What of the face's latin cut is missing is written with what it has. */
export const writable = (text: string): string =>
  text.replaceAll('≈ ', '').replaceAll('⁻⁶', '^-6').replaceAll('→', 'to')

/** Goes to a new page when less than this is left, points. */
export function makeRoom(pdf: Pdf, height: number): void {
  if (pdf.y + height > pdf.page.height - MARGIN - FOOT) pdf.addPage()
}

const FOOT = 22

/** Numbers the pages and ends the document. @returns its bytes */
export function finish(pdf: Pdf, { foot }: PageText): Promise<Buffer> {
  const chunks: Buffer[] = []
  const done = new Promise<Buffer>((resolve, reject) => {
    pdf.on('data', (chunk: Buffer) => chunks.push(chunk))
    pdf.on('end', () => resolve(Buffer.concat(chunks)))
    pdf.on('error', reject)
  })
  const { start, count } = pdf.bufferedPageRange()
  for (let page = start; page < start + count; page += 1) {
    pdf.switchToPage(page)
    // Below the margin no text would be taken.
    pdf.page.margins.bottom = 0
    const y = pdf.page.height - MARGIN - 12
    pdf.font('plain').fontSize(7.5).fillColor(SOFT)
    pdf.text(writable(foot), MARGIN, y, { width: widthOf(pdf) - 70, lineBreak: false, ellipsis: true })
    pdf.text(`Page ${page - start + 1} of ${count}`, MARGIN, y, { width: widthOf(pdf), align: 'right' })
  }
  pdf.end()
  return done
}
