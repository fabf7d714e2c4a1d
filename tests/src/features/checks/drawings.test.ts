import { describe, expect, it } from 'vitest'
import { checkSurvey } from '@shared/calculation/checks/check-survey'
import { topSphere } from '@shared/calculation/checks/findings/bay-check-findings'
import { inches } from '@shared/units/length'
import { bayShape, type GapName } from '../../../../src/features/checks/bay-shape'
import { endTicks, meet, type Spot, type Stretch } from '../../../../src/features/checks/drawing'
import { postCut } from '../../../../src/features/checks/post-cut'
import { sectionShape, staggerShape } from '../../../../src/features/checks/section-shape'
import { bay, exampleFitting, type Given, inputOf, post } from '../../../shared/calculation/support/inputs'

const drawn = (given: Given) => {
  const { bays, runs, guard } = checkSurvey(inputOf(given))
  return {
    bay: bays[0]!,
    run: runs[0]!,
    guardHeight: inches(36),
    postWidth: inches(3.5),
    diameter: inches(5 / 32),
    topSphere: topSphere(bays[0]!, guard),
  }
}
const gapOf = (given: Given, name: GapName) =>
  bayShape(drawn(given), 420).gaps.find((gap) => gap.name === name)!
const length = ([from, to]: Stretch) => distance(from, to)
const distance = (a: Spot, b: Spot) => Math.hypot(a.x - b.x, a.y - b.y)
const level: Given = {
  posts: [post('P1'), post('P2')],
  bays: [bay('B1', ['P1', 'P2'], [48], { spacers: 1 })],
  run: { cables: { heights: [3, 6, 10] } },
}
const stair: Given = {
  posts: [post('P1'), post('P2')],
  bays: [bay('B1', ['P1', 'P2'], [60], { kind: 'stair', rise: 7.5, going: 10 })],
  run: { cables: { heights: [5, 10] } },
  fittings: [{ ...exampleFitting, maxAngle: 50 }],
}

describe('the opening picture', () => {
  const shape = bayShape(drawn(level), 420)
  const scale = length(shape.cables[0]!) / 48

  it('is to scale in both directions, inside its frame', () => {
    // Cables at 3 and 6 in are 3 in apart on the drawing.
    expect(distance(shape.cables[0]![0], shape.cables[1]![0]) / scale).toBeCloseTo(3, 6)
    for (const { x, y } of [...shape.posts.flat(), ...shape.rail, ...shape.ground, ...shape.span]) {
      expect(x).toBeGreaterThanOrEqual(0)
      expect(x).toBeLessThanOrEqual(shape.width)
      expect(y).toBeGreaterThanOrEqual(0)
      expect(y).toBeLessThanOrEqual(shape.height)
    }
  })
  it('puts the sphere in the widest opening between cables, 6 to 10 in', () => {
    const { sphere, line } = gapOf(level, 'between')
    expect((2 * sphere!.radius) / scale).toBeCloseTo(4, 6)
    const [lower, upper] = [shape.cables[1]![0].y, shape.cables[2]![0].y]
    expect(sphere!.centre.y).toBeCloseTo((lower + upper) / 2, 6)
    // 4 in between centres less 5/32 in of cable.
    expect(length(line) / scale).toBeCloseTo(4 - 5 / 32, 6)
  })
  it('measures below the lowest and above the highest cable, with a sphere only where that is worse', () => {
    const [bottom, top] = [gapOf(level, 'bottom'), gapOf(level, 'top')]
    // 3 in less half a cable to the floor; 34 1/2 in of opening less 10 in and half a cable.
    expect(length(bottom.line) / scale).toBeCloseTo(3 - 5 / 64, 6)
    expect(Math.max(bottom.line[0].y, bottom.line[1].y)).toBeCloseTo(shape.ground[0]!.y, 6)
    expect(length(top.line) / scale).toBeCloseTo(24.5 - 5 / 64, 6)
    // 3 27/32 in between cables: less than above them, more than below.
    expect(top.sphere).toBeDefined()
    expect(bottom.sphere).toBeUndefined()
  })
  it('puts the sphere of a single cable where it is worst, and draws no opening that is none', () => {
    const single = { ...level, run: { cables: { heights: [3] } } }
    expect(gapOf(single, 'between')).toBeUndefined()
    expect(gapOf(single, 'top').sphere).toBeDefined()
    expect(gapOf(single, 'bottom').sphere).toBeUndefined()
    expect(gapOf({ ...level, run: { cables: { heights: [0.05, 3] } } }, 'bottom')).toBeUndefined()
  })
  it('draws spacers where they halve the span', () => {
    expect(shape.spacers).toHaveLength(1)
    expect(length(shape.span) / scale).toBeCloseTo(24, 6)
  })
  it('draws what closes the opening at its bottom, where that is not the ground', () => {
    expect(shape.sill).toBeUndefined()
    const raised = bayShape(drawn({ ...level, guard: { bottom: 2 } }), 420)
    expect((raised.ground[0]!.y - raised.sill![0].y) / scale).toBeCloseTo(2, 6)
  })
})

