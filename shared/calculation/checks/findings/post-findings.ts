import type { HouseRules } from '../../../schemas/house-rules'
import type { Notice } from '../../findings/notice'
import { ruleBehind } from '../../guard-rules/published-rules'
import type { Phrase } from '../../phrase'
import { exceeds } from '../../round-to-step'
import { isWood, type PostCheck } from '../check-post'
import type { GuardFigures } from '../guard-figures'

const NOISE = 1 + 1e-12

/**
 * What the checks of an end post come to. Each names the assumption it was made under.
 *
 * Source: section 9 of the calculation.
 */
export function postFindings(
  check: PostCheck,
  { guard, rules }: { guard: GuardFigures; rules: HouseRules },
): Notice[] {
  const where = { run: check.run, post: check.post }
  if (!isWood(check.core)) return [...coreFindings(check), ...edgeFindings(check, rules)]
  if (!check.section || !check.allowable) {
    const phrase = [
      `Post ${check.post}: without both its sizes over the cover its stress cannot be reckoned. Measure along and across.`,
    ]
    return [{ level: 'check', code: 'missing-post-size', where: { post: check.post }, phrase }]
  }
  const notices: Notice[] = []
  if (check.support === undefined) {
    // Worded alike for every post, so that it is said once.
    const phrase = [
      'Nobody said whether the top rail ties the end posts: they are reckoned as standing free, the worse of the two. Say it on the guard, or post by post.',
    ]
    notices.push({ level: 'note', code: 'support-unknown', where: { post: check.post }, phrase })
  }
  const support = check.support ?? 'cantilever'
  const { stress = 0 } = check[support]
  const { allowable } = check
  if (stress > allowable.stress * NOISE) {
    const phrase: Phrase = [
      `Post ${check.post}, run ${check.run}: all cables bend it to `,
      { stress },
      support === 'propped' ? ', held by the top rail' : ', standing free',
      `; ${allowable.lumber.name} may take `,
      { stress: allowable.stress },
      '. Use a larger or tied post, less tension or a post beside it, and ask the engineer.',
    ]
    notices.push({ level: 'check', code: 'post-overstressed', where, phrase })
  }
  return [...notices, ...topLoadFindings(check, guard), ...edgeFindings(check, rules)]
}

function coreFindings({ post, core, run }: PostCheck): Notice[] {
  const where = { run, post }
  if (core === undefined) {
    const phrase = [`Post ${post}: what is under its veneer was not noted, so its stress cannot be reckoned.`]
    return [{ level: 'check', code: 'missing-core', where, phrase }]
  }
  const phrase = [
    `Post ${post} is ${core === 'metal' ? 'metal' : 'masonry'}: its strength and anchoring are not reckoned here. Ask the engineer.`,
  ]
  return [{ level: 'note', code: 'ask-engineer', where, phrase }]
}

function topLoadFindings({ post, topLoad, allowable }: PostCheck, { rules }: GuardFigures): Notice[] {
  if (!topLoad?.stress || !allowable || !rules?.topLoad || topLoad.stress <= allowable.stress * NOISE)
    return []
  return [
    {
      level: 'check',
      code: 'post-top-load',
      where: { post },
      phrase: [
        `Post ${post}: `,
        { force: topLoad.force },
        ' at its top, standing free, bend it to ',
        { stress: topLoad.stress },
        `; ${allowable.lumber.name} may take `,
        { stress: allowable.stress },
        '. Ask the engineer.',
      ],
      rule: ruleBehind(rules, rules.topLoad),
    },
  ]
}

function edgeFindings({ post, run, edgeLeft, fitting }: PostCheck, { edgeWall }: HouseRules): Notice[] {
  const where = { run, post }
  if (fitting?.mount === 'drilled' && fitting.hole === undefined) {
    const phrase = [
      `The hole of ${fitting.name} is not in the hardware, so edges and corners of post ${post} are not checked.`,
    ]
    return [{ level: 'check', code: 'hole-unknown', where, phrase }]
  }
  if (edgeLeft === undefined || !exceeds(edgeWall, edgeLeft)) return []
  const phrase = [
    `Post ${post}: beside the hole only `,
    { length: edgeLeft },
    ' of wood are left, the house asks for ',
    { length: edgeWall },
    '. Use a smaller fitting or a larger post.',
  ]
  return [{ level: 'check', code: 'edge-thin', where, phrase }]
}
