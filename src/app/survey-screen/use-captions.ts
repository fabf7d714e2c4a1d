import { useMemo } from 'react'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { type Captions, captionsOf } from '@/features/survey-editor/model/captions'
import type { EditorView } from '@/features/survey-editor/model/editor-context'
import { lengthFormat } from '../length-format'

/** What the photo writes beside posts and bays, worked out again whenever the survey changes. */
export function useCaptions({ survey, hardware, rules, units, fraction }: EditorView): Captions {
  return useMemo(() => {
    const { findings } = calculateSurvey({ survey, hardware, rules })
    return captionsOf(survey, findings, lengthFormat(units, fraction))
  }, [survey, hardware, rules, units, fraction])
}
