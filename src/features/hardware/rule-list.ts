import type { HouseRules } from '@shared/schemas/house-rules'
import type { Length } from '@shared/units/length'

/** Rules that are lengths. */
export type LengthRule = {
  [Key in keyof HouseRules]-?: NonNullable<HouseRules[Key]> extends Length ? Key : never
}[keyof HouseRules]

/** `above` marks lengths that zero is no value for, `optional` those that may be left empty. */
export type Rule =
  | { kind: 'length'; key: LengthRule; label: string; meaning: string; optional?: boolean; above?: boolean }
  | {
      kind: 'number'
      key: 'gaugeLimit' | 'maxBend' | 'reserve' | 'coldest' | 'hottest' | 'tensionedAt'
      label: string
      meaning: string
      /** A share is written in per cent. */
      unit: '°' | '%' | '°C'
      /** The most that may be written; the least is zero unless said. */
      most: number
      least?: number
    }
  | { kind: 'force'; key: 'tension' | 'leastPush'; label: string; meaning: string; optional?: boolean }
  | { kind: 'switch'; key: 'wetService'; label: string; meaning: string }
  | {
      kind: 'choice'
      key: 'stacking' | 'grouping' | 'tapeClass'
      label: string
      meaning: string
      choices: readonly { value: string; label: string }[]
    }

/** Every house rule but the lumber, which is a list of its own, with its meaning in one sentence, grouped as the work goes. */
export const ruleGroups: readonly { title: string; rules: readonly Rule[] }[] = [
  {
    title: 'Measuring',
    rules: [
      {
        kind: 'length',
        key: 'readingLimit',
        label: 'Reading limit',
        meaning: 'How far one reading of the tape may be off; several readings of a bay share it.',
      },
      {
        kind: 'choice',
        key: 'tapeClass',
        label: 'Tape class',
        meaning: 'Accuracy class printed on the tape (2014/32/EU, Annex X); none adds nothing.',
        choices: [
          { value: '', label: 'none' },
          { value: 'I', label: 'I' },
          { value: 'II', label: 'II' },
          { value: 'III', label: 'III' },
        ],
      },
      {
        kind: 'number',
        key: 'gaugeLimit',
        label: 'Gauge limit',
        unit: '°',
        most: 10,
        meaning: 'How far the angle gauge may be off.',
      },
      {
        kind: 'length',
        key: 'plumbLimit',
        label: 'Plumb limit',
        meaning: 'Top and bottom of a bay may differ by this before a post is said to lean.',
      },
    ],
  },
  {
    title: 'Cutting',
    rules: [
      {
        kind: 'length',
        key: 'cutStep',
        above: true,
        label: 'Cut step',
        meaning: 'Cut lengths are rounded up to a whole number of these.',
      },
      { kind: 'length', key: 'cutLimit', label: 'Cut limit', meaning: 'How far a cut may be off.' },
      {
        kind: 'length',
        key: 'seatLimit',
        label: 'Seat limit',
        meaning: 'How far a cable’s end may sit from where it should in its fitting.',
      },
      {
        kind: 'length',
        key: 'trim',
        label: 'Trim',
        meaning: 'What a cable that is finished on site gets beyond its worst length.',
      },
      {
        kind: 'choice',
        key: 'stacking',
        label: 'Stacking',
        meaning: 'How limits add up: by root of the sum of squares, or as if all fell the wrong way at once.',
        choices: [
          { value: 'rss', label: 'root of squares' },
          { value: 'worst', label: 'plain sum' },
        ],
      },
      {
        kind: 'choice',
        key: 'grouping',
        label: 'Lengths',
        meaning: 'One length for each cable, or one for a whole run where every cable of it allows that.',
        choices: [
          { value: 'cable', label: 'each cable' },
          { value: 'run', label: 'the run' },
        ],
      },
    ],
  },
  {
    title: 'Fittings',
    rules: [
      {
        kind: 'force',
        key: 'tension',
        label: 'Tension',
        meaning: 'What runs are tensioned to where the run says nothing else.',
      },
      {
        kind: 'number',
        key: 'reserve',
        label: 'Reserve',
        unit: '%',
        most: 90,
        meaning: 'Share of the take-up kept for later re-tensioning.',
      },
      {
        kind: 'length',
        key: 'backWall',
        label: 'Back wall',
        meaning: 'What a drilled hole leaves of the post behind it at least.',
      },
      {
        kind: 'length',
        key: 'cornerOverlap',
        label: 'Corner overlap',
        meaning: 'Holes from two faces of a corner post may meet by this much before one run is staggered.',
      },
      {
        kind: 'length',
        key: 'cornerWeb',
        label: 'Corner web',
        meaning: 'What a stagger leaves of the post between the two holes.',
      },
    ],
  },
  {
    title: 'Runs',
    rules: [
      {
        kind: 'length',
        key: 'longestRun',
        above: true,
        label: 'Longest run',
        meaning: 'Proposed runs are no longer; left empty only the fittings limit them.',
        optional: true,
      },
      {
        kind: 'number',
        key: 'maxBend',
        label: 'Largest bend',
        unit: '°',
        most: 45,
        meaning: 'A run may change its pitch by this much at a post.',
      },
      {
        kind: 'length',
        key: 'holeStep',
        above: true,
        label: 'Hole step',
        meaning: 'Heights of holes are rounded to a whole number of these.',
      },
      {
        kind: 'length',
        key: 'wideBay',
        above: true,
        label: 'Wide bay',
        meaning: 'A clear bay beyond this wants a spacer.',
      },
    ],
  },
  {
    title: 'Checks',
    rules: [
      {
        kind: 'force',
        key: 'leastPush',
        label: 'Least push',
        meaning:
          'What it should take to force the rules’ sphere between two cables; the US codes set no figure.',
        optional: true,
      },
      {
        kind: 'length',
        key: 'edgeWall',
        label: 'Edge wall',
        meaning: 'What a hole leaves of a post’s core at either side at least.',
      },
      {
        kind: 'number',
        key: 'tensionedAt',
        label: 'Tensioned at',
        unit: '°C',
        least: -80,
        most: 80,
        meaning: 'The temperature at which cables are usually tensioned.',
      },
      {
        kind: 'number',
        key: 'coldest',
        label: 'Coldest',
        unit: '°C',
        least: -80,
        most: 80,
        meaning: 'Design temperature at which cables are tightest.',
      },
      {
        kind: 'number',
        key: 'hottest',
        label: 'Hottest',
        unit: '°C',
        least: -80,
        most: 80,
        meaning: 'Design temperature at which cables are slackest.',
      },
      {
        kind: 'switch',
        key: 'wetService',
        label: 'Posts stand wet',
        meaning: 'Outdoors the wet service factor 0.85 is taken where it applies (NDS Supplement).',
      },
    ],
  },
  {
    title: 'Shop',
    rules: [
      {
        kind: 'length',
        key: 'keepOffcut',
        label: 'Offcut to keep',
        meaning: 'What is left of a reel goes back on the rack when it is at least this long.',
      },
    ],
  },
]