describe('the opening picture of a stair', () => {
  const shape = bayShape(drawn(stair), 420)
  const [from, to] = shape.cables[0]!
  const scale = distance(from, to) / 60
  /** Square from the lower edge of the lowest cable, which is half its thickness below the centre line. */
  const belowCable = ({ x, y }: Spot) =>
    ((y - from.y) * (to.x - from.x) - (x - from.x) * (to.y - from.y)) / distance(from, to) - (5 / 64) * scale

  it('runs along the pitch: 7 1/2 over 10', () => {
    expect((from.y - to.y) / (to.x - from.x)).toBeCloseTo(0.75, 9)
  })
  it('has a sphere in the triangle that touches step and lowest cable', () => {
    const { sphere } = shape.triangle!
    expect((2 * sphere.radius) / scale).toBeCloseTo(drawn(stair).bay.triangle!.sphere / inches(1), 6)
    expect(belowCable(sphere.centre)).toBeCloseTo(sphere.radius, 6)
    const [corner, upper, outer] = shape.triangle!.outline as [Spot, Spot, Spot]
    expect([sphere.centre.x + sphere.radius, sphere.centre.y + sphere.radius]).toEqual([corner.x, corner.y])
    // Both far corners lie on the lowest member.
    expect(belowCable(upper)).toBeCloseTo(0, 6)
    expect(belowCable(outer)).toBeCloseTo(0, 6)
    // The corner is one of a step's own: 48 in level, treads of 10 in from the first nosing.
    expect(shape.ground.some(({ x, y }) => Math.hypot(x - corner.x, y - corner.y) < 1e-6)).toBe(true)
  })
  it('measures openings square to the cables', () => {
    const { line } = gapOf(stair, 'between')
    // Cables 5 in apart upright are 5 · 0.8 in apart square to them.
    expect(length(line) / scale).toBeCloseTo(4 - 5 / 32, 6)
    const along = { x: to.x - from.x, y: to.y - from.y }
    expect((line[1].x - line[0].x) * along.x + (line[1].y - line[0].y) * along.y).toBeCloseTo(0, 6)
  })
  it('has steps of one riser each, the lower post one step down', () => {
    const [floor, foot, nosing] = shape.ground as [Spot, Spot, Spot]
    expect(floor.y).toBeCloseTo(foot.y, 6)
    expect((foot.y - nosing.y) / scale).toBeCloseTo(7.5, 6)
  })
})

const corner = (body: number, angle: number) =>
  checkSurvey(
    inputOf({
      posts: [post('P1'), post('P2'), post('P3')],
      bays: [bay('B1', ['P1', 'P2'], [48]), bay('B2', ['P2', 'P3'], [48])],
      runs: ['R1', 'R2'].map((id, i) => ({
        id,
        bays: [`B${i + 1}`],
        cable: 'c532',
        cables: { heights: [6] },
      })),
      corners: [{ post: 'P2', angle }],
      fittings: [{ ...exampleFitting, body, minGrip: { softwood: 1.25 } }],
    }),
  ).corners[0]!

