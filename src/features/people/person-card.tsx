import type { ReactNode } from 'react'
import type { Person } from '@shared/schemas/person'
import { classes } from '@/components/classes'
import { stateWords } from './state-words'

interface PersonCardProps {
  person: Person
  isSelf: boolean
  /** What may be done with them. */
  children?: ReactNode
}

/** One person: who they are, what they do, whether they can sign in. */
export function PersonCard({ person, isSelf, children }: PersonCardProps) {
  return (
    <li className="rounded border border-rule bg-card p-4">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h2 className="text-lg font-semibold">
          {person.name}
          {isSelf ? ' (you)' : ''}
        </h2>
        <p className="font-medium">{person.roles.join(', ')}</p>
      </div>
      <p className="wrap-anywhere text-soft">{person.email}</p>
      <p className={classes('text-sm', person.state === 'active' ? 'text-soft' : 'font-medium text-marker')}>
        {stateWords(person)}
      </p>
      {children}
    </li>
  )
}
