import { describe, expect, it } from 'vitest'
import { checkSurvey } from '@shared/calculation/checks/check-survey'
import { bayShape, type Spot } from '../../../../src/features/checks/bay-shape'
import { cornerShape } from '../../../../src/features/checks/corner-shape'
import { inches } from '@shared/units/length'
import { bay, exampleFitting, type Given, inputOf, post } from '../../../shared/calculation/support/inputs'

const drawn = (given: Given) => {
  const { bays, runs } = checkSurvey(inputOf(given))
  return {
    bay: bays[0]!,
    run: runs[0]!,
    guardHeight: inches(36),
    postWidth: inches(3.5),
    diameter: inches(5 / 32),
  }
}
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
  const scale = distance(...shape.cables[0]!) / 48

  it('is to scale in both directions, inside its frame', () => {
    // Cables at 3 and 6 in are 3 in apart on the drawing; the sphere is 4 in, in the widest opening, 6 to 10 in.
    expect(distance(shape.cables[0]![0], shape.cables[1]![0]) / scale).toBeCloseTo(3, 6)
    expect((2 * shape.sphere!.radius) / scale).toBeCloseTo(4, 6)
    const [lower, upper] = [shape.cables[1]![0].y, shape.cables[2]![0].y]
    expect(shape.sphere!.centre.y).toBeCloseTo((lower + upper) / 2, 6)
    // 4 in between centres less 5/32 in of cable.
    expect(distance(...shape.opening!) / scale).toBeCloseTo(4 - 5 / 32, 6)
    for (const { x, y } of [...shape.posts.flat(), ...shape.rail, ...shape.ground]) {
      expect(x).toBeGreaterThanOrEqual(0)
      expect(x).toBeLessThanOrEqual(shape.width)
      expect(y).toBeGreaterThanOrEqual(0)
      expect(y).toBeLessThanOrEqual(shape.height)
    }
  })
  it('draws spacers where they halve the span', () => {
    expect(shape.spacers).toHaveLength(1)
    expect(distance(...shape.span) / scale).toBeCloseTo(24, 6)
  })
  it('runs along the pitch on a stair, with a sphere that touches step and lowest cable', () => {
    const onStairs = bayShape(drawn(stair), 420)
    const [from, to] = onStairs.cables[0]!
    // 7 1/2 over 10.
    expect((from.y - to.y) / (to.x - from.x)).toBeCloseTo(0.75, 9)
    const pixels = distance(from, to) / 60
    const { triangle } = drawn(stair).bay
    expect((2 * onStairs.triangle!.radius) / pixels).toBeCloseTo(triangle!.sphere / inches(1), 6)
    // The lowest cable’s lower edge runs half its thickness, square to it, below its centre line.
    const { centre, radius } = onStairs.triangle!
    const toLine =
      ((centre.y - from.y) * (to.x - from.x) - (centre.x - from.x) * (to.y - from.y)) / distance(from, to)
    expect(toLine - (5 / 64) * pixels).toBeCloseTo(radius, 6)
  })
})

describe('the corner in section', () => {
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

  it('shows the overlap as deep as it is: 1/32 in with 1 1/2 in bodies in 3 1/2 in (common practice)', () => {
    const shape = cornerShape(corner(1.5, 90), 240)
    const scale = shape.post.width / 3.5
    expect(shape.overlap!.width / scale).toBeCloseTo(1 / 32, 6)
    expect(shape.a.height / scale).toBeCloseTo(9 / 16, 6)
  })
  it('shows none where there is none', () => {
    expect(cornerShape(corner(1.25, 90), 240).overlap).toBeUndefined()
    expect(cornerShape(corner(1.5, 180), 240).overlap).toBeUndefined()
  })
})
