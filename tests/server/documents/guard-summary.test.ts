import { describe, expect, it } from 'vitest'
import { starterHardware } from '@shared/calculation/starter-hardware'
import { starterRules } from '@shared/calculation/starter-rules'
import type { CalculationInput } from '@shared/calculation/survey-index'
import { readSurveyFile } from '@shared/schemas/survey-file'
import { guardSummaryPdf } from '../../../server/documents/pdf/guard-summary'
import { guardSummaryDocument } from '../../factories/guard-summary-document'
import { pdfText } from '../../support/pdf-text'

const post = (id: string) => ({ id, material: 'softwood', along: 3.5, across: 3.5 })
const bay = (id: string, [from, to]: [string, string], value: number, more: object = {}) => ({
  id,
  from,
  to,
  readings: [{ id: 'r1', at: 'top', value }],
  ...more,
})
const deck = (
  more: { guard?: object; spacing?: number; stair?: boolean; overruled?: object[] } = {},
): CalculationInput => {
  const { survey } = readSurveyFile({
    survey: {
      format: 'tautbook.survey',
      version: 1,
      units: { length: 'in', force: 'lbf' },
      title: 'Back deck',
      guard: { railTies: true, fall: 60, ...more.guard },
      posts: ['P1', 'P2', 'P3', 'P4'].map(post),
      bays: [
        bay('B1', ['P1', 'P2'], 46.5),
        bay('B2', ['P2', 'P3'], 44),
        bay('B3', ['P3', 'P4'], 60, { kind: 'stair', rise: 7.5, going: 10 }),
      ],
      runs: [
        {
          id: 'R1',
          bays: ['B1', 'B2'],
          cable: 'c532',
          cables: { layout: 'fixed', spacing: more.spacing ?? 3 },
        },
        ...(more.stair ? [{ id: 'R2', bays: ['B3'], cable: 'c532' }] : []),
      ],
      corners: [{ post: 'P3', angle: 90 }],
      overruled: more.overruled ?? [],
    },
  })
  return { survey, hardware: starterHardware, rules: starterRules }
}
const pagesOf = async (input: CalculationInput) => pdfText(await guardSummaryPdf(guardSummaryDocument(input)))

describe('the guard summary', () => {
  it('is one page with what an inspector asks for, read back by a second library', async () => {
    const pages = await pagesOf(deck())
    expect(pages).toHaveLength(1)
    const [text = ''] = pages
    // Heights and openings as asked and as built: 36 in; 3 in pitch less 5/32 in of cable is 2 27/32 in.
    for (const said of [
      'Guard summary',
      'Job 1042, Back deck',
      'revision 7',
      '2026-05-14 10:12 UTC',
      'Measured by Imre (2026-05-04 to 2026-05-05)',
      'International Residential Code 2021. Confirm with the authority having jurisdiction.',
      'R312.1.2',
      'R312.1.3',
      'Table R301.5',
      '36"',
      '2 27/32"',
      '46 1/2"',
      '11 × 5/32 in 7x7 stainless',
      '150 lbf',
      // Eleven cables of 150 lbf.
      '1650 lbf',
      'held by the rail',
      'Southern Pine No. 2: Fb 1100 psi',
      '1100 psi',
      'No US code sets a force for the sphere',
      'Guards are life-safety parts',
      'Never tension past the limit',
      'Page 1 of 1',
    ]) {
      expect(text).toContain(said)
    }
    expect(text).not.toMatch(/NaN|undefined|Infinity|\bnull\b/)
  })

  it('says stops with their rule, and who let one pass and why', async () => {
    const [stopped = ''] = await pagesOf(deck({ guard: { height: 35, topRailUnderside: 33.5 } }))
    expect(stopped).toContain('STOP: The guard is 35 in high, the rules ask for 36 in')
    const { findings } = guardSummaryDocument(deck({ guard: { height: 35, topRailUnderside: 33.5 } }))
    const { code, where, text } = findings.find(({ finding }) => finding.code === 'guard-too-low')!.finding
    const overrule = {
      code,
      where,
      text,
      reason: 'A planter stands there',
      by: 'Tamsin',
      on: '2026-05-06T08:00:00Z',
    }
    const overruled = deck({ guard: { height: 35, topRailUnderside: 33.5 }, overruled: [overrule] })
    expect((await pagesOf(overruled)).join(' ')).toContain(
      'Overruled by Tamsin on 2026-05-06: A planter stands there',
    )
    const changed = deck({ guard: { height: 34, topRailUnderside: 32.5 }, overruled: [overrule] })
    expect((await pagesOf(changed)).join(' ')).toContain('with other numbers, which no longer counts')
  })

  it('has the stair figures where there are stairs, and says what is from memory', async () => {
    const text = (await pagesOf(deck({ stair: true, guard: { rules: 'irc-2024' } }))).join(' ')
    expect(text).toContain('Stair triangle, no sphere of 6"')
    expect(text).toContain('R321.1.3 (from memory: check the text)')
  })

  it('goes on to another page when it must, with every page numbered', async () => {
    const input = deck()
    const many = Array.from({ length: 60 }, (_, i) => i)
    const survey = {
      ...input.survey,
      runs: many.map((i) => ({ ...input.survey.runs[0]!, id: `R${i + 1}` })),
    }
    const pages = await pagesOf({ ...input, survey })
    expect(pages.length).toBeGreaterThan(1)
    for (const [i, text] of pages.entries()) expect(text).toContain(`Page ${i + 1} of ${pages.length}`)
  })

  it('says so where nothing was measured and where the rules are not known', async () => {
    const input = deck({ guard: { rules: 'nowhere' } })
    const survey = { ...input.survey, runs: [] }
    const document = guardSummaryDocument({ ...input, survey }, { measured: [] })
    const text = (await pdfText(await guardSummaryPdf(document))).join(' ')
    expect(text).toContain('Nothing was measured yet.')
    expect(text).toContain('not known here')
    expect(text).not.toMatch(/NaN|undefined/)
  })
})
