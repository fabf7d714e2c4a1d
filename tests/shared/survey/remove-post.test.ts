import { describe, expect, it } from 'vitest'
import { applyOperation } from '@shared/survey/apply-operation'
import { removeBays } from '@shared/survey/remove-bay'
import { removePosts } from '@shared/survey/remove-post'
import { inches } from '@shared/units/length'
import { aRow, aRun } from '../../factories/survey'

const survey = aRow([48, 47, 46, 45], {
  runs: [
    aRun('R1', ['B1', 'B2', 'B3', 'B4'], { tension: 700, readings: [{ id: 'r1', value: inches(196.5) }] }),
    aRun('R2', ['B1']),
  ],
  diagonals: [{ id: 'D1', from: 'P1', to: 'P3', value: inches(99) }],
  corners: [{ post: 'P1', angle: 90 }],
  photos: [
    { id: 'F1', file: 'a.jpg', posts: { P1: { base: [1, 2] }, P2: { base: [3, 4] } } },
    { id: 'F2', file: 'b.jpg', posts: { P1: { base: [5, 6] } } },
  ],
})
const bays = (changed: typeof survey) => changed.runs.map((run) => [run.id, ...run.bays])

describe('removing a bay', () => {
  it('at the end of a run shortens it and strikes the overall reading, with the reason', () => {
    const changed = applyOperation(survey, removeBays(survey, ['B4']))
    expect(bays(changed)).toEqual([
      ['R1', 'B1', 'B2', 'B3'],
      ['R2', 'B1'],
    ])
    expect(changed.runs[0]?.readings).toEqual([
      { id: 'r1', at: 'top', value: inches(196.5), struck: 'the run ends elsewhere now' },
    ])
  })

  it('in the middle divides the run; the second part keeps cable, tension and layout', () => {
    const changed = applyOperation(survey, removeBays(survey, ['B2']))
    expect(bays(changed)).toEqual([
      ['R1', 'B1'],
      ['R3', 'B3', 'B4'],
      ['R2', 'B1'],
    ])
    expect(changed.runs[1]).toEqual({ ...survey.runs[0], id: 'R3', bays: ['B3', 'B4'], readings: [] })
  })

  it('that is all a run has removes the run', () => {
    expect(bays(applyOperation(survey, removeBays(survey, ['B1'])))).toEqual([['R1', 'B2', 'B3', 'B4']])
  })

  it('leaves a run alone that does not hold it', () => {
    const changed = applyOperation(survey, removeBays(survey, ['B4']))
    expect(changed.runs[1]).toBe(survey.runs[1])
  })

  it('that is not there is refused', () => {
    expect(() => removeBays(survey, ['B9'])).toThrow(/no bay B9/)
  })
})

describe('removing a post', () => {
  it('removes its bays, diagonals, corner angle and marks', () => {
    const changed = applyOperation(survey, removePosts(survey, ['P1']))
    expect(changed.posts.map(({ id }) => id)).toEqual(['P2', 'P3', 'P4', 'P5'])
    expect(changed.bays.map(({ id }) => id)).toEqual(['B2', 'B3', 'B4'])
    expect(bays(changed)).toEqual([['R1', 'B2', 'B3', 'B4']])
    expect(changed).toMatchObject({ diagonals: [], corners: [] })
    expect(changed.photos.map(({ posts }) => posts)).toEqual([{ P2: { base: [3, 4] } }, {}])
  })

  it('leaves its neighbours and all else', () => {
    const changed = applyOperation(survey, removePosts(survey, ['P5']))
    expect(changed.diagonals).toBe(survey.diagonals)
    expect(changed.photos).toBe(survey.photos)
    expect(changed.posts[0]).toBe(survey.posts[0])
  })

  it('that is not there is refused', () => {
    expect(() => removePosts(survey, ['P9'])).toThrow(/no post P9/)
  })
})
