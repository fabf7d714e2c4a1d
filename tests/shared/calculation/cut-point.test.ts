import { describe, expect, it } from 'vitest'
import { cutDepth } from '@shared/calculation/cut-point'
import { inches, toInches } from '@shared/units/length'

describe('cutDepth', () => {
  it('is 3/4 in for a fitting 1/4 in proud with its cut point 1 in past its face', () => {
    expect(toInches(cutDepth({ cutPastFace: inches(1), headProjection: inches(0.25) }))).toBe(0.75)
  })

  it('is negative where the end stays outside the post', () => {
    expect(toInches(cutDepth({ cutPastFace: inches(1), headProjection: inches(2.5) }))).toBe(-1.5)
  })
})
