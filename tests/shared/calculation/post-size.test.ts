import { describe, expect, it } from 'vitest'
import { toInches } from '@shared/units/length'
import { bay, calculate, exampleFitting, type Given, noLimits, post } from './support/inputs'

/**
 * R1 is B1 and ends at the corner post P2; R2 is B2 and B3, passing P3. P2 is 6 in along B1 and 2.5 in across; drilled
 * bodies of 3 in need 3.5 in, so they suit P2 from B1's side only.
 */
const corner = (more: Partial<Given> = {}): Given => ({
  posts: [post('P1', { along: 6, across: 6 }), post('P2', { along: 6, across: 2.5 }), post('P3'), post('P4')],
  bays: [bay('B1', ['P1', 'P2'], [40]), bay('B2', ['P2', 'P3'], [40]), bay('B3', ['P3', 'P4'], [40])],
  runs: [
    { id: 'R1', bays: ['B1'], cable: 'c532', cables: { heights: [18] } },
    { id: 'R2', bays: ['B2', 'B3'], cable: 'c532', cables: { heights: [18] } },
  ],
  fittings: [{ ...exampleFitting, id: 'long', body: 3 }],
  rules: noLimits,
  ...more,
})

const modes = (given: Given) => calculate(given).cables.map(({ mode }) => mode)
const square = (angle: number) => [{ post: 'P2', angle }]

describe('the size of a post in a run’s direction', () => {
  it('is its other size for a run that meets it the other way', () => {
    expect(modes(corner({ corners: square(90) }))).toEqual(['shop', 'none'])
    expect(modes(corner({ corners: square(100) }))).toEqual(['shop', 'none'])
  })

  it('is along where the runs go straight on', () => {
    expect(modes(corner({ corners: square(180) }))).toEqual(['shop', 'shop'])
    expect(modes(corner({ corners: square(150) }))).toEqual(['shop', 'shop'])
  })

  it('takes a corner without an angle for square, and says so', () => {
    const { cables, findings } = calculate(corner())
    expect(cables.map(({ why }) => why)).toEqual([undefined, 'no-fitting'])
    expect(findings.find(({ code }) => code === 'corner-assumed')).toMatchObject({
      level: 'note',
      where: { run: 'R2', post: 'P2' },
    })
  })

  it('needs no word about a square post', () => {
    const posts = ['P1', 'P2', 'P3', 'P4'].map((id) => post(id, { along: 4, across: 4 }))
    expect(calculate(corner({ posts })).findings).toEqual([])
  })

  it('is parallel to the first bay of the survey that names it, in whichever run that is', () => {
    // With B2 first in the survey, P2's 6 in are along B2 and R1 meets it the other way.
    const { bays, ...rest } = corner({ corners: square(90) })
    expect(modes({ ...rest, bays: [bays[1]!, bays[0]!, bays[2]!] })).toEqual(['none', 'shop'])
  })

  it('counts for a post passed', () => {
    // A bay B0 of no run names P3 first, so R2 passes P3 the other way: 40 + 5.5 + 40.
    const given = corner({
      posts: [post('P0'), post('P1'), post('P2'), post('P3', { along: 3.5, across: 5.5 }), post('P4')],
      bays: [
        bay('B0', ['P0', 'P3'], []),
        bay('B1', ['P1', 'P2'], [40]),
        bay('B2', ['P2', 'P3'], [40]),
        bay('B3', ['P3', 'P4'], [40]),
      ],
    })
    expect(toInches(calculate(given).cables[1]?.path ?? NaN)).toBe(85.5)
  })

  it('is asked for where it is missing and needed', () => {
    const posts = [
      post('P1', { along: 6 }),
      { id: 'P2', material: 'softwood', along: 6 },
      post('P3'),
      post('P4'),
    ]
    const { cables, findings } = calculate(corner({ posts }))
    expect(cables.map(({ why }) => why)).toEqual([undefined, 'missing-reading'])
    expect(findings.find(({ level }) => level === 'stop')).toMatchObject({
      code: 'missing-size',
      where: { run: 'R2', post: 'P2' },
    })
  })
})
