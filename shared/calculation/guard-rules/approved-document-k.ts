import { defineRules, METRIC } from './define'

/** England: Approved Document K, 2013, requirement K2. */
export const approvedDocumentK2013 = defineRules({
  id: 'adk-2013',
  name: 'Approved Document K (England)',
  edition: '2013',
  units: METRIC,
  neededOver: { value: 600, section: 'K2, 3.1', basis: 'memory' },
  situations: [
    {
      id: 'external-balcony',
      name: 'External balconies of dwellings',
      height: { value: 1100, section: 'K2, Diagram 3.1', basis: 'read' },
    },
    {
      id: 'dwelling',
      name: 'Inside dwellings: stairs, landings, edges of floors',
      height: { value: 900, section: 'K2, Diagram 3.1', basis: 'read' },
    },
  ],
  stairHeight: { value: 900, section: 'K2, Diagram 3.1', basis: 'read' },
  sphere: { value: 100, section: 'K2, 3.3', basis: 'read' },
  climbable: { from: 0, to: 1100, advice: true, section: 'K2, 3.3', basis: 'read' },
  notes: [
    {
      text: 'The opening rule holds where children under five may be present.',
      section: 'K2, 3.3',
      basis: 'read',
    },
  ],
})
