import { describe, expect, it } from 'vitest'
import { checkSurvey } from '@shared/calculation/checks/check-survey'
import { toPoundsForce } from '@shared/units/force'
import { inches, toInches } from '@shared/units/length'
import { bay, exampleFitting, type Given, inputOf, oneBay, post } from '../support/inputs'

const check = (given: Given) => checkSurvey(inputOf(given))
const found = (given: Given, code: string) => check(given).findings.filter((finding) => finding.code === code)
const levels = (given: Given, code: string) => found(given, code).map(({ level }) => level)
/** One step: a thousandth of an inch. */
const STEP = 0.001
/** Exactly at a limit, one step under and one step over. */
const around = (limit: number) => [limit - STEP, limit, limit + STEP] as const
const stair = { kind: 'stair', rise: 7.5, going: 10 }

describe('a bay', () => {
  const { bays } = check(oneBay({ run: { cables: { heights: [3, 6.5, 9, 12] } } }))

  it('is checked at the run’s middle cable with its widest pitch', () => {
    // Four cables: index 2 from 0, the third. The widest pitch is 3 1/2 in, less 5/32 in of cable.
    expect(bays).toMatchObject([{ run: 'R1', bay: 'B1', cable: 3, spacers: 0, spacersNeeded: 0 }])
    expect(toInches(bays[0]?.openings.pitch ?? NaN)).toBe(3.5)
    expect(toInches(bays[0]?.openings.between ?? NaN)).toBe(3.5 - 5 / 32)
    expect(bays[0]?.openings.above).toBe(1)
    expect(toInches(bays[0]?.span ?? NaN)).toBe(48)
  })
  it('has the openings below its lowest and above its highest cable', () => {
    expect(toInches(bays[0]?.openings.bottom ?? NaN)).toBe(3 - 5 / 64)
    expect(toInches(bays[0]?.openings.top ?? NaN)).toBe(34.5 - 12 - 5 / 64)
  })
  it('is measured square to the cable on a stair', () => {
    const given = oneBay({
      bays: [bay('B1', ['P1', 'P2'], [60], { ...stair, rise: 3, going: 4, taped: 'level' })],
      run: { cables: { heights: [5, 10] } },
    })
    const [onStairs] = check({ ...given, fittings: [{ ...exampleFitting, maxAngle: 50 }] }).bays
    // cos θ = 4/5: 60 in taped level are 75 in along the cable, 5 in of height 4 in square to it.
    expect(toInches(onStairs?.span ?? NaN)).toBeCloseTo(75, 9)
    expect(toInches(onStairs?.openings.pitch ?? NaN)).toBeCloseTo(4, 9)
    expect(toInches(onStairs?.openings.bottom ?? NaN)).toBeCloseTo((5 - 5 / 64) * 0.8, 9)
    expect(toInches(onStairs?.sphere ?? NaN)).toBe(4.375)
  })
  it('is spanned by half with one spacer', () => {
    const [half] = check(oneBay({ bays: [bay('B1', ['P1', 'P2'], [48], { spacers: 1 })] })).bays
    expect(toInches(half?.span ?? NaN)).toBe(24)
  })
})

