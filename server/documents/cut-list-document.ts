import type { CutList } from '@shared/cut-list/cut-list-rows'
import type { CablePick, FittingPick } from '@shared/cut-list/fittings-to-pick'
import type { JudgedFinding } from './judged-finding'
import type { Units } from '@shared/schemas/quantities'

/** All that a printed or exported cut list says. */
export interface CutListDocument {
  company: string
  jobNumber: number
  jobTitle: string
  surveyTitle: string
  /** Of the survey, so that an old print can be told from a current one. */
  revision: number
  /** When it was made, `2026-05-14 10:12 UTC`. */
  made: string
  units: Units['length']
  /** The company's finest fraction of an inch in lists. */
  fraction: 16 | 32 | 64
  cutList: CutList
  /** All findings, the checks' too, the gravest first. */
  findings: readonly JudgedFinding[]
  picks: { fittings: FittingPick[]; cables: CablePick[] }
}

/** Stands on every cut list that leaves the program. */
export const CAUTION =
  'Arithmetic on what was entered: local code, the building official and a licensed engineer decide. ' +
  'Eye protection when cutting, crimping and tensioning; never stand in line with a cable being tensioned.'

/** The same for the foot of a page, where a spreadsheet allows 255 characters in all. */
export const SHORT_CAUTION =
  'Local code, the building official and a licensed engineer decide. Wear eye protection; never stand in line with a cable being tensioned.'
