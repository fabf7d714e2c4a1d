import { expect, it } from 'vitest'
import { irc2021 } from '@shared/calculation/guard-rules/irc'
import { guardRulesSchema } from '@shared/schemas/guard-rules'
import { inches } from '@shared/units/length'
import { asOwn, ownCopy } from '../../../../src/features/guard-rules/own-copy'

it('copies every figure with its section and basis, and says what it was made from', () => {
  const copy = ownCopy(irc2021, [])
  expect(copy.id).toBe('own-irc-2021')
  expect(copy.basedOn).toBe('International Residential Code 2021')
  expect(copy.sphere).toEqual({ value: inches(4), section: 'R312.1.3', basis: 'read' })
  expect(guardRulesSchema.safeParse(copy).success).toBe(true)
})

it('takes an id that is free, and no longer than an id may be', () => {
  expect(ownCopy(irc2021, [{ id: 'own-irc-2021' }, { id: 'own-irc-2021-2' }]).id).toBe('own-irc-2021-3')
  const long = { ...irc2021, id: 'a'.repeat(40) }
  const first = ownCopy(long, [])
  const second = ownCopy(long, [first])
  expect(first.id).toHaveLength(40)
  expect(second.id).toHaveLength(40)
  expect(second.id).not.toBe(first.id)
  expect(guardRulesSchema.safeParse(second).success).toBe(true)
})

it('makes a changed figure the company’s own, in the section it stood in', () => {
  expect(asOwn(inches(42), { section: 'R312.1.2', basis: 'read' })).toEqual({
    value: inches(42),
    section: 'R312.1.2',
    basis: 'own',
  })
  expect(asOwn(inches(42), undefined)).toMatchObject({ section: 'own rule', basis: 'own' })
})
