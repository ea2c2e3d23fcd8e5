/** Keys of everything the query cache holds, so that one feature can refresh what another shows. */
export const queryKeys = {
  me: ['me'] as const,
  sessions: ['sessions'] as const,
  invitation: (invitationId: string) => ['invitation', invitationId] as const,
  people: (workspaceId: string) => ['people', workspaceId] as const,
  layouts: (workspaceId: string) => ['layouts', workspaceId] as const,
  layout: (layoutId: string) => ['layout', layoutId] as const,
  releases: (workspaceId: string) => ['releases', workspaceId] as const,
  everyRelease: ['release'] as const,
  release: (releaseId: string) => ['release', releaseId] as const,
  examples: ['examples'] as const,
  caughtMail: ['caughtMail'] as const,
}
