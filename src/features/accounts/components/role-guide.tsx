import { ROLES } from '@shared/protocol/roles'
import { ROLE_DESCRIPTIONS, ROLE_NAMES } from '../role-texts'

export function RoleGuide() {
  return (
    <details className="mt-8 border-t border-hairline pt-4 text-sm">
      <summary className="w-fit font-semibold">What each role may do</summary>
      <dl className="mt-3 grid gap-x-6 gap-y-2 sm:grid-cols-[6rem_1fr]">
        {ROLES.map((role) => (
          <div key={role} className="contents">
            <dt className="font-semibold">{ROLE_NAMES[role]}</dt>
            <dd className="text-quiet">{ROLE_DESCRIPTIONS[role]}</dd>
          </div>
        ))}
      </dl>
    </details>
  )
}