describe('a post in section', () => {
  const cornerShape = (body: number, angle: number) => {
    const { a, b, along, across, kind } = corner(body, angle)
    const second = kind === 'turned' ? 'near' : 'right'
    return sectionShape(
      { along, across, cover: 0 },
      [
        { fitting: a.fitting, face: 'left' },
        { fitting: b.fitting, face: second },
      ],
      240,
    )
  }

  it('shows the overlap as deep as it is: 1/32 in with 1 1/2 in bodies in 3 1/2 in (common practice)', () => {
    const shape = cornerShape(1.5, 90)
    const scale = shape.post.width / 3.5
    expect(shape.overlap!.width / scale).toBeCloseTo(1 / 32, 6)
    expect(shape.fittings[0]!.hole!.height / scale).toBeCloseTo(9 / 16, 6)
    expect(shape.fittings[1]!.hole!.height / scale).toBeCloseTo(1.5, 6)
  })
  it('shows none where there is none', () => {
    expect(cornerShape(1.25, 90).overlap).toBeUndefined()
    expect(cornerShape(1.5, 180).overlap).toBeUndefined()
  })
  it('stays inside its frame with heads and cables', () => {
    for (const shape of [cornerShape(1.5, 90), cornerShape(1.5, 180)]) {
      const ends = shape.fittings.flatMap(({ cable }) => [...cable])
      for (const { x, y } of [...ends, { x: shape.post.x, y: shape.post.y }]) {
        expect(x).toBeGreaterThan(0)
        expect(x).toBeLessThan(shape.width)
        expect(y).toBeGreaterThan(0)
        expect(y).toBeLessThan(shape.height)
      }
    }
  })
  it('has core, cover, back wall and edge of one fitting to scale', () => {
    const cut = { along: inches(5), across: inches(4.5), cover: inches(0.5) }
    const fitting = { ...corner(1.5, 90).a.fitting }
    const shape = sectionShape(cut, [{ fitting, face: 'left' }], 240)
    const scale = shape.post.width / 5
    expect(shape.post.height / scale).toBeCloseTo(4.5, 6)
    expect(shape.core.width / scale).toBeCloseTo(4, 6)
    // 5 − 1 1/2 in behind the body; (4 1/2 − 2 · 1/2 − 9/16) / 2 in of core beside the hole.
    expect(length(shape.back!) / scale).toBeCloseTo(3.5, 6)
    expect(length(shape.edge!) / scale).toBeCloseTo(1.46875, 6)
  })
  it('puts a fitting on the face outside of the post', () => {
    const fitting = { ...corner(1.5, 90).a.fitting, mount: 'surface' as const, headProjection: inches(2) }
    const shape = sectionShape(
      { along: inches(4), across: inches(4), cover: 0 },
      [{ fitting, face: 'left' }],
      240,
    )
    const [drawnFitting] = shape.fittings
    expect(drawnFitting!.hole).toBeUndefined()
    expect(drawnFitting!.body).toBeUndefined()
    expect(drawnFitting!.head.x + drawnFitting!.head.width).toBeCloseTo(shape.post.x, 6)
    expect(drawnFitting!.head.width / (shape.post.width / 4)).toBeCloseTo(2, 6)
  })
})

describe('the stagger of two holes', () => {
  it('is drawn to scale where it is needed: 9/16 + 1/4 in', () => {
    const needed = corner(2, 90)
    const shape = staggerShape(needed, 240)
    const scale = shape.face.width / 3.5
    expect(length(shape.apart) / scale).toBeCloseTo(9 / 16 + 1 / 4, 6)
    // What is left between the holes is the web the house asks for.
    expect((shape.a.y - (shape.b.y + shape.b.height)) / scale).toBeCloseTo(1 / 4, 6)
    expect(shape.b.round).toBe(true)
    expect(shape.label.x).toBeLessThan(shape.width)
  })
})

describe('the size of a post as it is cut', () => {
  const check = { run: 'R1', post: 'P1', pull: 0, propped: { moment: 0 }, cantilever: { moment: 0 } }
  const survey = (along?: number, across?: number, cover?: number) => ({
    id: 'P1',
    ...(along === undefined ? {} : { along: inches(along) }),
    ...(across === undefined ? {} : { across: inches(across) }),
    ...(cover === undefined ? {} : { cover: inches(cover) }),
  })

  it('is the core with its cover on both sides', () => {
    const section = { along: inches(3.5), across: inches(5.5) }
    expect(postCut({ ...check, section }, survey(7, 5, 0.75))).toEqual({
      along: inches(5),
      across: inches(7),
      cover: inches(0.75),
    })
  })
  it('turns with the run where only the body tells', () => {
    const { fitting } = corner(1.5, 90).a
    const turned = { ...check, fitting, backLeft: inches(6) - inches(1.5) }
    expect(postCut(turned, survey(4, 6))).toMatchObject({ along: inches(6), across: inches(4) })
    expect(postCut(check, survey(4, 6))).toMatchObject({ along: inches(4), across: inches(6) })
  })
  it('is nothing while a size is missing', () => {
    expect(postCut(check, survey(4))).toBeUndefined()
  })
})

describe('the parts of a drawing', () => {
  it('holds a line by ticks square to it, 8 long', () => {
    const ticks = endTicks([
      { x: 0, y: 0 },
      { x: 30, y: 40 },
    ])
    for (const [from, to] of ticks) {
      expect(distance(from, to)).toBeCloseTo(8, 9)
      expect((to.x - from.x) * 3 + (to.y - from.y) * 4).toBeCloseTo(0, 9)
    }
  })
  it('finds what rectangles share, and nothing where they only touch', () => {
    const a = { x: 0, y: 0, width: 4, height: 2 }
    expect(meet(a, { x: 3, y: 1, width: 4, height: 4 })).toEqual({ x: 3, y: 1, width: 1, height: 1 })
    expect(meet(a, { x: 4, y: 0, width: 1, height: 1 })).toBeUndefined()
  })
})
