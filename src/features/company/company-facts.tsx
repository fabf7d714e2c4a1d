import type { Company } from '@shared/schemas/company'

/** What holds for the company, for those who may not change it. */
export function CompanyFacts({ company: { name, units, fraction, keepPhotoPlace } }: { company: Company }) {
  const inches = units.length === 'in'
  const facts = [
    ['Name', name],
    ['New surveys are measured in', inches ? 'inches, pounds-force' : 'millimetres, newtons'],
    ['Finest fraction shown and keyed in', inches ? `1/${fraction} in` : ''],
    ['Where photos were taken', keepPhotoPlace ? 'is kept with them' : 'is dropped before they are stored'],
  ] as const
  return (
    <dl className="flex flex-col gap-4">
      {facts.map(([label, value]) =>
        value ? (
          <div key={label}>
            <dt className="text-sm font-medium text-soft">{label}</dt>
            <dd>{value}</dd>
          </div>
        ) : null,
      )}
    </dl>
  )
}
