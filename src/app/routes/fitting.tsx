import { useQuery } from '@tanstack/react-query'
import { Link, useNavigate, useParams } from 'react-router-dom'
import type { Catalogue } from '@shared/schemas/catalogue'
import type { Fitting } from '@shared/schemas/hardware'
import { Page } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { sayDone } from '@/components/toast'
import { hardwareQuery } from '@/features/hardware/api/read-hardware'
import { FittingFacts } from '@/features/hardware/fitting-facts'
import { FittingForm } from '@/features/hardware/fitting-form'
import { useMay, useSession } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'
import { lengthFormat } from '../length-format'
import { paths } from '../paths'

export function Component() {
  const { key } = useParams()
  const { company } = useSession()
  const navigate = useNavigate()
  const mayEdit = useMay('hardware:edit')
  const { data, error, isPending, refetch } = useQuery(hardwareQuery)
  const known = data?.fittings.find((entry) => entry.key === key)
  const cables = data ? cablesFor(data, known?.fitting) : []
  const format = lengthFormat(company.units, 64)
  const title = key === undefined ? 'New fitting' : (known?.fitting.name ?? 'Fitting')
  return (
    <Page title={title} width="narrow" above={<Link to={paths.hardware}>Hardware</Link>}>
      {isPending ? <Loading what="the fitting" /> : null}
      {error ? <ErrorNote message={messageOf(error)} onRetry={() => void refetch()} /> : null}
      {data && key !== undefined && !known ? <EmptyState title="There is no such fitting" /> : null}
      {known && !mayEdit ? (
        <>
          <p className="mb-4 text-soft">An owner of your company changes it.</p>
          <FittingFacts fitting={known.fitting} cables={cables} format={format} force={company.units.force} />
        </>
      ) : null}
      {data && mayEdit && (key === undefined || known) ? (
        <FittingForm
          key={key ?? 'new'}
          {...(known ? { known } : {})}
          cables={cables}
          format={format}
          force={company.units.force}
          onSaved={() => {
            sayDone('The fitting is saved.')
            void navigate(paths.hardware)
          }}
        />
      ) : null}
      {key === undefined && !mayEdit ? <EmptyState title="An owner of your company adds fittings" /> : null}
    </Page>
  )
}

/** Cables a fitting may be for: those offered, and retired ones that it still names. */
const cablesFor = (catalogue: Catalogue, fitting: Fitting | undefined) =>
  catalogue.cables
    .filter(({ retired, cable }) => !retired || fitting?.cables.includes(cable.id) === true)
    .map(({ retired, cable: { id, name } }) => ({ id, name: retired ? `${name} (retired)` : name }))