describe('openings, exactly at the sphere, one step under and one over (IRC R312.1.3)', () => {
  const between = (clear: number) => oneBay({ run: { cables: { heights: [3, 3 + clear + 5 / 32] } } })
  it('between cables: a sphere passes an opening of its own size', () => {
    expect(around(4).map((clear) => levels(between(clear), 'opening-between').length)).toEqual([0, 1, 1])
    expect(found(between(4), 'opening-between')[0]).toMatchObject({
      level: 'stop',
      where: { run: 'R1', bay: 'B1' },
      rule: 'International Residential Code 2021, R312.1.3',
    })
  })
  it('below the lowest cable', () => {
    const below = (clear: number) => oneBay({ run: { cables: { heights: [clear + 5 / 64] } } })
    expect(around(4).map((clear) => levels(below(clear), 'opening-bottom').length)).toEqual([0, 1, 1])
  })
  it('above the highest cable', () => {
    const above = (clear: number) => oneBay({ run: { cables: { heights: [34.5 - clear - 5 / 64] } } })
    expect(around(4).map((clear) => levels(above(clear), 'opening-top').length)).toEqual([0, 1, 1])
  })
  it('on stairs goes by the larger sphere', () => {
    const onStairs = (clear: number): Given => ({
      ...oneBay({ bays: [bay('B1', ['P1', 'P2'], [48], stair)] }),
      run: { cables: { heights: [3, 3 + (clear + 5 / 32) / Math.cos(Math.atan2(7.5, 10))] } },
    })
    // Heights are kept in whole nanometres, which a height divided by a cosine is not: the step is larger than that.
    expect(
      [4.375 - STEP, 4.375 + STEP].map((clear) => levels(onStairs(clear), 'opening-between').length),
    ).toEqual([0, 1])
  })
  it('above 36 in IBC 1015.4 allows 4 3/8 in', () => {
    const guard = { rules: 'ibc-2021', situation: 'building', height: 42 }
    const top = (clear: number, highest: number) =>
      oneBay({
        guard: { ...guard, topRailUnderside: highest + clear + 5 / 64 },
        run: { cables: { heights: [highest] } },
      })
    expect(levels(top(4.2, 36), 'opening-top')).toEqual([])
    expect(levels(top(4.2, 36 - STEP), 'opening-top')).toEqual(['stop'])
    expect(levels(top(4.375, 36), 'opening-top')).toEqual(['stop'])
  })
})

describe('heights, exactly at what the rules ask, one step under and one over', () => {
  it.each([
    ['irc-2021', 'dwelling', 36],
    ['ibc-2021', 'building', 42],
    ['ibc-2021', 'dwelling-unit', 36],
  ])('%s, %s: %d in', (rules, situation, height) => {
    const given = (built: number) => oneBay({ guard: { rules, situation, height: built } })
    expect(around(height).map((built) => levels(given(built), 'guard-too-low').length)).toEqual([1, 0, 0])
  })
  it('on stairs: 34 in above the nosing line (IRC R312.1.2, exception 1)', () => {
    const given = (built: number) =>
      oneBay({
        guard: { height: 36, stair: { height: built } },
        bays: [bay('B1', ['P1', 'P2'], [48], stair)],
      })
    expect(around(34).map((built) => levels(given(built), 'stair-guard-too-low').length)).toEqual([1, 0, 0])
    expect(around(38).map((built) => levels(given(built), 'handrail-height').length)).toEqual([0, 0, 1])
  })
  it('takes the strictest situation when nobody says which, and says so', () => {
    const given = oneBay({ guard: { rules: 'ibc-2021', height: 36 } })
    expect(levels(given, 'guard-too-low')).toEqual(['stop'])
    expect(found(given, 'situation-assumed')).toHaveLength(1)
  })
})

describe('the fall', () => {
  const metric = { length: 'mm', force: 'N' } as const
  const with_ = (rules: string, fall: number | undefined): Given => {
    const height = rules === 'ncc-2022' ? 1000 : 1070
    return {
      units: metric,
      posts: [post('P1', { along: 90, across: 90 }), post('P2', { along: 90, across: 90 })],
      bays: [bay('B1', ['P1', 'P2'], [1200])],
      run: { tension: 700, cables: { heights: [500] } },
      cables: [{ id: 'c532', name: '4 mm', construction: '7x7', diameter: 4, axialStiffness: 600000 }],
      fittings: [],
      guard: { rules, height, ...(fall === undefined ? {} : { fall }) },
    }
  }
  it.each([
    ['nbc-2020', 4200],
    ['ncc-2022', 4000],
  ])('%s: above %d mm nothing may be climbable', (rules, limit) => {
    expect([limit - 1, limit, limit + 1].map((fall) => levels(with_(rules, fall), 'climbable'))).toEqual([
      [],
      [],
      ['stop'],
    ])
  })
  it.each([
    ['nbc-2020', 600],
    ['ncc-2022', 1000],
  ])('%s: a guard is needed above %d mm', (rules, limit) => {
    expect(
      [limit - 1, limit, limit + 1].map((fall) => found(with_(rules, fall), 'guard-not-needed').length),
    ).toEqual([1, 1, 0])
  })
  it('is asked for where something hangs on it', () => {
    expect(levels(with_('nbc-2020', undefined), 'fall-unknown')).toEqual(['check'])
    expect(levels(oneBay(), 'fall-unknown')).toEqual(['note'])
  })
  it('makes horizontal cables something to avoid under Approved Document K', () => {
    expect(levels(with_('adk-2013', 900), 'climbable')).toEqual(['check'])
  })
})

