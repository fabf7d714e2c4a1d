import { describe, expect, it } from 'vitest'
import { irc2021 } from '@shared/calculation/guard-rules/irc'
import type { GuardRules } from '@shared/schemas/guard-rules'
import { type Survey, surveySchema } from '@shared/schemas/survey'
import { inches, millimetres } from '@shared/units/length'
import { askedHeights } from '../../../../../src/features/survey-editor/panels/asked-heights'

interface Given {
  guard?: Record<string, unknown>
  stairs?: boolean
}

const survey = ({ guard = {}, stairs = false }: Given): Survey =>
  surveySchema.parse({
    format: 'tautbook.survey',
    version: 1,
    units: { length: 'in', force: 'lbf' },
    title: 'Deck',
    guard,
    posts: [{ id: 'P1' }, { id: 'P2' }],
    bays: [{ id: 'B1', from: 'P1', to: 'P2', kind: stairs ? 'stair' : 'level' }],
  })

const own: GuardRules = {
  ...irc2021,
  id: 'own-42',
  name: 'Our rules',
  situations: [
    {
      id: 'dwelling',
      name: 'Everywhere',
      height: { value: inches(42), section: 'house rule', basis: 'own' },
    },
  ],
}

describe('the heights that rules ask for', () => {
  it('is nothing to change where the guard has them', () => {
    const asked = askedHeights(survey({ guard: { height: inches(36) } }), [])
    expect(asked?.height.section).toBe('R312.1.2')
    expect(asked?.tooLow).toBe(false)
    expect(asked?.change).toBeUndefined()
  })

  it('raises a guard of 36 in to the 42 in of own rules, its rail with it', () => {
    const guard = { rules: 'own-42', height: inches(36), topRailUnderside: inches(34.5) }
    const asked = askedHeights(survey({ guard }), [own])
    expect(asked?.tooLow).toBe(true)
    expect(asked?.change).toEqual({ height: inches(42), topRailUnderside: inches(40.5) })
  })

  it('calls a higher guard not too low, and can still be made what is asked', () => {
    const asked = askedHeights(survey({ guard: { height: inches(42) } }), [])
    expect(asked?.tooLow).toBe(false)
    expect(asked?.change).toEqual({ height: inches(36) })
  })

  it('keeps the rest of what was said of stairs', () => {
    const guard = { height: inches(36), stair: { bottom: inches(2) } }
    const asked = askedHeights(survey({ guard, stairs: true }), [])
    // IRC 2021 R312.1.2, exception 1: 34 in above the nosing line.
    expect(asked?.stair?.value).toBe(inches(34))
    expect(asked?.change).toEqual({ stair: { bottom: inches(2), height: inches(34) } })
  })

  it('leaves stairs alone that follow the guard to one height', () => {
    const flat: GuardRules = { ...own, stairHeight: undefined }
    const asked = askedHeights(survey({ guard: { rules: 'own-42', height: inches(36) }, stairs: true }), [
      flat,
    ])
    expect(asked?.tooLow).toBe(true)
    expect(asked?.change).toEqual({ height: inches(42) })
  })

  it('takes the height of the situation that was chosen, else the strictest', () => {
    const nbc = (situation?: string) =>
      askedHeights(survey({ guard: { rules: 'nbc-2020', ...(situation ? { situation } : {}) } }), [])?.height
        .value
    // NBC 2020, 9.8.8.3
    expect(nbc()).toBe(millimetres(1070))
    expect(nbc('exterior-one-dwelling')).toBe(millimetres(900))
  })

  it('asks nothing in the name of rules that nobody knows', () => {
    expect(askedHeights(survey({ guard: { rules: 'gone' } }), [])).toBeUndefined()
  })
})
