import type { Bay } from '../schemas/bay'
import type { GuardRules } from '../schemas/guard-rules'
import type { Cable, Hardware } from '../schemas/hardware'
import type { HouseRules } from '../schemas/house-rules'
import type { Post } from '../schemas/post'
import type { Survey } from '../schemas/survey'
import type { Degrees } from '../units/angle'

/** What a calculation is made from. */
export interface CalculationInput {
  survey: Survey
  hardware: Hardware
  rules: HouseRules
  /** The company's own guard rules. */
  guardRules?: GuardRules[]
}

/** The input with its names resolved, made once per calculation. */
export interface SurveyIndex extends CalculationInput {
  posts: ReadonlyMap<string, Post>
  bays: ReadonlyMap<string, Bay>
  cables: ReadonlyMap<string, Cable>
  /** The first bay, in the survey's own order, that names each post: `along` is parallel to it. */
  firstBay: ReadonlyMap<string, Bay>
  corners: ReadonlyMap<string, Degrees>
}

const byId = <Item extends { id: string }>(items: readonly Item[]) =>
  new Map(items.map((item) => [item.id, item]))

export function indexSurvey({ survey, hardware, rules }: CalculationInput): SurveyIndex {
  const firstBay = new Map<string, Bay>()
  for (const bay of survey.bays) {
    for (const post of [bay.from, bay.to]) if (!firstBay.has(post)) firstBay.set(post, bay)
  }
  return {
    survey,
    hardware,
    rules,
    posts: byId(survey.posts),
    bays: byId(survey.bays),
    cables: byId(hardware.cables),
    firstBay,
    corners: new Map(survey.corners.map(({ post, angle }) => [post, angle])),
  }
}