describe('spans', () => {
  const wide = (clear: number, spacers = 0) =>
    oneBay({ bays: [bay('B1', ['P1', 'P2'], [clear], { spacers })] })
  it('over 48 in are to be looked at: exactly at, one step under, one over', () => {
    expect(around(48).map((clear) => levels(wide(clear), 'wide-bay').length)).toEqual([0, 0, 1])
  })
  it('say how many spacers cure them', () => {
    expect(found(wide(100), 'wide-bay')[0]?.text).toContain('2 spacers cure it.')
    expect(found(wide(100, 1), 'wide-bay')[0]?.text).toContain('1 more spacer cures it.')
    expect(found(wide(100, 2), 'wide-bay')).toEqual([])
    expect(found(wide(96.001), 'wide-bay')[0]?.text).toContain('2 spacers cure it.')
  })
})

describe('the house’s own least push', () => {
  it('is held against the push: exactly at, under, over', () => {
    const given = (leastPush?: number) =>
      oneBay({ run: { cables: { heights: [3, 6] } }, rules: leastPush === undefined ? {} : { leastPush } })
    expect(found(given(), 'push-low')).toEqual([])
    const push = toPoundsForce(check(given()).bays[0]?.push ?? NaN)
    expect(
      [push * 0.999, push, push * 1.001].map((least) => levels(given(least), 'push-low').length),
    ).toEqual([0, 0, 1])
  })
})

describe('end posts', () => {
  // Posts 3 1/2 in square, eleven cables at 3 … 33 in under a rail at 36 in, 200 lbf: the check values' worked post.
  const eleven = (more: Partial<Given> = {}) =>
    oneBay({
      guard: { height: 37.5, topRailUnderside: 36 },
      run: { tension: 200, cables: { heights: Array.from({ length: 11 }, (_, i) => 3 * (i + 1)) } },
      ...more,
    })
  it('are pulled by every cable, 2200 lbf', () => {
    const { posts } = check(eleven())
    expect(posts.map(({ post: id, pull }) => [id, Math.round(toPoundsForce(pull))])).toEqual([
      ['P1', 2200],
      ['P2', 2200],
    ])
  })
  it('are judged as standing free unless the survey says that the rail ties them', () => {
    // 5541.69 psi free, 1511.37 psi held, 1100 psi allowed (Southern Pine No. 2).
    const free = found(eleven(), 'post-overstressed')
    expect(free[0]?.text).toMatch(/5542 psi, standing free; Southern Pine No. 2 may take 1100 psi/)
    expect(levels(eleven(), 'support-unknown')).toEqual(['note'])
    const tied = eleven({ guard: { height: 37.5, topRailUnderside: 36, railTies: true } })
    expect(found(tied, 'post-overstressed')[0]?.text).toMatch(/1511 psi, held by the top rail/)
    expect(found(tied, 'support-unknown')).toEqual([])
  })
  it('may differ from the guard one by one', () => {
    const guard = { height: 37.5, topRailUnderside: 36, railTies: true }
    const given = eleven({ guard, posts: [post('P1'), post('P2', { railTies: false })] })
    expect(check(given).posts.map(({ support }) => support)).toEqual(['propped', 'cantilever'])
  })
  it('lose their cover before they are reckoned', () => {
    const covered = { material: 'veneered', core: 'softwood', cover: 0.75, along: 5, across: 5 }
    const [first] = check(eleven({ posts: [post('P1', covered), post('P2')] })).posts
    expect([first?.section?.along, first?.section?.across].map((nm) => toInches(nm ?? NaN))).toEqual([
      3.5, 3.5,
    ])
  })
  it('ask the engineer where they are no wood, and for what is missing', () => {
    const of = (more: object) => eleven({ posts: [post('P1', { ...more }), post('P2')], fittings: [surface] })
    const surface = {
      ...exampleFitting,
      mount: 'surface',
      materials: ['masonry', 'metal', 'softwood', 'veneered'],
      body: 0,
    }
    expect(found(of({ material: 'masonry' }), 'ask-engineer')).toHaveLength(1)
    expect(found(of({ material: 'metal' }), 'ask-engineer')).toHaveLength(1)
    expect(check(of({ material: 'metal' })).posts[0]?.cantilever.stress).toBeUndefined()
    expect(levels(of({ material: 'veneered', cover: 0.5 }), 'missing-core')).toEqual(['check'])
    expect(levels(of({ across: undefined }), 'missing-post-size')).toEqual(['check'])
  })
  it('carry the rules’ load at the top: 200 lbf at 36 in bend a 4x4 to 1007.58 psi, within 1100', () => {
    const given = eleven({ guard: { height: 36, topRailUnderside: 36 } })
    const stress = check(given).posts[0]?.topLoad?.stress ?? NaN
    expect(stress / 0.006894757293168).toBeCloseTo(1007.58, 2)
    expect(found(given, 'post-top-load')).toEqual([])
    const low = eleven({ guard: { height: 36, topRailUnderside: 36 }, rules: { lumber: [weak] } })
    expect(found(low, 'post-top-load')[0]?.rule).toContain('Table R301.5')
  })
  const weak = { id: 'weak', name: 'Weak wood', bending: 1000, modulus: 1e6 }
  it('want wood beside the hole: exactly the edge wall, one step under and one over', () => {
    // A 9/16 in hole in a 3 1/2 in core leaves 1 15/32 in at either side.
    const left = (3.5 - 9 / 16) / 2
    expect(
      around(left).map((edgeWall) => levels(oneBay({ rules: { edgeWall } }), 'edge-thin').length),
    ).toEqual([0, 0, 2])
  })
})

