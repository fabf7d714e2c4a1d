import type { SurveyOperation } from '@shared/survey/survey-operation'

/** Opposites of what this hand has done, the newest last. */
export interface History {
  readonly undos: readonly SurveyOperation[]
  readonly redos: readonly SurveyOperation[]
}

/** So many gestures can be taken back. */
const DEPTH = 500

export const emptyHistory: History = { undos: [], redos: [] }

/** After a new gesture: its opposite can be undone, and what was undone before is gone. */
export const remember = ({ undos }: History, opposite: SurveyOperation): History => ({
  undos: [...undos, opposite].slice(-DEPTH),
  redos: [],
})

/** Takes the newest step off one pile; its own opposite goes onto the other. */
export const takeBack = ({ undos, redos }: History, opposite: SurveyOperation): History => ({
  undos: undos.slice(0, -1),
  redos: [...redos, opposite],
})
export const doAgain = ({ undos, redos }: History, opposite: SurveyOperation): History => ({
  undos: [...undos, opposite],
  redos: redos.slice(0, -1),
})
