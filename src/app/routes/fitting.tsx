import { useQuery } from '@tanstack/react-query'
import { Link, useNavigate, useParams } from 'react-router-dom'
import { Page } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { sayDone } from '@/components/toast'
import { hardwareQuery } from '@/features/hardware/api/read-hardware'
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
  const title = key === undefined ? 'New fitting' : (known?.fitting.name ?? 'Fitting')
  return (
    <Page title={title} width="narrow" above={<Link to={paths.hardware}>Hardware</Link>}>
      {isPending ? <Loading what="the fitting" /> : null}
      {error ? <ErrorNote message={messageOf(error)} onRetry={() => void refetch()} /> : null}
      {data && key !== undefined && !known ? <EmptyState title="There is no such fitting" /> : null}
      {data && (key === undefined || known) ? (
        <FittingForm
          key={key ?? 'new'}
          {...(known ? { known } : {})}
          cables={data.cables.filter(({ retired }) => !retired).map(({ cable }) => cable)}
          format={lengthFormat(company.units, 64)}
          readOnly={!mayEdit}
          onSaved={() => {
            sayDone('The fitting is saved.')
            void navigate(paths.hardware)
          }}
        />
      ) : null}
    </Page>
  )
}