describe('tension', () => {
  const rated = (rating: number | undefined, tension = 200) =>
    oneBay({
      run: { tension },
      fittings: [{ ...exampleFitting, ...(rating === undefined ? {} : { rating }) }],
    })
  it('is held against the fitting’s rating: exactly at, one over', () => {
    expect(levels(rated(200), 'tension-over-limit')).toEqual([])
    expect(levels(rated(199.99), 'tension-over-limit')).toEqual(['stop'])
    expect(levels(rated(200), 'tension-over-limit-cold')).toEqual(['check'])
    expect(found(rated(undefined), 'rating-unknown')).toHaveLength(1)
  })
  it('changes with the temperature by EA · 16·10⁻⁶ · ΔT (EN 10088-1)', () => {
    const { runs } = check(oneBay({ rules: { coldest: -15, hottest: 45, tensionedAt: 15 } }))
    // 151 000 lbf · 4.80·10⁻⁴ = 72.48 lbf either way.
    expect(toPoundsForce(runs[0]?.whenCold ?? NaN)).toBeCloseTo(150 + 72.48, 9)
    expect(toPoundsForce(runs[0]?.whenHot ?? NaN)).toBeCloseTo(150 - 72.48, 9)
  })
  it('says when heat takes it all', () => {
    expect(levels(oneBay({ run: { tension: 72.48 }, rules: { hottest: 45 } }), 'slack-when-hot')).toEqual([
      'check',
    ])
    expect(levels(oneBay({ run: { tension: 72.5 }, rules: { hottest: 45 } }), 'slack-when-hot')).toEqual([])
  })
})

describe('cables given one by one', () => {
  it('lie inside the opening: exactly at its edge, one step in and one out', () => {
    const at = (height: number) => oneBay({ run: { cables: { heights: [3, height] } } })
    expect(around(34.5).map((height) => levels(at(height), 'cable-outside').length)).toEqual([0, 0, 1])
    const low = (height: number) => oneBay({ guard: { bottom: 2 }, run: { cables: { heights: [height] } } })
    expect(around(2).map((height) => levels(low(height), 'cable-outside').length)).toEqual([1, 0, 0])
  })
})

