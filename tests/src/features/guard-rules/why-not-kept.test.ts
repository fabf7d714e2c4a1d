import { describe, expect, it } from 'vitest'
import { publishedRules } from '@shared/calculation/guard-rules/published-rules'
import { irc2021 } from '@shared/calculation/guard-rules/irc'
import type { GuardRules } from '@shared/schemas/guard-rules'
import { inches } from '@shared/units/length'
import { refusalAt } from '@/lib/refusal'
import { whyNotKept } from '../../../../src/features/guard-rules/why-not-kept'

const climb = (from: number, to: number): GuardRules => ({
  ...irc2021,
  climbable: { from: inches(from), to: inches(to), section: 'own rule', basis: 'own' },
})

describe('rules that cannot be meant', () => {
  it.each(publishedRules)('none of the published: $name $edition', (rules) => {
    expect(whyNotKept(rules)).toBeUndefined()
  })

  it('a band for climbing that ends where it begins, or below', () => {
    expect(whyNotKept(climb(5, 6))).toBeUndefined()
    expect(refusalAt(whyNotKept(climb(6, 6)), 'climbable.to', '')).toMatch(/above/)
    expect(refusalAt(whyNotKept(climb(7, 6)), 'climbable.to', '')).toMatch(/above/)
  })

  it('a handrail whose least height is above its greatest', () => {
    const handrail = (least: number, most: number): GuardRules => ({
      ...irc2021,
      handrail: { least: inches(least), most: inches(most), section: 'own rule', basis: 'own' },
    })
    expect(whyNotKept(handrail(34, 34))).toBeUndefined()
    expect(refusalAt(whyNotKept(handrail(38, 34)), 'handrail.most', '')).toMatch(/below/)
  })

  it('an id that is the address of another page', () => {
    expect(refusalAt(whyNotKept({ ...irc2021, id: 'new' }), 'id', '')).toMatch(/Choose another id/)
  })
})
