import type { Bay } from '../../schemas/bay'
import type { FindingPlace } from '../../schemas/finding'
import type { HouseRules } from '../../schemas/house-rules'
import { toDegrees } from '../../units/angle'
import { type GapReadings, gapReadings } from '../clear-length'
import type { PlaceReadings } from '../mean-of-readings'
import { exceeds } from '../round-to-step'
import { ANGLE_AGREEMENT, angleDisagreement } from '../stair-angle'
import type { Notice } from './notice'

/** Readings at one place that differ by more than this many reading limits are to be looked at. */
const SPREAD_LIMITS = 3
const ANGLE_NOISE = 1e-12

/**
 * What the readings of a bay say against each other: at one place by more than 3 × `readingLimit`, top against bottom by
 * more than `plumbLimit`, the gauge against rise and going by more than 1°.
 *
 * Source: sections 1 and 2 of the calculation.
 */
export function bayFindings(bay: Bay, rules: HouseRules): Notice[] {
  const notices = gapFindings(gapReadings(bay.readings), {
    where: { bay: bay.id },
    name: `bay ${bay.id}`,
    rules,
  })
  const apart = angleDisagreement(bay)
  if (apart !== undefined && apart > ANGLE_AGREEMENT + ANGLE_NOISE) {
    const angle = { angle: toDegrees(Math.atan2(bay.rise ?? 0, bay.going ?? 1)) }
    const phrase = [
      `Bay ${bay.id}: rise and going give `,
      angle,
      ', the gauge reads ',
      { angle: bay.gauge ?? 0 },
    ]
    notices.push({
      level: 'check',
      code: 'angle-differs',
      where: { bay: bay.id },
      phrase: [...phrase, '. Rise and going are used; measure both again.'],
    })
  }
  return notices
}

/** The same for the readings of any gap: a bay, or a run overall. */
export function gapFindings(
  { top, bottom }: GapReadings,
  { where, name, rules }: { where: FindingPlace; name: string; rules: HouseRules },
): Notice[] {
  const notices: Notice[] = []
  const spread = (place: string, read: PlaceReadings | undefined) => {
    if (!read || !exceeds(read.greatest - read.least, SPREAD_LIMITS * rules.readingLimit)) return
    notices.push({
      level: 'check',
      code: 'readings-differ',
      where,
      phrase: [
        `The readings of ${name} at the ${place} lie `,
        { length: read.greatest - read.least },
        ' apart, from ',
        { length: read.least },
        ' to ',
        { length: read.greatest },
        '. Read it again and strike the wrong one.',
      ],
    })
  }
  spread('top', top)
  spread('bottom', bottom)
  if (top && bottom && exceeds(Math.abs(top.mean - bottom.mean), rules.plumbLimit)) {
    notices.push({
      level: 'check',
      code: 'post-out-of-plumb',
      where,
      phrase: [
        `Post out of plumb at ${name}: `,
        { length: top.mean },
        ' at the top and ',
        { length: bottom.mean },
        ' at the bottom. Check the posts, or read it again.',
      ],
    })
  }
  return notices
}
