import ExcelJS from 'exceljs'
import readWorkbook from 'read-excel-file/node'
import { format } from 'ssf'
import { describe, expect, it } from 'vitest'
import type { CutListDocument } from '../../../server/documents/cut-list-document'
import { cutListWorkbook } from '../../../server/documents/xlsx/cut-list-workbook'
import { inches, millimetres } from '@shared/units/length'
import { cutListDocument } from '../../factories/cut-list-document'
import { workedExample } from '../../factories/worked-example'

/** What a reader of another make finds, sheet by sheet. */
async function readBack(document: CutListDocument) {
  const sheets = await readWorkbook(await cutListWorkbook(document))
  return new Map(sheets.map(({ sheet, data }) => [sheet, data]))
}

async function setUp(document: CutListDocument, name = 'Cut list') {
  const workbook = new ExcelJS.Workbook()
  const bytes = await cutListWorkbook(document)
  await workbook.xlsx.load(bytes as unknown as ArrayBuffer)
  const sheet = workbook.getWorksheet(name)
  if (!sheet) throw new Error(`No sheet ${name}`)
  return sheet
}

describe('the workbook of the worked example', () => {
  it('holds the lengths the issue states, as numbers', async () => {
    const sheets = await readBack(cutListDocument(workedExample()))
    expect([...sheets.keys()]).toEqual(['Cut list', 'Fittings to pick', 'Findings'])
    const [header, ...rows] = sheets.get('Cut list') ?? []
    expect(header?.slice(0, 6)).toEqual([
      'Run',
      'Cable',
      'Height (in)',
      'Mode',
      'Cut or shop length (in)',
      'In feet and inches',
    ])
    const cables = rows.filter((row) => row[0] === 'R1')
    expect(cables).toHaveLength(11)
    expect(cables[0]?.[2]).toBe(2.875)
    expect(cables[10]?.[2]).toBe(31.625)
    expect(cables[9]?.slice(3, 7)).toEqual(['shop', 95.75, `7' 11 3/4"`, null])
    expect(cables[10]?.[4]).toBe(95.8125)
    expect(cables[9]?.[10]).toBeCloseTo(0.3714951, 6)
    expect(cables[9]?.[11]).toBeCloseTo(0.5150783, 6)
    expect(cables[9]?.[12]).toBe(1.275)
  })

  it('counts two fittings per cable and adds up the cable', async () => {
    const sheets = await readBack(cutListDocument(workedExample()))
    const [, fitting, cable] = sheets.get('Fittings to pick') ?? []
    const total = (sheets.get('Cut list') ?? []).slice(1, 12).reduce((sum, row) => sum + Number(row[4]), 0)
    expect(fitting?.slice(0, 4)).toEqual(['fitting', 'F1', 'Drilled, 1 1/2 in body', 22])
    expect(cable?.slice(0, 4)).toEqual(['cable', 'c532', '5/32 7x7 316', 11])
    expect(cable?.[4]).toBe(total)
  })

  it('has findings as rows, or says that there is none', async () => {
    const none = (await readBack(cutListDocument(workedExample(), { findings: [] }))).get('Findings') ?? []
    expect(none.at(-2)?.[0]).toBe('Nothing was noticed.')
    const input = workedExample()
    input.survey.bays[1]!.readings = []
    const [, first] = (await readBack(cutListDocument(input))).get('Findings') ?? []
    expect(first?.slice(0, 2)).toEqual(['stop', 'R1'])
    expect(first?.[4]).toMatch(/bay B2 has no reading/)
  })

  it('says of a cable without a length why it has none', async () => {
    const input = workedExample()
    input.survey.bays[1]!.readings = []
    const rows = (await readBack(cutListDocument(input))).get('Cut list') ?? []
    expect(rows[1]?.[3]).toBe('none')
    expect(rows[1]?.[4]).toBeNull()
    expect(rows[1]?.[13]).toMatch(/a reading or size is missing/)
  })
})

