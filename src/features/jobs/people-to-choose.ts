import type { Job } from '@shared/schemas/job'
import type { Person } from '@shared/schemas/person'

/**
 * Whom a job can be with: everybody who can sign in, and always the person it is with now, even disabled or not yet
 * fetched. Left out, saving anything else would quietly take the job from them.
 */
export function peopleToChoose(
  people: readonly Person[],
  job?: Pick<Job, 'personId' | 'personName'>,
): { id: string; name: string }[] {
  const choices = people.filter(({ id, state }) => state !== 'disabled' || id === job?.personId)
  if (!job?.personId || choices.some(({ id }) => id === job.personId)) return choices
  return [{ id: job.personId, name: job.personName ?? 'the present person' }, ...choices]
}
