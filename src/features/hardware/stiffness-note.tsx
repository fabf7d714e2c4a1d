import { metallicArea, startingModulus } from '@shared/calculation/cable-properties'
import type { Cable } from '@shared/schemas/hardware'
import type { Force } from '@shared/units/force'
import { Button } from '@/components/button'
import { offeredStiffness } from './offered-stiffness'
import { forceText } from './words'

interface StiffnessNoteProps {
  cable: Pick<Cable, 'construction' | 'diameter'>
  unit: 'lbf' | 'N'
  /** None for somebody who may only look. */
  onUse: ((stiffness: Force) => void) | null
}

/** What construction and diameter say of a cable, where the modulus comes from, and the stiffness to take over. */
export function StiffnessNote({ cable, unit, onUse }: StiffnessNoteProps) {
  const offered = offeredStiffness(cable, unit)
  const modulus = startingModulus[cable.construction] / 1000
  return (
    <div className="rounded border border-rule bg-card p-3">
      <p>
        Metallic area <Computed>{metallicArea(cable).toFixed(2)} mm²</Computed>, so about{' '}
        <Computed>{forceText(offered, unit)}</Computed> at a modulus of <Computed>{modulus} kN/mm²</Computed>.
      </p>
      <p className="mt-1 text-sm text-soft">
        Equal round wires; the modulus of stainless {cable.construction} is remembered from EN 1993-1-11,
        table 3.1. The maker’s certificate decides.
      </p>
      {onUse ? (
        <Button className="mt-2" onClick={() => onUse(offered)}>
          Use {forceText(offered, unit)}
        </Button>
      ) : null}
    </div>
  )
}

const Computed = ({ children }: { children: React.ReactNode }) => (
  <span className="figures font-medium whitespace-nowrap text-spruce">{children}</span>
)
