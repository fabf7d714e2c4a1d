import type { Finding } from '@shared/schemas/finding'
import type { GuardRules } from '@shared/schemas/guard-rules'
import type { Hardware } from '@shared/schemas/hardware'
import type { HouseRules } from '@shared/schemas/house-rules'
import type { Units } from '@shared/schemas/quantities'
import type { Survey } from '@shared/schemas/survey'
import type { SurveyOperation } from '@shared/survey/survey-operation'

/** What is in hand. A `rectangle` is the one of known size on the photo with this id. */
export type Selection =
  { kind: 'none' } | { kind: 'post' | 'bay' | 'run' | 'photo' | 'rectangle'; id: string }

/** What panels and the table show. */
export interface EditorView {
  survey: Survey
  selection: Selection
  /** What may be chosen from: the company's hardware, retired entries left out. */
  hardware: Hardware
  rules: HouseRules
  /** The company’s own guard rules, retired ones too. */
  guardRules: GuardRules[]
  /** Ids of the retired ones, which are no longer offered. */
  retiredRules: ReadonlySet<string>
  /** Everything noticed about the survey as it stands, the gravest first. */
  findings: readonly Finding[]
  units: Units
  /** Fractions of an inch on the keypad and in lengths. */
  fraction: 16 | 32 | 64
  person: { name: string }
  canEdit: boolean
}

/** What panels and the table may do. */
export interface EditorActions {
  /** One gesture: applied at once, undone in one step. */
  perform: (operation: SurveyOperation) => void
  /** The same, with runs laid anew for what it changes, as one gesture. */
  performAndLay: (operation: SurveyOperation) => void
  select: (selection: Selection) => void
  undo: () => void
  redo: () => void
}
