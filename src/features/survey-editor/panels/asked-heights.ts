import { guardFigures } from '@shared/calculation/checks/guard-figures'
import type { Guard } from '@shared/schemas/guard'
import type { FigureSource, GuardRules } from '@shared/schemas/guard-rules'
import type { Survey } from '@shared/schemas/survey'
import { type Length, nanometres } from '@shared/units/length'

type Asked = FigureSource & { value: Length }

/** The heights that the rules of a survey ask for, and the change of its guard that gives it these. */
export interface AskedHeights {
  height: Asked
  /** Above the nosing line, where the survey has stairs. */
  stair?: Asked
  /** The guard is lower than one of them. */
  tooLow: boolean
  /** Undefined where the guard has these heights already. */
  change?: Partial<Guard>
}

/** @returns undefined when nobody knows the rules the survey names */
export function askedHeights(survey: Survey, own: readonly GuardRules[]): AskedHeights | undefined {
  const { guard, bays } = survey
  const { rules, situation } = guardFigures(guard, own)
  if (!rules || !situation) return undefined
  const { height } = situation
  const stair = bays.some(({ kind }) => kind === 'stair') ? (rules.stairHeight ?? height) : undefined
  const onStairs = (otherwise: Length) => guard.stair?.height ?? otherwise
  const change: Partial<Guard> = {
    ...(height.value === guard.height ? {} : raised(guard, height.value)),
    ...(stair && onStairs(height.value) !== stair.value
      ? { stair: { ...guard.stair, height: stair.value } }
      : {}),
  }
  return {
    height,
    ...(stair ? { stair } : {}),
    tooLow: guard.height < height.value || (stair !== undefined && onStairs(guard.height) < stair.value),
    ...(Object.keys(change).length === 0 ? {} : { change }),
  }
}

/** The underside of a top rail goes up and down with its top. */
function raised({ height, topRailUnderside }: Guard, asked: Length): Partial<Guard> {
  const underside = topRailUnderside === undefined ? undefined : topRailUnderside + asked - height
  return {
    height: asked,
    ...(underside !== undefined && underside > 0 ? { topRailUnderside: nanometres(underside) } : {}),
  }
}
