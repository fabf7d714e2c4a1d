import { INK, makeRoom, MARGIN, type Pdf, RULE, SOFT, widthOf, writable } from './page'

export interface PdfColumn<Line> {
  header: string
  /** Share of the width. */
  share: number
  align?: 'left' | 'right'
  value: (line: Line) => string
}

interface PdfTable<Line> {
  title: string
  columns: readonly PdfColumn<Line>[]
  lines: readonly Line[]
  /** Narrower than the page, points. */
  width?: number
}

const SIZE = 8
const GAP = 6

/** A small heading with a rule under it. */
export function heading(pdf: Pdf, text: string, width = widthOf(pdf)): void {
  makeRoom(pdf, 40)
  const { y } = pdf
  pdf
    .font('strong')
    .fontSize(10)
    .fillColor(INK)
    .text(text, MARGIN, y + 7, { width })
  const line = pdf.y + 1
  pdf
    .moveTo(MARGIN, line)
    .lineTo(MARGIN + width, line)
    .lineWidth(0.75)
    .strokeColor(INK)
    .stroke()
  pdf.y = line + 3
}

/** A table whose header is repeated on every page it reaches. */
export function table<Line>(pdf: Pdf, { title, columns, lines, width = widthOf(pdf) }: PdfTable<Line>): void {
  heading(pdf, title, width)
  const shares = columns.reduce((sum, { share }) => sum + share, 0)
  const places = columns.map(({ share }, i) => ({
    x: MARGIN + (width * columns.slice(0, i).reduce((sum, each) => sum + each.share, 0)) / shares,
    width: (width * share) / shares - GAP,
  }))
  const row = (texts: readonly string[], look: 'plain' | 'strong', colour: string) => {
    pdf.font(look).fontSize(SIZE).fillColor(colour)
    const height = Math.max(
      ...texts.map((text, i) => pdf.heightOfString(text, { width: places[i]?.width ?? width })),
    )
    if (pdf.y + height > pdf.page.height - MARGIN - 24) {
      pdf.addPage()
      if (look === 'plain') header()
      pdf.font(look).fontSize(SIZE).fillColor(colour)
    }
    const { y } = pdf
    for (const [i, text] of texts.entries()) {
      const place = places[i]
      if (!place) continue
      const align = columns[i]?.align ?? 'left'
      pdf.text(text, place.x, y, { width: place.width, align, features: ['tnum'] })
    }
    pdf.y = y + height + 2
    pdf
      .moveTo(MARGIN, pdf.y)
      .lineTo(MARGIN + width, pdf.y)
      .lineWidth(0.25)
      .strokeColor(RULE)
      .stroke()
    pdf.y += 2
  }
  const header = () =>
    row(
      columns.map(({ header: text }) => text),
      'strong',
      SOFT,
    )
  header()
  for (const line of lines)
    row(
      columns.map(({ value }) => writable(value(line))),
      'plain',
      INK,
    )
}
