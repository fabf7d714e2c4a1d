import type { FigureSource } from '../../../schemas/guard-rules'
import type { Notice } from '../../findings/notice'
import { rulesName, ruleBehind } from '../../guard-rules/published-rules'
import type { Phrase } from '../../phrase'
import { exceeds } from '../../round-to-step'
import type { SurveyIndex } from '../../survey-index'
import type { GuardFigures } from '../guard-figures'

type Level = Notice['level']

/**
 * The guard as a whole against its rules: heights, spheres, climbability, and what is not known.
 *
 * Source: the section is named with each finding; values and how well they are known stand with the rules.
 */
export function guardFindings({ survey }: SurveyIndex, figures: GuardFigures): Notice[] {
  const { guard, rules } = figures
  if (!rules) {
    const phrase = [
      `The guard rules “${guard.rules}” are not known here. Choose rules, or make your own; openings are held to `,
      { length: figures.sphere },
      ' meanwhile.',
    ]
    return [{ level: 'check', code: 'guard-rules-unknown', where: {}, phrase }]
  }
  const say = (
    level: Level,
    code: string,
    { phrase, source }: { phrase: Phrase; source?: FigureSource },
  ): Notice => ({
    level,
    code,
    where: {},
    phrase,
    rule: source ? ruleBehind(rules, source) : rulesName(rules),
  })
  const hasStairs = survey.bays.some(({ kind }) => kind === 'stair')
  return [
    ...heightFindings(figures, say),
    ...(hasStairs ? stairFindings(figures, say) : []),
    ...sphereFindings(figures, say),
    ...fallFindings(figures, say),
  ]
}

type Say = (level: Level, code: string, what: { phrase: Phrase; source?: FigureSource }) => Notice

function heightFindings({ guard, situation, assumed }: GuardFigures, say: Say): Notice[] {
  if (!situation) return []
  const notices: Notice[] = []
  if (assumed) {
    const phrase = [
      `Nobody said which situation this guard is in; the strictest is taken: ${situation.name}.`,
    ]
    notices.push(say('note', 'situation-assumed', { phrase, source: situation.height }))
  }
  const { height, upToFall } = situation
  if (exceeds(height.value, guard.height)) {
    const phrase = [
      'The guard is ',
      { length: guard.height },
      ' high, the rules ask for ',
      { length: height.value },
      `, ${situation.name.toLowerCase()}. Make it higher.`,
    ]
    notices.push(say('stop', 'guard-too-low', { phrase, source: height }))
  }
  if (upToFall !== undefined && guard.fall !== undefined && exceeds(guard.fall, upToFall)) {
    const phrase = [
      `“${situation.name}” holds for a fall of up to `,
      { length: upToFall },
      ', here it is ',
      { length: guard.fall },
      '. Choose another situation.',
    ]
    notices.push(say('stop', 'situation-wrong', { phrase, source: height }))
  }
  return notices
}

function stairFindings({ guard, rules, situation }: GuardFigures, say: Say): Notice[] {
  const asked = rules?.stairHeight ?? situation?.height
  const built = guard.stair?.height ?? guard.height
  const notices: Notice[] = []
  if (asked && exceeds(asked.value, built)) {
    const phrase = [
      'On stairs the guard is ',
      { length: built },
      ' above the nosing line, the rules ask for ',
      { length: asked.value },
      '. Make it higher.',
    ]
    notices.push(say('stop', 'stair-guard-too-low', { phrase, source: asked }))
  }
  const handrail = rules?.handrail
  if (handrail && (exceeds(handrail.least, built) || exceeds(built, handrail.most))) {
    const phrase = [
      'Where the top of the stair guard is also the handrail, it lies between ',
      { length: handrail.least },
      ' and ',
      { length: handrail.most },
      '; here it is ',
      { length: built },
      '. Otherwise a handrail of its own is needed.',
    ]
    notices.push(say('note', 'handrail-height', { phrase, source: handrail }))
  }
  return notices
}

/** A survey may set a sphere of its own; a larger one than the rules' passes what they forbid. */
function sphereFindings({ guard, rules, sphere, stairSphere }: GuardFigures, say: Say): Notice[] {
  if (!rules) return []
  const onStairs = rules.stairSphere ?? rules.sphere
  const larger = (own: number, source: FigureSource & { value: number }, place: string): Notice[] =>
    exceeds(own, source.value)
      ? [
          say('check', 'sphere-larger', {
            phrase: [
              `This survey lets a sphere of up to `,
              { length: own },
              ` pass${place}, the rules `,
              { length: source.value },
              '. Leave the survey’s own figure empty.',
            ],
            source,
          }),
        ]
      : []
  return [
    ...(guard.sphere === undefined ? [] : larger(sphere, rules.sphere, '')),
    ...(guard.stairSphere === undefined ? [] : larger(stairSphere, onStairs, ' on stairs')),
  ]
}

function fallFindings({ guard, rules }: GuardFigures, say: Say): Notice[] {
  const needed = rules?.neededOver
  const climbable = rules?.climbable
  const { fall } = guard
  const notices: Notice[] = []
  if (fall === undefined) {
    const why =
      climbable && !climbable.advice ? 'and whether cables are climbable' : 'and whether a guard is needed'
    const phrase = [`The fall beside the walking surface was not measured, ${why} depends on it. Measure it.`]
    const level = climbable && !climbable.advice ? 'check' : 'note'
    notices.push(say(level, 'fall-unknown', { phrase, source: climbable ?? needed }))
  } else if (needed && !exceeds(fall, needed.value)) {
    const phrase = [
      'With a fall of ',
      { length: fall },
      ' these rules ask for no guard: they do above ',
      { length: needed.value },
      '.',
    ]
    notices.push(say('note', 'guard-not-needed', { phrase, source: needed }))
  }
  if (climbable?.advice) {
    const phrase = ['Horizontal cables can be climbed, and these rules say to avoid them where children are.']
    notices.push(say('check', 'climbable', { phrase, source: climbable }))
  } else if (climbable && fall !== undefined && exceeds(fall, climbable.fallOver ?? 0)) {
    const phrase = [
      'With a fall of ',
      { length: fall },
      ' nothing climbable may be between ',
      { length: climbable.from },
      ' and ',
      { length: climbable.to },
      ' above the floor: horizontal cables are.',
    ]
    notices.push(say('stop', 'climbable', { phrase, source: climbable }))
  }
  return notices
}
