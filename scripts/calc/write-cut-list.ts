import type { CableResult, SurveyResult } from '../../shared/calculation/result'
import { placeName } from '../../shared/schemas/finding'
import type { Units } from '../../shared/schemas/quantities'
import { toInches, toMillimetres } from '../../shared/units/length'

/** Figures are written to ten decimals: what lies beyond is the noise of floating-point sums. */
const written = (value: number): number => Number(value.toFixed(10)) + 0

/** The answer of `cutlist`, in the file's own units; a key without a value is left out. */
export function writeCutList({ cables, findings }: SurveyResult, units: Units) {
  const length = (nm: number | undefined) =>
    nm === undefined || !Number.isFinite(nm)
      ? undefined
      : written(units.length === 'in' ? toInches(nm) : toMillimetres(nm))
  return {
    cables: cables.map((cable) => writeCable(cable, length)),
    findings: findings.map(({ level, code, where, text }) => ({
      level,
      code,
      where: placeName(where),
      text,
    })),
  }
}

const writeCable = (cable: CableResult, length: (nm: number | undefined) => number | undefined) => ({
  run: cable.run,
  cable: cable.cable,
  height: length(cable.height),
  mode: cable.mode,
  why: cable.why,
  path: length(cable.path),
  from: cable.from,
  to: cable.to,
  cut: length(cable.cut),
  finish: length(cable.finish),
  slack: length(cable.slack),
  u: length(cable.u),
  planned: length(cable.planned),
  worst: length(cable.worst),
  limit: length(cable.limit),
  longest: length(cable.longest),
})
