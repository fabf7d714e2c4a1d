/** What each property of a cable is, in one sentence. */
export const cableWords = {
  construction: {
    label: 'Construction',
    hint: 'Strands times wires in each; 1x19 is one strand and the stiffest.',
  },
  diameter: { label: 'Diameter', hint: 'Across the bare cable, as it is sold.' },
  axialStiffness: {
    label: 'Axial stiffness',
    hint: 'How hard it is to stretch: metallic area times modulus.',
  },
  settlingStretch: {
    label: 'Settling stretch',
    hint: 'What a new cable gives as its wires settle; 0.125 % where it is lightly loaded (rope handbooks).',
  },
  breakingLoad: {
    label: 'Breaking load',
    hint: 'The load at which it parts, from the maker’s certificate.',
  },
  price: {
    label: 'Price',
    hint: 'A figure of your own to compare cables by; it changes no cut list.',
  },
} as const
