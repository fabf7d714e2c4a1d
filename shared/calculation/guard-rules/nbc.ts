import { defineRules, METRIC } from './define'

/** National Building Code of Canada 2020, Division B, 9.8.8. */
export const nbc2020 = defineRules({
  id: 'nbc-2020',
  name: 'National Building Code of Canada',
  edition: '2020',
  units: METRIC,
  neededOver: { value: 600, section: '9.8.8.1', basis: 'read' },
  situations: [
    {
      id: 'general',
      name: 'General',
      height: { value: 1070, section: '9.8.8.3', basis: 'read' },
    },
    {
      id: 'exterior-one-dwelling',
      name: 'Exterior, serving one dwelling, at most 1800 mm above the ground',
      height: { value: 900, section: '9.8.8.3', basis: 'read' },
      upToFall: 1800,
    },
  ],
  sphere: { value: 100, section: '9.8.8.5', basis: 'read' },
  stairTriangle: { value: 150, section: '9.8.8.5', basis: 'read' },
  infillLoad: { value: 500, side: 300, section: '9.8.8.2', basis: 'read' },
  climbable: { fallOver: 4200, from: 140, to: 900, section: '9.8.8.6', basis: 'read' },
})
