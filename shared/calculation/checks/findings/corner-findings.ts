import type { HouseRules } from '../../../schemas/house-rules'
import type { Notice } from '../../findings/notice'
import { exceeds } from '../../round-to-step'
import type { CornerCheck } from '../check-corners'

/** Holes of two runs that meet inside a post and are not set apart in height. */
export function cornerFindings(corner: CornerCheck, { cornerWeb }: HouseRules): Notice[] {
  const { post, a, b, overlap, stagger, apart, kind } = corner
  if (stagger === 0 || !exceeds(stagger, apart)) return []
  const turned = kind === 'turned'
  return [
    {
      level: 'stop',
      code: turned ? 'corner-overlap' : 'bodies-meet',
      where: { post, run: b.run },
      phrase: [
        `Post ${post}: the holes of runs ${a.run} and ${b.run} ${turned ? 'run into each other by ' : 'leave too little wood, by '}`,
        { length: overlap },
        '. Stagger one run by at least ',
        { length: stagger },
        turned ? ', which leaves ' : ' (',
        { length: cornerWeb },
        turned ? ' between them, or choose shorter bodies.' : ' are to be left), or choose shorter bodies.',
      ],
    },
  ]
}
