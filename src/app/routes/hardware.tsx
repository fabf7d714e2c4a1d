import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { ButtonLink } from '@/components/button'
import { TextField } from '@/components/field'
import { Page } from '@/components/page'
import { ErrorNote, Loading } from '@/components/states'
import { sayDone, sayProblem } from '@/components/toast'
import { hardwareQuery } from '@/features/hardware/api/read-hardware'
import { type Retirement, useRetire } from '@/features/hardware/api/retire-entry'
import { CablesSection } from '@/features/hardware/cables-section'
import { FittingsSection } from '@/features/hardware/fittings-section'
import { useMay, useSession } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'
import { lengthFormat } from '../length-format'
import { paths } from '../paths'

interface Turned {
  key: string
  name: string
  retired: boolean
}

/** Retires what is offered and offers what is retired, with a way back. */
function useTurn() {
  const { mutateAsync } = useRetire()
  const send = async (change: Retirement, done: () => void) => {
    try {
      await mutateAsync(change)
      done()
    } catch (fault) {
      sayProblem(messageOf(fault))
    }
  }
  return (kind: Retirement['kind'], { key, name, retired }: Turned) => {
    const undo = () => void send({ kind, key, retired }, () => undefined)
    const done = () => sayDone(retired ? `${name} is offered again.` : `${name} is retired.`, undo)
    void send({ kind, key, retired: !retired }, done)
  }
}

export function Component() {
  const { company } = useSession()
  const mayEdit = useMay('hardware:edit')
  const { data, error, isPending, refetch } = useQuery(hardwareQuery)
  const [search, setSearch] = useState('')
  const turn = useTurn()
  const add = (to: string, label: string) => (mayEdit ? <ButtonLink to={to}>{label}</ButtonLink> : null)
  // To 1/64 whatever the company's fraction: 5/32 in of cable must not read as about 3/16.
  const shared = { search, format: lengthFormat(company.units, 64) }
  return (
    <Page title="Hardware">
      <p className="mb-4 text-soft">
        {mayEdit
          ? 'What cut lists choose from. Retired pieces are no longer chosen, and stay for old surveys.'
          : 'What cut lists choose from. An owner of your company changes it.'}
      </p>
      {isPending ? <Loading what="the hardware" /> : null}
      {error ? <ErrorNote message={messageOf(error)} onRetry={() => void refetch()} /> : null}
      {data ? (
        <div className="flex flex-col gap-8">
          <TextField
            label="Search"
            hint="A name, an id, a material or a construction."
            type="search"
            className="max-w-md"
            value={search}
            onChange={(event) => setSearch(event.target.value)}
          />
          <FittingsSection
            {...shared}
            entries={data.fittings}
            pathOf={paths.fitting}
            add={add(paths.newFitting, 'Add a fitting')}
            onRetire={mayEdit ? (line) => turn('fitting', line) : null}
          />
          <CablesSection
            {...shared}
            entries={data.cables}
            force={company.units.force}
            pathOf={paths.cable}
            add={add(paths.newCable, 'Add a cable')}
            onRetire={mayEdit ? (line) => turn('cable', line) : null}
          />
        </div>
      ) : null}
    </Page>
  )
}
