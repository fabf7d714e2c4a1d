import type { Finding } from '../schemas/finding'
import type { CableResult, RunResult, SurveyResult } from '../calculation/result'
import type { CalculationInput } from '../calculation/survey-index'

/** One cable in the cut list: all its figures, and names for people. */
export interface CutListRow {
  cable: CableResult
  /** "R1-3": the run and the cable, as on tags. */
  name: string
  cableId: string
  cableName: string
  /** Names of the fittings, where known. */
  fromFitting?: string
  toFitting?: string
  fromPost: string
  toPost: string
  /** Limit less worst take-up, nm. */
  left?: number
}

/** One run of the cut list. */
export interface CutListGroup {
  run: RunResult
  rows: CutListRow[]
  findings: Finding[]
  totals: CutListTotals
}

export interface CutListTotals {
  cables: number
  shop: number
  site: number
  none: number
  /** Cable to be cut, nm; whole. */
  length: number
}

export interface CutList {
  groups: CutListGroup[]
  /** Findings that name no run of the list. */
  findings: Finding[]
  totals: CutListTotals
}

/** The cut list by run, for screens, exports and prints. Lengths in nm. */
export function cutListRows(result: SurveyResult, { hardware }: Pick<CalculationInput, 'hardware'>): CutList {
  const fittings = new Map(hardware.fittings.map(({ id, name }) => [id, name]))
  const cables = new Map(hardware.cables.map(({ id, name }) => [id, name]))
  const groups = result.runs.map((run): CutListGroup => {
    const rows = run.cables.map((cable): CutListRow => ({
      cable,
      name: `${run.run}-${cable.cable}`,
      cableId: run.cable,
      cableName: cables.get(run.cable) ?? run.cable,
      fromFitting: cable.from && (fittings.get(cable.from) ?? cable.from),
      toFitting: cable.to && (fittings.get(cable.to) ?? cable.to),
      fromPost: run.fromPost,
      toPost: run.toPost,
      left: cable.mode === 'none' ? undefined : cable.limit - cable.worst,
    }))
    const findings = result.findings.filter(({ where }) => where.run === run.run)
    return { run, rows, findings, totals: cutTotals(run.cables) }
  })
  const known = new Set(result.runs.map(({ run }) => run))
  const elsewhere = result.findings.filter(({ where }) => where.run === undefined || !known.has(where.run))
  return { groups, findings: elsewhere, totals: cutTotals(result.cables) }
}

/** How many cables of each mode, and how much cable they take. */
export function cutTotals(cables: readonly CableResult[]): CutListTotals {
  const totals: CutListTotals = { cables: cables.length, shop: 0, site: 0, none: 0, length: 0 }
  for (const cable of cables) {
    totals[cable.mode] += 1
    totals.length += cable.cut ?? 0
  }
  return totals
}
