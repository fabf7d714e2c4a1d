import { describe, expect, it } from 'vitest'
import type { Finding, Overrule } from '@shared/schemas/finding'
import { mayBeOverruled, overrulePlace, overrulingOf, standingStops } from '@shared/survey/overrule'

const stop: Finding = { level: 'stop', code: 'guard-too-low', where: {}, text: 'The guard is 35 in high.' }
const bayStop: Finding = {
  level: 'stop',
  code: 'opening-between',
  where: { run: 'R1', bay: 'B1' },
  text: 'It is 4 in.',
}
const check: Finding = { ...bayStop, level: 'check' }
const overrule = ({ code, where, text }: Finding): Overrule => ({
  code,
  where,
  text,
  reason: 'A wall stands there',
})

describe('an overruled stop', () => {
  it('stands for the very finding that was read, and no more once its numbers change', () => {
    const survey = { overruled: [overrule(stop)] }
    expect(overrulingOf(survey, stop)).toMatchObject({ stands: true })
    expect(overrulingOf(survey, { ...stop, text: 'The guard is 34 in high.' })).toMatchObject({
      stands: false,
    })
    expect(standingStops(survey, [stop, bayStop, check])).toEqual([bayStop])
    expect(standingStops(survey, [{ ...stop, text: 'The guard is 34 in high.' }])).toHaveLength(1)
  })
  it('is found by its code and its whole place', () => {
    const survey = { overruled: [overrule(stop), overrule(bayStop)] }
    expect(overrulePlace(survey, bayStop)).toBe(1)
    expect(overrulePlace(survey, { ...bayStop, where: { run: 'R1', bay: 'B2' } })).toBeUndefined()
    expect(overrulePlace(survey, { ...bayStop, where: { run: 'R1' } })).toBeUndefined()
    expect(overrulingOf(survey, check)).toBeUndefined()
  })
  it('is a matter of judgement: what is missing or cannot be cut is none', () => {
    expect(mayBeOverruled(stop)).toBe(true)
    for (const code of [
      'missing-reading',
      'missing-size',
      'broken-run',
      'no-fitting',
      'too-long',
      'impossible-readings',
    ])
      expect(mayBeOverruled({ code }), code).toBe(false)
  })
})
