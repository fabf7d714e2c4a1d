import type { GuardRules } from '@shared/schemas/guard-rules'
import { ApiError } from '@/lib/api-error'

const refused = (path: string, message: string) =>
  new ApiError('guard-rules-not-kept', 0, message, [{ path, message }])

/** What no rules can mean, said before they are sent. @returns undefined when there is nothing to say */
export function whyNotKept({ id, climbable, handrail }: GuardRules): ApiError | undefined {
  if (id === 'new') return refused('id', 'The id new is kept for a page of its own. Choose another id.')
  if (climbable && climbable.from >= climbable.to) {
    return refused('climbable.to', 'Write a height above the one it begins at.')
  }
  if (handrail && handrail.least > handrail.most) {
    return refused('handrail.most', 'Write a height not below the least one.')
  }
  return undefined
}
