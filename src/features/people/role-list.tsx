import { roleMeanings, roles } from '@shared/permissions/roles'

/** What each role does, for whoever wonders whom to ask. */
export function RoleList() {
  return (
    <details className="mt-6 rounded border border-rule bg-card">
      <summary className="min-h-12 p-3 font-medium text-spruce">What the roles mean</summary>
      <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-6 gap-y-2 p-4 pt-1">
        {roles.map((role) => (
          <div key={role} className="contents">
            <dt className="font-semibold">{role}</dt>
            <dd>{roleMeanings[role]}</dd>
          </div>
        ))}
      </dl>
    </details>
  )
}
