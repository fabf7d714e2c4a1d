import { describe, expect, it } from 'vitest'
import { findRules, publishedRules, ruleBehind } from '@shared/calculation/guard-rules/published-rules'
import type { Basis, GuardRules } from '@shared/schemas/guard-rules'
import { guardRulesSchema } from '@shared/schemas/guard-rules'
import { toPoundsForce } from '@shared/units/force'
import { toInches, toMillimetres } from '@shared/units/length'

const rulesOf = (id: string): GuardRules => {
  const rules = findRules(id)
  if (!rules) throw new Error(`no rules ${id}`)
  return rules
}
const inch = (figure: { value: number } | undefined) => toInches(figure?.value ?? NaN)
const mm = (figure: { value: number } | undefined) => toMillimetres(figure?.value ?? NaN)
const heights = ({ situations }: GuardRules, unit = mm) =>
  Object.fromEntries(situations.map(({ id, height }) => [id, unit(height)]))

// Section *Guards* of the check values, row by row; the source of each row is the section asserted with it.
describe.each(['irc-2018', 'irc-2021', 'irc-2024'])('%s', (id) => {
  const irc = rulesOf(id)
  const is2024 = id === 'irc-2024'

  it('asks for a guard above 30 in of fall: R312.1.1, in 2024 R321.1.1', () => {
    expect(inch(irc.neededOver)).toBe(30)
    expect(irc.neededOver).toMatchObject({ section: is2024 ? 'R321.1.1' : 'R312.1.1', basis: 'read' })
  })
  it('asks for 36 in, on stairs 34 in, where the top is also the handrail 34 to 38 in: R312.1.2', () => {
    expect(heights(irc, inch)).toEqual({ dwelling: 36 })
    expect(inch(irc.stairHeight)).toBe(34)
    expect([irc.handrail?.least, irc.handrail?.most].map((nm) => toInches(nm ?? NaN))).toEqual([34, 38])
  })
  it('lets no 4 in sphere pass, on stairs no 4 3/8 in, in the triangle no 6 in: R312.1.3', () => {
    expect([inch(irc.sphere), inch(irc.stairSphere), inch(irc.stairTriangle)]).toEqual([4, 4.375, 6])
    expect(irc.sphere.section).toBe(is2024 ? 'R321.1.3' : 'R312.1.3')
  })
  it('loads the top with 200 lb and the infill with 50 lb on 1 sq ft: Table R301.5', () => {
    expect(toPoundsForce(irc.topLoad?.value ?? NaN)).toBeCloseTo(200, 9)
    expect(toPoundsForce(irc.infillLoad?.value ?? NaN)).toBeCloseTo(50, 9)
    expect(toInches(irc.infillLoad?.side ?? NaN)).toBe(12)
    expect(irc.infillLoad).toMatchObject({ section: 'Table R301.5, notes', basis: 'read' })
  })
  it('asks for risers of at most 7 3/4 in and treads of at least 10 in: R311.7, in 2024 R318.7, read in a copy', () => {
    expect([inch(irc.riser), inch(irc.tread)]).toEqual([7.75, 10])
    expect(irc.riser).toMatchObject({ section: is2024 ? 'R318.7' : 'R311.7', basis: 'copy' })
    expect(irc.notes.map(({ text }) => text).join(' ')).toMatch(/3\/8 in.*four risers or more/)
  })
})

describe('ibc-2021', () => {
  const ibc = rulesOf('ibc-2021')
  it('asks for 42 in, in dwelling units 36 in: 1015.3, from memory', () => {
    expect(heights(ibc, inch)).toEqual({ building: 42, 'dwelling-unit': 36 })
    expect(ibc.situations[0]?.height).toMatchObject({ section: '1015.3', basis: 'memory' })
  })
  it('lets no 4 in sphere pass up to 36 in, no 4 3/8 in above, no 6 in in the triangle: 1015.4, read in a copy', () => {
    expect([inch(ibc.sphere), inch(ibc.upperSphere), inch(ibc.stairTriangle)]).toEqual([4, 4.375, 6])
    expect(toInches(ibc.upperSphere?.above ?? NaN)).toBe(36)
    expect(ibc.sphere).toMatchObject({ section: '1015.4', basis: 'copy' })
  })
  it('loads as 1607 and ASCE 7, 4.5.1: 200 lb, 50 lb on 12 by 12 in, 50 lb/ft along the top', () => {
    expect(toPoundsForce(ibc.topLoad?.value ?? NaN)).toBeCloseTo(200, 9)
    expect(toPoundsForce(ibc.infillLoad?.value ?? NaN)).toBeCloseTo(50, 9)
    expect(ibc.topLoad).toMatchObject({ section: '1607; ASCE 7, 4.5.1', basis: 'read' })
    expect(ibc.notes[0]?.text).toContain('50 lb on each foot')
  })
})

