import { describe, expect, it } from 'vitest'
import { newBay } from '@shared/survey/new-bay'
import { surveyOperationSchema } from '@shared/survey/survey-operation'
import { inches } from '@shared/units/length'
import { describeOperation } from '../../../../../src/features/survey-editor/table/describe-operation'

const format = { style: 'inches', finest: 16 } as const
const bay = newBay({ id: 'B1', from: 'P1', to: 'P2' })

describe('describeOperation', () => {
  it('says what was read, and what a gesture did step by step', () => {
    const reading = { id: 'r1', at: 'top' as const, value: inches(46.5) }
    expect(describeOperation({ type: 'reading.add', of: { kind: 'bay', id: 'B1' }, reading }, format)).toBe(
      'read 46 1/2" at the top of bay B1',
    )
    expect(
      describeOperation(
        {
          type: 'group',
          operations: [
            { type: 'post.add', post: { id: 'P2' } },
            { type: 'bay.add', bay },
          ],
        },
        format,
      ),
    ).toBe('put post P2; joined P1 and P2 by bay B1')
    expect(
      describeOperation(
        { type: 'post.set', id: 'P1', set: { material: 'hardwood' }, unset: ['cover'] },
        format,
      ),
    ).toBe('changed post P1: material, cover')
  })

  it('names what changed of the guard in words', () => {
    const set = { topRailUnderside: inches(34.5), stairSphere: inches(4) }
    expect(describeOperation({ type: 'guard.set', set, unset: ['stair'] }, format)).toBe(
      'changed the guard: top rail underside, sphere that must not pass on stairs, heights on stairs',
    )
  })

  it('has a sentence for every kind of change', () => {
    const example = {
      id: 'X1',
      post: { id: 'P1' },
      bay,
      run: { id: 'R1', bays: ['B1'], cable: 'c1' },
      of: { kind: 'run', id: 'R1' },
      reading: { id: 'r1', value: 1 },
      reason: 'misread',
      corner: { post: 'P1', angle: 90 },
      diagonal: { id: 'D1', from: 'P1', to: 'P2', value: 1 },
      photo: { id: 'F1', file: 'deck.jpg' },
      mark: { base: [1, 2] },
      rectangle: {
        width: 1,
        depth: 1,
        corners: [
          [0, 0],
          [0, 1],
          [1, 1],
          [1, 0],
        ],
      },
      overrule: { code: 'guard-too-low', where: {}, text: 'Too low.', reason: 'A wall stands there' },
      code: 'guard-too-low',
      where: {},
      set: {},
      unset: [],
      operations: [{ type: 'post.remove', id: 'P1' }],
    }
    for (const option of surveyOperationSchema.options) {
      const keys = Object.keys(option.shape)
      const [type] = [...option.shape.type.values]
      const given = Object.fromEntries(
        keys.flatMap((key) => (key in example ? [[key, example[key as keyof typeof example]]] : [])),
      )
      const names =
        type?.startsWith('photo.') && type !== 'photo.add' && type !== 'photo.remove' ? { photo: 'F1' } : {}
      const marked =
        type === 'photo.mark' || type === 'photo.unmark' || type === 'corner.remove' ? { post: 'P1' } : {}
      const operation = surveyOperationSchema.parse({ ...given, ...names, ...marked, type })
      expect(describeOperation(operation, format), type).toMatch(/^\w.* .*\w/)
    }
  })
})
