/** The demo's people, workspace and layouts, made through the same services that people use. */
import type { Role } from '@shared/protocol/roles'
import type { Accounts } from '../accounts/accounts'
import type { LayoutsService } from '../layouts/layouts.service'
import { demoLayouts } from './layout-data'

export const DEMO_PASSWORD = 'between-two-centres'
export const DEMO_WORKSPACE = 'Cedar Line drives'

export const DEMO_PEOPLE = [
  { name: 'Vera Lund', email: 'vera@cedar-line.example', role: 'viewer' },
  { name: 'Sam Okoro', email: 'sam@cedar-line.example', role: 'shop' },
  { name: 'Dina Reyes', email: 'dina@cedar-line.example', role: 'designer' },
  { name: 'Tomas Berg', email: 'tomas@cedar-line.example', role: 'designer' },
  { name: 'Mira Kast', email: 'mira@cedar-line.example', role: 'manager' },
  { name: 'Ada Winter', email: 'ada@cedar-line.example', role: 'admin' },
] as const satisfies { name: string; email: string; role: Role }[]

export async function seedDemo(accounts: Accounts, layouts: LayoutsService): Promise<void> {
  const userIds = await Promise.all(
    DEMO_PEOPLE.map(({ name, email }) =>
      accounts.createConfirmedPerson({ name, email, password: DEMO_PASSWORD }),
    ),
  )
  const people = DEMO_PEOPLE.map((person, index) => ({ ...person, userId: userIds[index] ?? '' }))
  const idOf = (role: Role) => people.find((person) => person.role === role)?.userId ?? ''

  const workspaceId = await accounts.createWorkspaceFor(idOf('admin'), DEMO_WORKSPACE, 'cedar-line-drives')
  for (const { userId, role } of people) {
    if (role !== 'admin') await accounts.addMember(workspaceId, userId, role)
  }

  const designer = accounts.principalOf(idOf('designer'))
  if (!designer) throw new Error('The demo designer is missing')
  for (const { project, document } of demoLayouts()) {
    layouts.create(designer, workspaceId, { project, from: { kind: 'file', content: document } })
  }
}
