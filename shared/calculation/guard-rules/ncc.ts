import { defineRules, METRIC } from './define'

/** Australia: ABCB Housing Provisions Standard 2022, 11.3.3, 11.3.4 and 11.3.6. */
export const ncc2022 = defineRules({
  id: 'ncc-2022',
  name: 'National Construction Code, Housing Provisions (Australia)',
  edition: '2022',
  units: METRIC,
  neededOver: { value: 1000, section: '11.3.3', basis: 'read' },
  situations: [
    {
      id: 'dwelling',
      name: 'Houses and their outbuildings',
      height: { value: 1000, section: '11.3.4', basis: 'read' },
    },
  ],
  stairHeight: { value: 865, section: '11.3.4', basis: 'read' },
  sphere: { value: 125, section: '11.3.4', basis: 'read' },
  climbable: { fallOver: 4000, from: 150, to: 760, section: '11.3.4', basis: 'read' },
  wireTables: { section: '11.3.6', basis: 'read' },
})
