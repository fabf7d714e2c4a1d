import { expect, it } from 'vitest'
import { makeHouseRulesSchema } from '@shared/schemas/house-rules'
import { storedQuantities } from '@shared/schemas/quantities'
import { ruleGroups } from '../../../../src/features/hardware/rule-list'

it('shows every house rule exactly once', () => {
  const shown = ruleGroups.flatMap(({ rules }) => rules.map(({ key }) => key))
  expect(shown.toSorted()).toEqual(Object.keys(makeHouseRulesSchema(storedQuantities).shape).toSorted())
})
