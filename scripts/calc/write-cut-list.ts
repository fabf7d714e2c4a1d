import type { CableResult, SurveyResult } from '../../shared/calculation/result'
import type { Units } from '../../shared/schemas/quantities'
import { quantityWriter, writeFindings } from './write-quantities'

/** The answer of `cutlist`, in the file's own units; a key without a value is left out. */
export function writeCutList({ cables, findings }: SurveyResult, units: Units) {
  const { length } = quantityWriter(units)
  return {
    cables: cables.map((cable) => writeCable(cable, length)),
    findings: writeFindings(findings),
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
