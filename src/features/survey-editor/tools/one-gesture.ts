import type { SimpleOperation, SurveyOperation } from '@shared/survey/survey-operation'

/** Several changes of one gesture as one operation. */
export function oneGesture(operations: readonly SurveyOperation[]): SurveyOperation {
  const steps = operations.flatMap((operation): SimpleOperation[] =>
    operation.type === 'group' ? operation.operations : [operation],
  )
  const [only] = steps
  return only && steps.length === 1 ? only : { type: 'group', operations: steps }
}
