import { useQuery } from '@tanstack/react-query'
import { Link, useNavigate, useParams } from 'react-router-dom'
import { Page } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { sayDone } from '@/components/toast'
import { hardwareQuery } from '@/features/hardware/api/read-hardware'
import { CableFacts } from '@/features/hardware/cable-facts'
import { CableForm } from '@/features/hardware/cable-form'
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
  const known = data?.cables.find((entry) => entry.key === key)
  const format = lengthFormat(company.units, 64)
  const title = key === undefined ? 'New cable' : (known?.cable.name ?? 'Cable')
  return (
    <Page title={title} width="narrow" above={<Link to={paths.hardware}>Hardware</Link>}>
      {isPending ? <Loading what="the cable" /> : null}
      {error ? <ErrorNote message={messageOf(error)} onRetry={() => void refetch()} /> : null}
      {data && key !== undefined && !known ? <EmptyState title="There is no such cable" /> : null}
      {known && !mayEdit ? (
        <>
          <p className="mb-4 text-soft">An owner of your company changes it.</p>
          <CableFacts cable={known.cable} units={company.units} format={format} />
        </>
      ) : null}
      {data && mayEdit && (key === undefined || known) ? (
        <CableForm
          key={key ?? 'new'}
          {...(known ? { known } : {})}
          units={company.units}
          format={format}
          onSaved={() => {
            sayDone('The cable is saved.')
            void navigate(paths.hardware)
          }}
        />
      ) : null}
      {key === undefined && !mayEdit ? <EmptyState title="An owner of your company adds cables" /> : null}
    </Page>
  )
}
