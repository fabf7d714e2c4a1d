import { describe, expect, it } from 'vitest'
import { toInches } from '@shared/units/length'
import { bay, calculate, exampleFitting, type Given, noLimits, oneBay, post } from './support/inputs'

const stair = { kind: 'stair', rise: 30, going: 40 } // cos θ = 0.8
const even = { cables: { layout: 'even', spacing: 3 } }
const heights = (given: Given) => calculate(given).cables.map(({ height }) => toInches(height))

describe('a run of level and stair bays', () => {
  const mixed = (second: Record<string, unknown>): Given => ({
    posts: [post('P1'), post('P2'), post('P3')],
    bays: [bay('B1', ['P1', 'P2'], [40], stair), bay('B2', ['P2', 'P3'], [40], second)],
    run: even,
    guard: { topRailUnderside: 36, stair: { topRailUnderside: 30 } },
  })

  it('takes its pitch from the flattest bay, and the guard’s own opening', () => {
    // Level bay: p = 3, 36 / 3 − 1 = 11 cables, from 3 to 33 in.
    expect(heights(mixed({}))).toHaveLength(11)
    expect(heights(mixed({})).at(-1)).toBe(33)
  })

  it('takes the stair’s pitch and opening when all are stairs', () => {
    // p = 3.75, 30 / 3.75 − 1 = 7 cables at 3.75, 7.5 …
    expect(heights(mixed(stair))).toEqual([3.75, 7.5, 11.25, 15, 18.75, 22.5, 26.25])
  })

  it('takes the flatter of two stairs', () => {
    // Rise 20, going 48: cos θ = 48/52, p = 3.25; 30 / 3.25 = 9.23: 9 cables.
    expect(heights(mixed({ kind: 'stair', rise: 20, going: 48 }))).toHaveLength(9)
  })
})

describe('the skew at an end', () => {
  const skewed = exampleFitting.maxAngle + 1
  const ends = (more: Record<string, unknown>, backwards = false): (string | undefined)[] => {
    const first = bay('B1', backwards ? ['P2', 'P1'] : ['P1', 'P2'], [40], more)
    const given = {
      posts: [post('P1'), post('P2'), post('P3')],
      bays: [first, bay('B2', ['P2', 'P3'], [40])],
    }
    const [cable] = calculate(given).cables
    return [cable?.from, cable?.to]
  }

  it('is that of the bay’s own end there, however the bay was written', () => {
    expect(ends({ skewFrom: skewed })).toEqual([undefined, 'F1'])
    expect(ends({ skewTo: skewed }, true)).toEqual([undefined, 'F1'])
  })

  it('is not that of a post passed', () => {
    expect(ends({ skewTo: skewed })).toEqual(['F1', 'F1'])
    expect(ends({ skewFrom: skewed }, true)).toEqual(['F1', 'F1'])
  })
})

describe('the size of an end post', () => {
  const plate = { ...exampleFitting, id: 'plate', mount: 'surface' }
  const unsized = (fittings: object[]) =>
    calculate(
      oneBay({
        posts: [{ id: 'P1', material: 'softwood' }, post('P2')],
        fittings: fittings as never,
        rules: noLimits,
      }),
    ).cables[0]

  it('must be known where a drilled fitting might be the one', () => {
    expect(unsized([exampleFitting])).toMatchObject({
      mode: 'none',
      why: 'missing-reading',
      from: undefined,
      to: 'F1',
    })
    const longPlate = { ...plate, body: 2 }
    expect(unsized([exampleFitting, longPlate])).toMatchObject({
      why: 'missing-reading',
      from: undefined,
      to: 'F1',
    })
  })

  it('need not be known where one on the face comes first', () => {
    const shortPlate = { ...plate, body: 0 }
    expect(unsized([exampleFitting, shortPlate])).toMatchObject({ mode: 'shop', from: 'plate', to: 'plate' })
  })
})
