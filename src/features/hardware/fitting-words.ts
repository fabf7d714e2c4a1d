import type { Fitting } from '@shared/schemas/hardware'
import { allowed } from '@/lib/refusal'

interface LengthWords<Key extends keyof Fitting> {
  key: Key
  label: string
  /** What it is, in one sentence. */
  hint: string
  /** What may be written. */
  allowed: string
}

/** Lengths that every fitting has. */
export const fittingLengths: readonly LengthWords<'body' | 'headProjection' | 'cutPastFace' | 'takeUp'>[] = [
  {
    key: 'body',
    label: 'Body',
    hint: 'How far it reaches into the post; of those that suit, the shortest is taken.',
    allowed: allowed.zeroOrMore,
  },
  {
    key: 'headProjection',
    label: 'Head projection',
    hint: 'How far it stands proud of the post’s face.',
    allowed: allowed.zeroOrMore,
  },
  {
    key: 'cutPastFace',
    label: 'Cut past face',
    hint: 'From its outer face toward the post to where the bare cable ends, the screw at its start.',
    allowed: allowed.any,
  },
  {
    key: 'takeUp',
    label: 'Take-up',
    hint: 'How far it can pull the cable.',
    allowed: allowed.above,
  },
]

/** Lengths that a fitting may have. */
export const fittingExtras: readonly LengthWords<'maxRun' | 'hole' | 'spotFace'>[] = [
  {
    key: 'maxRun',
    label: 'Longest run',
    hint: 'Beyond it the fitting’s cable is too long; left empty it sets no limit of its own.',
    allowed: allowed.above,
  },
  { key: 'hole', label: 'Hole', hint: 'Diameter of the bit to drill with.', allowed: allowed.above },
  {
    key: 'spotFace',
    label: 'Spot-face',
    hint: 'Diameter of the flat for its head, where it needs one.',
    allowed: allowed.above,
  },
]

export const angleWords = {
  label: 'Largest angle',
  hint: 'Between the cable and a line square to the post’s face; a stair’s pitch must be within it.',
}
export const ratingWords = {
  label: 'Rating',
  hint: 'The most it may be loaded with, as its maker says; left empty, nothing is held against it.',
}
export const priceWords = {
  label: 'Price each',
  hint: 'Decides between fittings whose bodies are equally long; left empty it comes last.',
}
export const suitWords = {
  materials: { label: 'Posts it suits', hint: 'What the post looks like from outside, its cover included.' },
  cables: { label: 'Cables it takes', hint: 'A run of any other cable passes it over.' },
  minGrip: {
    label: 'Least grip in the core',
    hint: 'How much of the body must be in the core, beyond any cover; a core left empty is not suited.',
  },
  tap: { label: 'Tap the hole', hint: 'Cores whose hole gets a thread before the fitting is driven in.' },
}
