import { defineRules, INCH_POUND } from './define'

/** Figures of the International Residential Code, R312.1 (2018, 2021) and R321.1 (2024); loads of Table R301.5. */
const figures = {
  units: INCH_POUND,
  notes: [
    {
      text: 'The top of the guard carries 200 lb at any point in any direction; not together with the load on the infill.',
      section: 'Table R301.5, notes',
      basis: 'read' as const,
    },
    {
      text: 'Risers and treads of one flight differ by at most 3/8 in. A handrail is needed at four risers or more.',
      section: 'R311.7',
      basis: 'copy' as const,
    },
  ],
  topLoad: { value: 200, section: 'Table R301.5', basis: 'read' as const },
  infillLoad: { value: 50, side: 12, section: 'Table R301.5, notes', basis: 'read' as const },
}

const before2024 = {
  ...figures,
  name: 'International Residential Code',
  neededOver: { value: 30, section: 'R312.1.1', basis: 'read' as const },
  situations: [
    {
      id: 'dwelling',
      name: 'One- and two-family dwellings',
      height: { value: 36, section: 'R312.1.2', basis: 'read' as const },
    },
  ],
  stairHeight: { value: 34, section: 'R312.1.2, exception 1', basis: 'read' as const },
  handrail: { least: 34, most: 38, section: 'R312.1.2, exception 2', basis: 'read' as const },
  sphere: { value: 4, section: 'R312.1.3', basis: 'read' as const },
  stairSphere: { value: 4.375, section: 'R312.1.3, exception 2', basis: 'read' as const },
  stairTriangle: { value: 6, section: 'R312.1.3, exception 1', basis: 'read' as const },
  riser: { value: 7.75, section: 'R311.7', basis: 'copy' as const },
  tread: { value: 10, section: 'R311.7', basis: 'copy' as const },
}

export const irc2018 = defineRules({ ...before2024, id: 'irc-2018', edition: '2018' })
export const irc2021 = defineRules({ ...before2024, id: 'irc-2021', edition: '2021' })

/** The figures stay; of the new numbers only R321.1.1, R318.7 and R320 were read, the rest are remembered. */
export const irc2024 = defineRules({
  ...before2024,
  id: 'irc-2024',
  edition: '2024',
  neededOver: { value: 30, section: 'R321.1.1', basis: 'read' },
  situations: [
    {
      id: 'dwelling',
      name: 'One- and two-family dwellings',
      height: { value: 36, section: 'R321.1.2', basis: 'memory' },
    },
  ],
  stairHeight: { value: 34, section: 'R321.1.2, exception 1', basis: 'memory' },
  handrail: { least: 34, most: 38, section: 'R321.1.2, exception 2', basis: 'memory' },
  sphere: { value: 4, section: 'R321.1.3', basis: 'memory' },
  stairSphere: { value: 4.375, section: 'R321.1.3, exception 2', basis: 'memory' },
  stairTriangle: { value: 6, section: 'R321.1.3, exception 1', basis: 'memory' },
  riser: { value: 7.75, section: 'R318.7', basis: 'copy' },
  tread: { value: 10, section: 'R318.7', basis: 'copy' },
  notes: [
    ...figures.notes.slice(0, 1),
    {
      text: 'Risers and treads of one flight differ by at most 3/8 in. A handrail, 34 to 38 in high, is needed at four risers or more.',
      section: 'R318.7, R320',
      basis: 'copy',
    },
  ],
})
