/** Things for the authorization table to act on, made by people who may make them. */
import type { Role } from '@shared/protocol/roles'
import type { TestApp, TestPerson } from '../support/test-app'

export interface Fixtures {
  workspaceId: string
  newLayout(): Promise<string>
  newLayoutInReview(): Promise<string>
  newRelease(): Promise<{ layoutId: string; releaseId: string }>
  newMember(): Promise<{ workspaceId: string; memberId: string }>
  newInvitation(): Promise<{ workspaceId: string; invitationId: string }>
}

export function createFixtures(app: TestApp, people: ReadonlyMap<Role, TestPerson>): Fixtures {
  const { workspaceId } = app
  const by = (role: Role) => {
    const person = people.get(role)
    if (!person) throw new Error(`Nobody is ${role}`)
    return person
  }
  async function post(person: TestPerson, path: string, body: unknown) {
    const answer = await person.post(path, body)
    if (answer.status >= 300) throw new Error(`${path}: ${answer.status} ${answer.text}`)
    return answer.body
  }
  let invited = 0

  const fixtures: Fixtures = {
    workspaceId,
    async newLayout() {
      const from = { kind: 'example', exampleId: 'gear-and-pulley' }
      const layout = await post(by('designer'), `/api/workspaces/${workspaceId}/layouts`, { from })
      return layout.id
    },
    async newLayoutInReview() {
      const layoutId = await fixtures.newLayout()
      await post(by('designer'), `/api/layouts/${layoutId}/review`, {})
      return layoutId
    },
    async newRelease() {
      const layoutId = await fixtures.newLayout()
      const release = await post(by('manager'), `/api/layouts/${layoutId}/freeze`, {
        revision: 0,
        acceptances: [],
      })
      return { layoutId, releaseId: release.id }
    },
    async newMember() {
      invited += 1
      const { accounts } = app.server.parts
      const email = `member-${invited}@cedar-line.example`
      const userId = await accounts.createConfirmedPerson({ name: 'New Member', email, password: email })
      await accounts.addMember(workspaceId, userId, 'viewer')
      const people = await by('admin').get(`/api/workspaces/${workspaceId}/members`)
      const member = people.body.members.find((each: { userId: string }) => each.userId === userId)
      return { workspaceId, memberId: member.id }
    },
    async newInvitation() {
      invited += 1
      const email = `invited-${invited}@cedar-line.example`
      const invitation = await post(by('admin'), `/api/workspaces/${workspaceId}/invitations`, {
        email,
        role: 'viewer',
      })
      return { workspaceId, invitationId: invitation.id }
    },
  }
  return fixtures
}
