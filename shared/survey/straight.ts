import type { Corner } from '../schemas/survey'

/**
 * How far from straight a corner angle may be for a cable to pass, in degrees: what a hole drilled square and the
 * play of a corner angle read on site allow. A starting value.
 */
const STRAIGHT_WITHIN = 5

/** Whether a corner angle was measured as straight. */
export const cornerIsStraight = ({ angle }: Corner): boolean => 180 - angle <= STRAIGHT_WITHIN
