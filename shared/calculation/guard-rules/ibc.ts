import { defineRules, INCH_POUND } from './define'

/** International Building Code 2021, 1015 and 1607; loads as ASCE 7, 4.5.1. */
export const ibc2021 = defineRules({
  id: 'ibc-2021',
  name: 'International Building Code',
  edition: '2021',
  units: INCH_POUND,
  neededOver: { value: 30, section: '1015.2', basis: 'memory' },
  situations: [
    {
      id: 'building',
      name: 'Other than inside dwelling units',
      height: { value: 42, section: '1015.3', basis: 'memory' },
    },
    {
      id: 'dwelling-unit',
      name: 'Dwelling units',
      height: { value: 36, section: '1015.3, exceptions', basis: 'memory' },
    },
  ],
  sphere: { value: 4, section: '1015.4', basis: 'copy' },
  upperSphere: { above: 36, value: 4.375, section: '1015.4', basis: 'copy' },
  stairTriangle: { value: 6, section: '1015.4', basis: 'copy' },
  riser: { value: 7, section: '1011.5.2', basis: 'memory' },
  tread: { value: 11, section: '1011.5.2', basis: 'memory' },
  topLoad: { value: 200, section: '1607; ASCE 7, 4.5.1', basis: 'read' },
  infillLoad: { value: 50, side: 12, section: '1607; ASCE 7, 4.5.1', basis: 'read' },
  notes: [
    {
      text: 'The top carries 50 lb on each foot as well, one- and two-family dwellings excepted.',
      section: '1607; ASCE 7, 4.5.1',
      basis: 'read',
    },
  ],
})
