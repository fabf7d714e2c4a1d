import { inches } from '@shared/units/length'
import { stages } from '@shared/schemas/job'
import { roles } from '@shared/schemas/role'
import { Card } from '@/components/page'
import { FindingItem } from '@/components/finding-mark'
import { Length } from '@/components/length'
import { RoleBadge } from '@/components/role-badge'
import { StageStepper } from '@/components/stage-stepper'
import { Brand, Progress, TautLine } from '@/components/taut-line'

const feet = { style: 'feet', finest: 32 } as const
const inch = { style: 'inches', finest: 16 } as const
const metric = { style: 'millimetres' } as const
const sizes = ['text-3xl', 'text-2xl', 'text-xl', 'text-lg', 'text-base', 'text-sm', 'text-xs']

export function FigureParts() {
  return (
    <>
      <Card title="Lengths">
        <div className="flex flex-wrap items-baseline gap-x-8 gap-y-3">
          <Length value={inches(148.375)} format={feet} className="text-3xl font-semibold" />
          <Length value={inches(95.8125)} format={inch} look="computed" className="text-3xl font-semibold" />
          <Length value={inches(64.25)} format={inch} look="struck" className="text-2xl" />
          <Length value={inches(0.375)} format={inch} className="text-2xl" />
          <Length value={inches(148.375)} format={metric} className="text-2xl" />
          <Length value={inches(11.3)} format={inch} look="computed" className="text-2xl" />
        </div>
        <ul className="mt-4">
          {sizes.map((size) => (
            <li key={size} className={size}>
              Bay B4, clear <Length value={inches(46.46875)} format={feet} />
            </li>
          ))}
        </ul>
      </Card>
      <Card title="The taut line" actions={<Brand />}>
        <div className="grid gap-4">
          <TautLine />
          <TautLine share={0.4} />
          <TautLine busy />
          <Progress label="Sending the photo" share={0.4} />
          {stages.map((stage) => (
            <StageStepper key={stage} stage={stage} />
          ))}
        </div>
      </Card>
      <Card title="Findings and roles">
        <div className="grid gap-2">
          <FindingItem
            finding={{ level: 'note', text: 'Bay B2 is read once; a second reading would be averaged.' }}
          />
          <FindingItem
            finding={{ level: 'check', text: 'Bay B3 differs by 1/4 in between top and bottom.' }}
          />
          <FindingItem finding={{ level: 'stop', text: 'Run R1 has no fitting for a veneered post.' }} />
        </div>
        <div className="mt-4 flex flex-wrap gap-2">
          {roles.map((role) => (
            <RoleBadge key={role} role={role} />
          ))}
        </div>
      </Card>
    </>
  )
}