describe('corners', () => {
  const corner = (body: number, heights: number[]): Given => ({
    posts: [post('P1'), post('P2'), post('P3')],
    bays: [bay('B1', ['P1', 'P2'], [48]), bay('B2', ['P2', 'P3'], [48])],
    runs: [
      { id: 'R1', bays: ['B1'], cable: 'c532', cables: { heights: [6, 9] } },
      { id: 'R2', bays: ['B2'], cable: 'c532', cables: { heights } },
    ],
    corners: [{ post: 'P2', angle: 90 }],
    fittings: [{ ...exampleFitting, body, minGrip: { softwood: 1.25 } }],
  })
  it('need no stagger with 1 1/2 in bodies in a 3 1/2 in post', () => {
    const { corners, findings } = check(corner(1.5, [6, 9]))
    expect(corners).toMatchObject([{ post: 'P2', kind: 'turned', overlap: inches(1 / 32), stagger: 0 }])
    expect(findings.filter(({ code }) => code === 'corner-overlap')).toEqual([])
  })
  it('need one with longer bodies, and are cured by it: exactly at, under and over', () => {
    const apart = 13 / 16
    expect(levels(corner(2, [6, 9]), 'corner-overlap')).toEqual(['stop'])
    expect(around(apart).map((by) => levels(corner(2, [6 + by, 9 + by]), 'corner-overlap').length)).toEqual([
      1, 0, 0,
    ])
  })
  it('are drilled end to end where one run goes straight on from the other', () => {
    const straight = { ...corner(1.5, [6, 9]), corners: [{ post: 'P2', angle: 180 }] }
    // 1 1/2 + 1 1/2 in leave 1/2 in of 3 1/2 in: more than the web of 1/4 in. Bodies of 1 3/4 in leave nothing.
    expect(check(straight).corners).toMatchObject([{ kind: 'opposite', stagger: 0 }])
    const meeting = { ...corner(1.75, [6, 9]), corners: [{ post: 'P2', angle: 180 }] }
    expect(levels(meeting, 'bodies-meet')).toEqual(['stop'])
  })
})

describe('the wire tables of NCC 2022', () => {
  const wire = (spacing: number, tension: number, diameter = 3): Given => ({
    units: { length: 'mm', force: 'N' },
    posts: [post('P1', { along: 90, across: 90 }), post('P2', { along: 90, across: 90 })],
    bays: [bay('B1', ['P1', 'P2'], [1200])],
    run: { tension, cables: { heights: [100, 100 + spacing] } },
    cables: [{ id: 'c532', name: '3 mm', construction: '7x7', diameter, axialStiffness: 400000 }],
    fittings: [],
    guard: { rules: 'ncc-2022', height: 1000 },
  })
  it('ask for 818 N of 3.0 mm 7x7 at 80 mm over 1200 mm: exactly at, one under', () => {
    expect(levels(wire(80, 818), 'wire-tension-low')).toEqual([])
    expect(levels(wire(80, 817.99), 'wire-tension-low')).toEqual(['stop'])
    expect(found(wire(80, 818), 'wire-deflection')[0]?.text).toContain('6 mm')
  })
  it('do not allow it at 100 mm, and know no 3.2 mm', () => {
    expect(levels(wire(100, 3000), 'wire-not-allowed')).toEqual(['stop'])
    expect(levels(wire(80, 3000, 3.2), 'wire-not-tabulated')).toEqual(['check'])
  })
})

describe('what is missing', () => {
  it('leaves a run out and is said', () => {
    const { bays, posts, findings } = check(oneBay({ bays: [bay('B1', ['P1', 'P2'], [])] }))
    expect([bays, posts]).toEqual([[], []])
    expect(findings.map(({ code }) => code)).toContain('missing-reading')
  })
  it('is said of a bay that only an overall reading covers', () => {
    const two: Given = {
      posts: [post('P1'), post('P2'), post('P3')],
      bays: [bay('B1', ['P1', 'P2'], [48]), bay('B2', ['P2', 'P3'], [])],
      run: { readings: [{ id: 'r1', at: 'top', value: 99.5 }] },
    }
    expect(found(two, 'bay-unread').map(({ where }) => where)).toEqual([{ run: 'R1', bay: 'B2' }])
  })
  it('is said of rules nobody knows', () => {
    expect(levels(oneBay({ guard: { rules: 'nowhere' } }), 'guard-rules-unknown')).toEqual(['check'])
  })
})
