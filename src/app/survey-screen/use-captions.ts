import { useMemo } from 'react'
import { type Captions, captionsOf } from '@/features/survey-editor/model/captions'
import type { EditorView } from '@/features/survey-editor/model/editor-context'
import { lengthFormat } from '../length-format'

/** What the photo writes beside posts and bays, worked out again whenever the survey changes. */
export const useCaptions = ({ survey, findings, units, fraction }: EditorView): Captions =>
  useMemo(
    () => captionsOf(survey, findings, lengthFormat(units, fraction)),
    [survey, findings, units, fraction],
  )
