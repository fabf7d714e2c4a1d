import { describe, expect, it } from 'vitest'
import { inches } from '@shared/units/length'
import { type DrawnFitting, fittingShape } from '../../../../src/features/hardware/fitting-shape'

const sleeve: DrawnFitting = {
  mount: 'drilled',
  body: inches(1.5),
  headProjection: inches(0.25),
  cutPastFace: inches(1),
  takeUp: inches(0.75),
}

describe('the shape of a fitting', () => {
  it('lies to one scale: 3 1/2 in of post, 1/4 in of head and 1 1/4 in of cable over the width', () => {
    // 5 in in all, so 500 units make 100 to the inch.
    const shape = fittingShape(sleeve, 500)
    expect(shape.post).toEqual({ from: 0, to: 350 })
    expect(shape.body).toEqual({ from: 200, to: 350 })
    expect(shape.head).toEqual({ from: 350, to: 375 })
    expect(shape.cutPastFace).toEqual({ from: 275, to: 375 })
    expect(shape.takeUp).toEqual({ from: 200, to: 275 })
    expect(shape.cable).toEqual({ from: 275, to: 500 })
  })

  it('says that a cut 1 in past a head 1/4 in proud ends 3/4 in past the post’s face', () => {
    expect(fittingShape(sleeve, 500).depth).toBe(inches(0.75))
  })

  it('ends a cable before the face of the post where the fitting stands on it', () => {
    const plate = { ...sleeve, mount: 'surface' as const, body: inches(0), headProjection: inches(2.5) }
    const shape = fittingShape(plate, 500)
    expect(shape.depth).toBe(inches(-1.5))
    expect(shape.body).toBeUndefined()
    expect(shape.cable.from).toBeGreaterThan(shape.post.to)
  })

  it('draws a deeper post for a body that leaves no back wall in 3 1/2 in', () => {
    expect(fittingShape({ ...sleeve, body: inches(4) }, 500).postDepth).toBe(inches(4.5))
    expect(fittingShape({ ...sleeve, body: inches(3) }, 500).postDepth).toBe(inches(3.5))
  })

  it.each([
    ['a cut far past the post', { cutPastFace: inches(9) }],
    ['a cut outside the head', { cutPastFace: inches(-2) }],
    ['a long take-up', { takeUp: inches(12) }],
    ['no head', { headProjection: inches(0) }],
  ])('keeps everything inside the drawing: %s', (_name, change) => {
    const { post, body, head, cutPastFace, takeUp, cable } = fittingShape({ ...sleeve, ...change }, 500)
    for (const span of [post, body!, head, cutPastFace, takeUp, cable]) {
      expect(span.from).toBeGreaterThanOrEqual(-1e-9)
      expect(span.to).toBeLessThanOrEqual(500 + 1e-9)
      expect(span.to).toBeGreaterThanOrEqual(span.from)
    }
  })

  it('takes hole and spot-face as heights, to the same scale', () => {
    const shape = fittingShape({ ...sleeve, hole: inches(0.5), spotFace: inches(1) }, 500)
    expect(shape.bodyHeight).toBe(50)
    expect(shape.headHeight).toBe(100)
  })
})
