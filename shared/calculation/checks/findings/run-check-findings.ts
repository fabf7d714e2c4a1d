import type { Fitting } from '../../../schemas/hardware'
import type { HouseRules } from '../../../schemas/house-rules'
import { cableNumbers, type Notice } from '../../findings/notice'
import type { Phrase } from '../../phrase'
import { exceeds } from '../../round-to-step'
import type { RunCheck } from '../check-run'
import { type CheckedRun, fittingsOf } from '../checked-run'

/**
 * The tension of a run against what its cable and fittings take, and what cold and heat make of it.
 *
 * Source: section 7 of the calculation for the temperatures.
 */
export function runCheckFindings(run: CheckedRun, check: RunCheck, rules: HouseRules): Notice[] {
  return [
    ...outsideFindings(run),
    ...limitFindings(run, check),
    ...unknownLimits(run),
    temperatureNote(check, rules),
  ]
}

/** Heights given one by one may miss the opening. */
function outsideFindings({ figures, heights }: CheckedRun): Notice[] {
  const { bottom, top } = figures.opening
  const run = figures.course.run.id
  const outside = heights.flatMap((height, i) =>
    exceeds(bottom, height) || exceeds(height, top) ? [i + 1] : [],
  )
  if (outside.length === 0) return []
  return [
    {
      level: 'stop',
      code: 'cable-outside',
      where: { run },
      phrase: [
        `Run ${run}: ${cableNumbers(outside)} ${outside.length === 1 ? 'lies' : 'lie'} outside the opening from `,
        { length: bottom },
        ' to ',
        { length: top },
        '. Change the heights, or the guard’s.',
      ],
    },
  ]
}

function limitFindings({ cable, figures }: CheckedRun, { run, tension, whenCold }: RunCheck): Notice[] {
  const limits = [
    { name: `cable ${cable.name} breaks at`, most: cable.breakingLoad },
    ...unique(fittingsOf(figures)).map(({ name, rating }) => ({ name: `${name} may carry`, most: rating })),
  ]
  return limits.flatMap(({ name, most }): Notice[] => {
    if (most === undefined) return []
    const say = (level: Notice['level'], code: string, phrase: Phrase): Notice[] => [
      { level, code, where: { run }, phrase: [`Run ${run}: `, ...phrase, ` ${name} `, { force: most }, '.'] },
    ]
    if (tension > most)
      return say('stop', 'tension-over-limit', ['a tension of ', { force: tension }, ' is too much:'])
    return whenCold > most
      ? say('check', 'tension-over-limit-cold', [
          'in the cold the tension rises to ',
          { force: whenCold },
          ':',
        ])
      : []
  })
}

function unknownLimits({ cable, figures }: CheckedRun): Notice[] {
  const where = { run: figures.course.run.id }
  const notices: Notice[] = []
  if (cable.breakingLoad === undefined) {
    const phrase = [
      `The breaking load of ${cable.name} is not in the hardware, so loads are held against nothing.`,
    ]
    notices.push({ level: 'check', code: 'breaking-load-unknown', where, phrase })
  }
  for (const { name } of unique(fittingsOf(figures)).filter(({ rating }) => rating === undefined)) {
    const phrase = [`The rating of ${name} is not in the hardware, so its load is held against nothing.`]
    notices.push({ level: 'note', code: 'rating-unknown', where, phrase })
  }
  return notices
}

const unique = (fittings: readonly Fitting[]): Fitting[] => [...new Set(fittings)]

function temperatureNote({ run, tension, whenCold, whenHot }: RunCheck, rules: HouseRules): Notice {
  const slack = whenHot <= tension * 1e-12
  const hot: Phrase = slack
    ? [`at ${rules.hottest} °C it goes slack`]
    : [`at ${rules.hottest} °C `, { force: whenHot }]
  return {
    level: slack ? 'check' : 'note',
    code: slack ? 'slack-when-hot' : 'temperature',
    where: { run },
    phrase: [
      `Run ${run}: tensioned to `,
      { force: tension },
      ` at ${rules.tensionedAt} °C, between posts that do not give, a cable has `,
      { force: whenCold },
      ` at ${rules.coldest} °C; `,
      ...hot,
      '.',
    ],
    rule: 'EN 10088-1: thermal expansion of type 316, 16.0·10⁻⁶ /K',
  }
}
