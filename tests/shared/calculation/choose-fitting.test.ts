import { describe, expect, it } from 'vitest'
import { chooseFitting, type FittingEnd } from '@shared/calculation/choose-fitting'
import { type Fitting, makeFittingSchema } from '@shared/schemas/hardware'
import type { Post } from '@shared/schemas/post'
import { quantitiesIn } from '@shared/schemas/quantities'
import { inches, toInches } from '@shared/units/length'
import { exampleFitting } from './support/inputs'

const schema = makeFittingSchema(quantitiesIn({ length: 'in', force: 'lbf' }))
const fitting = (id: string, more: object = {}): Fitting => schema.parse({ ...exampleFitting, id, ...more })

const softwood: Post = { id: 'P1', material: 'softwood' }
const end = (post: Post = softwood, more: Partial<FittingEnd> = {}): FittingEnd => ({
  post,
  size: inches(3.5),
  angle: 0,
  ...more,
})
const choose = (where: FittingEnd, ...fittings: Fitting[]) =>
  chooseFitting(where, { cable: 'c532', fittings, backWall: inches(0.5) })
const whyNot = (where: FittingEnd, only: Fitting) => choose(where, only).passedOver[0]?.reason

describe('a fitting that does not suit', () => {
  it('is not made for the post’s own material, whatever its core', () => {
    const veneered: Post = { id: 'P1', material: 'veneered', core: 'softwood', cover: inches(0) }
    expect(whyNot(end(veneered), fitting('F1'))).toEqual({ because: 'material', material: 'veneered' })
    expect(whyNot(end({ id: 'P1' }), fitting('F1'))?.because).toBe('material')
  })

  it('does not take the cable', () => {
    expect(whyNot(end(), fitting('F1', { cables: ['c18'] }))).toEqual({ because: 'cable', cable: 'c532' })
  })

  it('does not take the angle; its very limit it does', () => {
    expect(whyNot(end(softwood, { angle: 5.01 }), fitting('F1'))).toEqual({
      because: 'angle',
      angle: 5.01,
      most: 5,
    })
    expect(whyNot(end(softwood, { angle: 5 }), fitting('F1'))).toBeUndefined()
  })

  it('grips too little of the core under a cover', () => {
    const covered = { ...softwood, cover: inches(0.75) }
    // 1.5 − 0.75 = 0.75, less than 1.5; a body of 2.25 is just enough
    const reason = whyNot(end(covered), fitting('F1'))
    expect(reason).toEqual({ because: 'grip', core: 'softwood', grip: inches(0.75), least: inches(1.5) })
    expect(whyNot(end(covered), fitting('F2', { body: 2.25 }))).toBeUndefined()
  })

  it('is judged by the core’s own grip', () => {
    const veneered = (core: Post['core']): Post => ({
      id: 'P1',
      material: 'veneered',
      core,
      cover: inches(0.25),
    })
    const any = fitting('F1', { materials: ['veneered'] })
    // Grip 1.25: enough for hardwood (1.25), too little for softwood (1.5), unknown for metal
    expect(whyNot(end(veneered('hardwood')), any)).toBeUndefined()
    expect(whyNot(end(veneered('softwood')), any)?.because).toBe('grip')
    expect(whyNot(end(veneered('metal')), any)).toEqual({ because: 'core-not-listed', core: 'metal' })
    expect(whyNot(end(veneered(undefined)), any)).toEqual({ because: 'core-not-listed', core: 'veneered' })
  })

  it('leaves no back wall; exactly the back wall is enough', () => {
    expect(whyNot(end(), fitting('F1', { body: 3 }))).toBeUndefined()
    const reason = whyNot(end(), fitting('F1', { body: 3.0625 }))
    expect(reason).toEqual({ because: 'back-wall', body: inches(3.0625), most: inches(3) })
  })

  it('cannot be judged without the post’s size, if drilled', () => {
    expect(whyNot(end(softwood, { size: undefined }), fitting('F1'))).toEqual({ because: 'size-missing' })
  })

  it('is spared grip and depth on the face', () => {
    const plate = fitting('F1', { mount: 'surface', minGrip: {}, body: 9 })
    expect(whyNot(end(softwood, { size: undefined }), plate)).toBeUndefined()
  })
})

describe('of those that suit', () => {
  it('the shortest body is taken', () => {
    const { chosen, passedOver } = choose(
      end(),
      fitting('A', { body: 2 }),
      fitting('B', { body: 1.5, price: 90 }),
    )
    expect(chosen?.id).toBe('B')
    expect(passedOver.map(({ fitting: { id }, reason }) => [id, reason])).toEqual([
      ['A', { because: 'longer-body', body: inches(2), chosen: inches(1.5) }],
    ])
    expect(toInches(chosen?.body ?? NaN)).toBe(1.5)
  })

  it('then the lowest price, one without a price last', () => {
    const [dear, cheap, { price: _, ...unpriced }] = [
      fitting('A', { price: 9 }),
      fitting('B', { price: 8 }),
      fitting('0'),
    ]
    const { chosen, passedOver } = choose(end(), dear, unpriced, cheap)
    expect(chosen?.id).toBe('B')
    expect(passedOver.map(({ reason }) => reason.because)).toEqual(['price', 'price'])
  })

  it('then the first by id', () => {
    const { chosen, passedOver } = choose(end(), fitting('B'), fitting('A'))
    expect(chosen?.id).toBe('A')
    expect(passedOver[0]?.reason.because).toBe('id')
  })

  it('the catalogue’s own order is left alone', () => {
    const fittings = [fitting('B'), fitting('A')]
    chooseFitting(end(), { cable: 'c532', fittings, backWall: inches(0.5) })
    expect(fittings.map(({ id }) => id)).toEqual(['B', 'A'])
  })
})
