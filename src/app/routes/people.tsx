import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { Button } from '@/components/button'
import { Page } from '@/components/page'
import { Sheet } from '@/components/sheet'
import { ErrorNote, Loading } from '@/components/states'
import { AddPerson } from '@/features/people/add-person'
import { peopleQuery } from '@/features/people/api/list-people'
import { PersonCard } from '@/features/people/person-card'
import { PersonControls } from '@/features/people/person-controls'
import { RoleList } from '@/features/people/role-list'
import { useMay, useSession } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'

export function Component() {
  const { person: self } = useSession()
  const mayManage = useMay('people:manage')
  const [adding, setAdding] = useState(false)
  const { data: people, error, isPending, refetch } = useQuery(peopleQuery)
  return (
    <Page
      title="People"
      actions={
        mayManage ? (
          <Button look="primary" onClick={() => setAdding(true)}>
            Add a person
          </Button>
        ) : null
      }
    >
      {isPending ? <Loading what="the people" /> : null}
      {error ? <ErrorNote message={messageOf(error)} onRetry={() => void refetch()} /> : null}
      {mayManage ? null : (
        <p className="mb-4 text-soft">An owner of your company adds people and gives roles.</p>
      )}
      {people ? (
        <ul className="grid items-start gap-3 md:grid-cols-2">
          {people.map((person) => (
            <PersonCard key={person.id} person={person} isSelf={person.id === self.id}>
              {mayManage ? <PersonControls person={person} isSelf={person.id === self.id} /> : null}
            </PersonCard>
          ))}
        </ul>
      ) : null}
      {mayManage && people?.length === 1 ? (
        <p className="mt-4 text-soft">
          You are the first. Add whoever measures, prices, cuts and fits; each gets a one-time link.
        </p>
      ) : null}
      <RoleList />
      <Sheet open={adding} onOpenChange={setAdding} title="Add a person">
        <AddPerson />
      </Sheet>
    </Page>
  )
}
