import { describe, expect, it } from 'vitest'
import { bay, calculate, exampleFitting, type Given, oneBay, post } from '../support/inputs'

/** Why the cables have no length, and the findings that stop them. */
const outcome = (given: Given) => {
  const { cables, findings } = calculate(given)
  return {
    why: cables.map(({ why }) => why),
    stops: findings.filter(({ level }) => level === 'stop').map(({ code, where }) => ({ code, where })),
  }
}

const manyCables = { cables: { layout: 'even', spacing: 3 } }

describe('a missing reading', () => {
  it('stops every cable of the run, and is said once', () => {
    const { why, stops } = outcome(oneBay({ bays: [bay('B1', ['P1', 'P2'], [])], run: manyCables }))
    expect(why).toHaveLength(11)
    expect(new Set(why)).toEqual(new Set(['missing-reading']))
    expect(stops).toEqual([{ code: 'missing-reading', where: { run: 'R1', bay: 'B1' } }])
  })

  it('is missing when every one is struck', () => {
    const readings = [{ id: 'r1', at: 'top', value: 48, struck: 'wrong bay' }]
    expect(outcome(oneBay({ bays: [bay('B1', ['P1', 'P2'], [], { readings })] })).why).toEqual([
      'missing-reading',
    ])
  })

  it('of a stair’s angle stops it too, even when it was taped along the slope', () => {
    for (const taped of ['slope', 'level']) {
      const bays = [bay('B1', ['P1', 'P2'], [75], { kind: 'stair', taped })]
      expect(outcome(oneBay({ bays, fittings: [{ ...exampleFitting, maxAngle: 90 }] }))).toEqual({
        why: ['missing-reading'],
        stops: [{ code: 'missing-angle', where: { run: 'R1', bay: 'B1' } }],
      })
    }
  })

  it('of a post passed stops it', () => {
    const given = {
      posts: [post('P1'), { id: 'P2' }, post('P3')],
      bays: [bay('B1', ['P1', 'P2'], [40]), bay('B2', ['P2', 'P3'], [40])],
    }
    expect(outcome(given)).toEqual({
      why: ['missing-reading'],
      stops: [{ code: 'missing-size', where: { run: 'R1', post: 'P2' } }],
    })
  })

  it('comes before a missing fitting', () => {
    const given = oneBay({ bays: [bay('B1', ['P1', 'P2'], [])], fittings: [] })
    expect(outcome(given).why).toEqual(['missing-reading'])
  })
})

describe('a missing fitting', () => {
  it('stops the run with the reasons', () => {
    const given = oneBay({ posts: [post('P1'), post('P2', { cover: 0.75 })] })
    expect(outcome(given)).toEqual({
      why: ['no-fitting'],
      stops: [{ code: 'no-fitting', where: { run: 'R1', post: 'P2' } }],
    })
    expect(calculate(given).findings[0]?.text).toBe(
      'Run R1: no fitting suits post P2. Example sleeve: grips 3/4 in of the softwood core, needs 1 1/2 in.',
    )
    const [cable] = calculate(given).cables
    expect(cable).toMatchObject({ from: 'F1', to: undefined, path: 48 * 25.4e6 })
  })

  it('is said where the hardware has none for the material', () => {
    const given = oneBay({ posts: [post('P1'), post('P2', { material: 'masonry' })] })
    expect(calculate(given).findings[0]?.text).toContain(
      'No fitting of the hardware is made for masonry posts.',
    )
  })

  it('is told for four fittings, the rest being counted', () => {
    const fittings = [1, 2, 3, 4, 5, 6].map((n) => ({
      ...exampleFitting,
      id: `F${n}`,
      name: `Sleeve ${n}`,
      body: 4,
    }))
    const [finding] = calculate(oneBay({ posts: [post('P1'), post('P2', { along: 5 })], fittings })).findings
    expect(finding?.where).toEqual({ run: 'R1', post: 'P1' })
    expect(finding?.text).toContain(
      'Sleeve 4: its body of 4 in is longer than the 3 in the post allows. So too 2 more.',
    )
    expect(finding?.text).not.toContain('Sleeve 5')
  })

  it('is put down to a core that nobody noted', () => {
    const fittings = [{ ...exampleFitting, materials: ['softwood', 'veneered'] }]
    const posts = [post('P1'), post('P2', { material: 'veneered', cover: 0 })]
    expect(calculate(oneBay({ posts, fittings })).findings[0]?.text).toContain(
      'the core under the veneer is not known',
    )
  })

  it('is put down to the material where that is not known', () => {
    const given = oneBay({ posts: [post('P1'), { id: 'P2', along: 3.5, across: 3.5 }] })
    expect(outcome(given)).toEqual({
      why: ['no-fitting'],
      stops: [{ code: 'missing-material', where: { run: 'R1', post: 'P2' } }],
    })
  })
})

describe('a veneered post without a cover', () => {
  it('is reckoned without one, and that is said', () => {
    const given = oneBay({
      posts: [post('P1'), post('P2', { material: 'veneered', core: 'softwood' })],
      fittings: [{ ...exampleFitting, materials: ['softwood', 'veneered'] }],
    })
    const { cables, findings } = calculate(given)
    expect(cables[0]?.mode).toBe('shop')
    expect(findings).toMatchObject([{ level: 'check', code: 'missing-cover', where: { post: 'P2' } }])
  })
})

describe('readings that cannot be right', () => {
  it('give no length of zero or less', () => {
    // 40 in at 33 in and 1 in at 3 in: at 1 in, 1 − 2/30 · 39 = −1.6 in; at 18 in, 20.5 in.
    const given = oneBay({ bays: [bay('B1', ['P1', 'P2'], [40, 1])], run: { cables: { heights: [1, 18] } } })
    const { why, stops } = outcome(given)
    expect(why).toEqual(['missing-reading', undefined])
    expect(stops).toEqual([{ code: 'impossible-readings', where: { run: 'R1' } }])
  })

  it('leave no room for two fittings on the faces', () => {
    const plate = { ...exampleFitting, mount: 'surface', headProjection: 6, cutPastFace: 1 }
    const given = oneBay({ bays: [bay('B1', ['P1', 'P2'], [10])], fittings: [plate] })
    expect(outcome(given)).toEqual({
      why: ['no-fitting'],
      stops: [{ code: 'no-room', where: { run: 'R1' } }],
    })
  })
})

describe('a run without cables', () => {
  it('is stopped where none fits between bottom and rail', () => {
    const given = oneBay({ run: manyCables, guard: { topRailUnderside: 3 } })
    expect(outcome(given)).toEqual({ why: [], stops: [{ code: 'no-cables', where: { run: 'R1' } }] })
  })
})
