import { useQuery } from '@tanstack/react-query'
import { writeForce } from '@shared/units/format-force'
import { writeLength } from '@shared/units/format-length'
import { ButtonLink } from '@/components/button'
import { Card, Page } from '@/components/page'
import { ErrorNote, Loading } from '@/components/states'
import { sayDone, sayProblem } from '@/components/toast'
import { hardwareQuery } from '@/features/hardware/api/read-hardware'
import { type Retirement, useRetire } from '@/features/hardware/api/save-hardware'
import { CatalogueList, type CatalogueLine } from '@/features/hardware/catalogue-list'
import { useMay, useSession } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'
import { lengthFormat } from '../length-format'
import { paths } from '../paths'

export function Component() {
  const { company } = useSession()
  const mayEdit = useMay('hardware:edit')
  const { data, error, isPending, refetch } = useQuery(hardwareQuery)
  const retire = useRetire()
  const shown = (nm: number) => writeLength(nm, lengthFormat(company.units, 64))
  const turn = (kind: Retirement['kind']) => (line: CatalogueLine) => {
    const change = { kind, key: line.key, retired: !line.retired }
    retire.mutate(change, {
      onSuccess: () =>
        sayDone(line.retired ? `${line.name} is offered again.` : `${line.name} is retired.`, () =>
          retire.mutate({ ...change, retired: line.retired }),
        ),
      onError: (fault) => sayProblem(messageOf(fault)),
    })
  }
  const add = (to: string, label: string) => (mayEdit ? <ButtonLink to={to}>{label}</ButtonLink> : null)
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
        <div className="grid gap-4 lg:grid-cols-2">
          <Card title="Fittings" actions={add(paths.newFitting, 'Add a fitting')}>
            <CatalogueList
              label="Fittings"
              pathOf={paths.fitting}
              onRetire={mayEdit ? turn('fitting') : null}
              lines={data.fittings.map(({ key, retired, fitting }) => ({
                key,
                retired,
                id: fitting.id,
                name: fitting.name,
                facts: `${fitting.mount}, body ${shown(fitting.body)}, take-up ${shown(fitting.takeUp)}, to ${fitting.maxAngle}°, ${fitting.materials.join(', ')}`,
              }))}
            />
          </Card>
          <Card title="Cables" actions={add(paths.newCable, 'Add a cable')}>
            <CatalogueList
              label="Cables"
              pathOf={paths.cable}
              onRetire={mayEdit ? turn('cable') : null}
              lines={data.cables.map(({ key, retired, cable }) => ({
                key,
                retired,
                id: cable.id,
                name: cable.name,
                facts: `${cable.construction}, ${shown(cable.diameter)}, axial stiffness ${writeForce(cable.axialStiffness, company.units.force)}`,
              }))}
            />
          </Card>
        </div>
      ) : null}
    </Page>
  )
}