describe('nbc-2020, 9.8.8', () => {
  const nbc = rulesOf('nbc-2020')
  it('asks for a guard over 600 mm, 1070 mm high, exterior of one dwelling up to 1800 mm 900 mm', () => {
    expect(mm(nbc.neededOver)).toBe(600)
    expect(heights(nbc)).toEqual({ general: 1070, 'exterior-one-dwelling': 900 })
    expect(toMillimetres(nbc.situations[1]?.upToFall ?? NaN)).toBe(1800)
  })
  it('lets no 100 mm sphere pass, no 150 mm in the triangle; 0.5 kN on 300 by 300 mm', () => {
    expect([mm(nbc.sphere), mm(nbc.stairTriangle)]).toEqual([100, 150])
    expect(nbc.infillLoad?.value).toBe(500)
    expect(toMillimetres(nbc.infillLoad?.side ?? NaN)).toBe(300)
  })
  it('allows nothing climbable from 140 to 900 mm over a fall of 4.2 m', () => {
    const { fallOver = NaN, from = NaN, to = NaN } = nbc.climbable ?? {}
    expect([fallOver, from, to].map(toMillimetres)).toEqual([4200, 140, 900])
  })
})

describe('adk-2013, K2', () => {
  const adk = rulesOf('adk-2013')
  it('asks for 900 mm in dwellings and 1100 mm on external balconies; no 100 mm sphere; horizontal rails avoided', () => {
    expect(heights(adk)).toEqual({ 'external-balcony': 1100, dwelling: 900 })
    expect(mm(adk.sphere)).toBe(100)
    expect(adk.climbable?.advice).toBe(true)
    expect(adk.situations[0]?.height).toMatchObject({ section: 'K2, Diagram 3.1', basis: 'read' })
  })
})

describe('ncc-2022, Housing Provisions 11.3.3 and 11.3.4', () => {
  const ncc = rulesOf('ncc-2022')
  it('asks for a barrier over 1 m, 1000 mm high, 865 mm on stairs; no 125 mm sphere', () => {
    expect(mm(ncc.neededOver)).toBe(1000)
    expect(heights(ncc)).toEqual({ dwelling: 1000 })
    expect([mm(ncc.stairHeight), mm(ncc.sphere)]).toEqual([865, 125])
  })
  it('allows nothing climbable from 150 to 760 mm over a fall of 4 m, and goes by the wire tables of 11.3.6', () => {
    const { fallOver = NaN, from = NaN, to = NaN } = ncc.climbable ?? {}
    expect([fallOver, from, to].map(toMillimetres)).toEqual([4000, 150, 760])
    expect(ncc.wireTables).toEqual({ section: '11.3.6', basis: 'read' })
  })
})

describe('all of them', () => {
  it('keep a section and a basis beside every figure, and ids of their own', () => {
    const ids = publishedRules.map(({ id }) => id)
    expect(new Set(ids).size).toBe(ids.length)
    for (const rules of publishedRules) expect(guardRulesSchema.safeParse(rules).success).toBe(true)
  })
  it('say *check the text* behind what is remembered or read in a copy, and not behind what was read', () => {
    const of = (basis: Basis) => ruleBehind(rulesOf('ibc-2021'), { section: '1015.3', basis })
    expect(of('memory')).toBe('International Building Code 2021, 1015.3 (from memory: check the text)')
    expect(of('copy')).toContain('check the text')
    expect(of('read')).toBe('International Building Code 2021, 1015.3')
  })
  it('give way to own rules of the same id', () => {
    const own = { ...rulesOf('irc-2021'), name: 'Harbour town' }
    expect(findRules('irc-2021', [own])?.name).toBe('Harbour town')
    expect(findRules('nowhere')).toBeUndefined()
  })
})