describe('how lengths are shown', () => {
  it('shows fractions in lowest terms, as a second library displays them, and decimals where none is exact', async () => {
    const cut = async (document: CutListDocument) => (await setUp(document)).getCell('E11')
    const shown = ({ numFmt, value }: { numFmt: string; value: unknown }): string =>
      format(numFmt, Number(value)).replace(/\s+/g, ' ').trim()
    // Cable 10 of the worked example: 95 3/4 in; with a finer step 95 47/64 in.
    expect(shown(await cut(cutListDocument(workedExample())))).toBe('95 3/4')
    const fine = workedExample()
    fine.rules = { ...fine.rules, cutStep: inches(1 / 64) }
    expect(shown(await cut(cutListDocument(fine)))).toBe('95 47/64')
    const odd = workedExample()
    odd.rules = { ...odd.rules, cutStep: millimetres(1) }
    // 2432 mm are 95.7480 in.
    expect(shown(await cut(cutListDocument(odd)))).toBe('95.7480')
  })

  it('writes plain millimetres for a metric survey', async () => {
    const input = workedExample()
    input.survey.units = { length: 'mm', force: 'N' }
    input.rules = { ...input.rules, cutStep: millimetres(1) }
    const document = cutListDocument(input)
    expect((await setUp(document)).getCell('E2').numFmt).toBe('0.0')
    const row = ((await readBack(document)).get('Cut list') ?? [])[10]
    // Base + U of cable 10: 95.5895833 + 0.1435832 in = 2431.6224 mm, rounded up to the millimetre.
    expect(row?.[4]).toBe(2432)
  })
})

describe('print set-up', () => {
  it('is landscape, one page wide, with a frozen and repeated header and drawn widths', async () => {
    for (const name of ['Cut list', 'Fittings to pick', 'Findings']) {
      const sheet = await setUp(cutListDocument(workedExample()), name)
      expect(sheet.pageSetup).toMatchObject({ orientation: 'landscape', fitToPage: true, fitToWidth: 1 })
      expect(sheet.pageSetup.fitToHeight).toBe(0)
      expect(sheet.pageSetup.printTitlesRow).toBe('1:1')
      expect(sheet.views[0]).toMatchObject({ state: 'frozen', ySplit: 1 })
      expect(sheet.columns.every(({ width }) => (width ?? 0) >= 5 && (width ?? 0) <= 92)).toBe(true)
    }
  })

  it('names job, date, page and caution within the 255 characters a spreadsheet takes', async () => {
    const long = cutListDocument(workedExample(), {
      jobTitle: '&'.repeat(120),
      surveyTitle: '&P'.repeat(60),
      company: '&&'.repeat(60),
    })
    const { oddHeader, oddFooter } = (await setUp(long)).headerFooter
    expect(oddHeader?.length).toBeLessThanOrEqual(255)
    expect(oddFooter?.length).toBeLessThanOrEqual(255)
    const { headerFooter } = await setUp(cutListDocument(workedExample(), { jobTitle: 'Ash & Elm' }))
    expect(headerFooter.oddHeader).toContain('Job 1042  Ash && Elm')
    const minus = await setUp(cutListDocument(workedExample(), { jobTitle: '-Ash' }))
    expect(minus.headerFooter.oddHeader).toContain('Job 1042  -Ash')
    expect(headerFooter.oddHeader).toContain('2026-05-14')
    expect(headerFooter.oddFooter).toContain('Page &P of &N')
    expect(headerFooter.oddFooter).toMatch(/licensed engineer/)
  })
})

describe('text that a spreadsheet could run', () => {
  it('is made harmless in every sheet', async () => {
    const input = workedExample()
    input.hardware.cables[0]!.name = '=HYPERLINK("http://example.com")'
    input.hardware.fittings[0]!.name = '@SUM(A1)'
    const sheets = await readBack(cutListDocument(input))
    expect(sheets.get('Cut list')?.[1]?.[7]).toBe('\'=HYPERLINK("http://example.com")')
    expect(sheets.get('Fittings to pick')?.[1]?.[2]).toBe("'@SUM(A1)")
    const sheet = await setUp(cutListDocument(input))
    expect(sheet.getCell('H2').formula).toBeUndefined()
  })
})
