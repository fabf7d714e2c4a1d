import { expect, it } from 'vitest'
import { makeHouseRulesSchema } from '@shared/schemas/house-rules'
import { storedQuantities } from '@shared/schemas/quantities'
import { ruleGroups } from '../../../../src/features/hardware/rule-list'

it('shows every house rule exactly once, but the lumber, which has a list of its own', () => {
  const shown = ruleGroups.flatMap(({ rules }) => rules.map(({ key }) => key))
  expect([...shown, 'lumber'].toSorted()).toEqual(
    Object.keys(makeHouseRulesSchema(storedQuantities).shape).toSorted(),
  )
})
