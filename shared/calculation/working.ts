import type { Phrase } from './phrase'
import type { CableResult } from './result'

/** One line of a working: a figure and the reason for it. */
export interface WorkingLine {
  label: Phrase
  /** nm */
  value: number
  reason: Phrase
}

/** A limit that was stacked into U. */
export interface LimitLine extends WorkingLine {
  kind: 'reading' | 'tape' | 'angle' | 'cut' | 'seat'
  /** Whether Us, what remains on site, holds it too. */
  onSite: boolean
}

/** A fitting that was weighed and not taken. */
export interface PassedOverLine {
  fitting: string
  name: string
  reason: Phrase
}

export interface EndWorking {
  end: 'from' | 'to'
  post: string
  /** Id and name of the fitting taken; undefined when none suits. */
  fitting?: string
  name?: string
  /** Why that one. */
  reason: Phrase
  /** How far the cable's end sits past the post's face. */
  depth?: WorkingLine
  passedOver: PassedOverLine[]
}

/**
 * The working of one cable, from readings to cut length: no number without its reason. Phrases keep their numbers as
 * figures in the program's units; `writePhrase` turns them into text.
 */
export interface CableWorking {
  run: string
  cable: number
  result: CableResult
  height: WorkingLine
  /** Bays and posts passed, or the overall reading; empty while something is missing. */
  path: WorkingLine[]
  /** D */
  pathTotal?: WorkingLine
  ends: EndWorking[]
  /** D and both depths. */
  base?: WorkingLine
  limits: LimitLine[]
  /** U, and Us. */
  slop?: WorkingLine
  siteSlop?: WorkingLine
  stretch?: WorkingLine
  /** The take-up that may be used. */
  limit?: WorkingLine
  longest?: WorkingLine
  /** From base to the cut length, the finish, the planned and the worst take-up. */
  outcome: WorkingLine[]
  /** Why it is *shop*, *site* or *none*. */
  mode: Phrase
}
