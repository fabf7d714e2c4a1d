import { describe, expect, it } from 'vitest'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { cutListRows } from '@shared/cut-list/cut-list-rows'
import { fittingsToPick } from '@shared/cut-list/fittings-to-pick'
import { inches, toInches } from '@shared/units/length'
import { bay, exampleFitting, inputOf, noLimits, post } from '../calculation/support/inputs'

/** R1 can be cut, two cables of 49.5 in; R2 has no fitting at P4; B9 of no run is out of plumb. */
const input = inputOf({
  posts: [post('P1'), post('P2'), post('P3'), post('P4', { material: 'metal' })],
  bays: [bay('B1', ['P1', 'P2'], [48]), bay('B2', ['P3', 'P4'], [60]), bay('B9', ['P1', 'P3'], [60, 61])],
  runs: [
    { id: 'R1', bays: ['B1'], cable: 'c532', tension: 150, cables: { heights: [6, 12] } },
    { id: 'R2', bays: ['B2'], cable: 'c532', tension: 150, cables: { heights: [6] } },
  ],
  fittings: [exampleFitting, { ...exampleFitting, id: 'F2', name: 'Spare', body: 2 }],
  rules: noLimits,
})
const result = calculateSurvey(input)

describe('cutListRows', () => {
  const { groups, findings, totals } = cutListRows(result, input)

  it('groups cables by run, named as on their tags', () => {
    expect(groups.map(({ run, rows }) => [run.run, rows.map(({ name }) => name)])).toEqual([
      ['R1', ['R1-1', 'R1-2']],
      ['R2', ['R2-1']],
    ])
  })

  it('names cable, fittings and posts for people', () => {
    expect(groups[0]?.rows[0]).toMatchObject({
      cableName: '5/32 7x7 316',
      fromFitting: 'Example sleeve',
      toFitting: 'Example sleeve',
      fromPost: 'P1',
      toPost: 'P2',
    })
    expect(groups[1]?.rows[0]).toMatchObject({
      fromFitting: 'Example sleeve',
      toFitting: undefined,
      left: undefined,
    })
  })

  it('says what is left of the take-up', () => {
    // 1.275 − 48 · (150/151000 + 0.00125) = 1.275 − 0.1076821
    expect(toInches(groups[0]?.rows[0]?.left ?? NaN)).toBeCloseTo(1.1673179, 6)
  })

  it('totals by run and in all', () => {
    expect(groups.map(({ totals: { cables, shop, none } }) => [cables, shop, none])).toEqual([
      [2, 2, 0],
      [1, 0, 1],
    ])
    expect(totals).toEqual({ cables: 3, shop: 2, site: 0, none: 1, length: inches(99) })
  })

  it('puts findings with their run, the rest apart', () => {
    expect(groups.map(({ findings: found }) => found.map(({ code }) => code))).toEqual([[], ['no-fitting']])
    expect(findings.map(({ code }) => code)).toEqual(['post-out-of-plumb'])
  })
})

describe('fittingsToPick', () => {
  it('counts fittings and cable of what can be cut', () => {
    expect(fittingsToPick(result, input)).toEqual({
      fittings: [{ id: 'F1', name: 'Example sleeve', count: 4 }],
      cables: [{ id: 'c532', name: '5/32 7x7 316', count: 2, length: inches(99) }],
    })
  })
})
