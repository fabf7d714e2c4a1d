import { expect, it } from 'vitest'
import { starterHardware } from '@shared/calculation/starter-hardware'
import { longestRun } from '@shared/survey/longest-run'
import { inches } from '@shared/units/length'

const [fitting] = starterHardware.fittings
const fittings = [240, 480].map((most) => ({ ...fitting!, cables: ['c532'], maxRun: inches(most) }))

it.each([
  ['c532', undefined, inches(480)],
  ['c532', inches(300), inches(300)],
  ['c532', inches(600), inches(480)],
  ['c18', inches(600), inches(600)],
  ['c18', undefined, undefined],
])('for %s in a house of %s', (cable, house, longest) => {
  expect(longestRun({ fittings }, { longestRun: house }, cable)).toBe(longest)
})

it('sets no limit where a fitting has none', () => {
  const endless = { ...fitting!, cables: ['c532'], maxRun: undefined }
  expect(longestRun({ fittings: [...fittings, endless] }, {}, 'c532')).toBeUndefined()
})
