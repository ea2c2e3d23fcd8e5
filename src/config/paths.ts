/** Every address of the client, declared once. */
export const paths = {
  home: '/',
  signIn: '/sign-in',
  signUp: '/sign-up',
  forgotPassword: '/forgotten-password',
  resetPassword: '/reset-password',
  confirmEmail: '/confirm-email',
  invitation: (invitationId = ':invitationId') => `/invitation/${invitationId}`,
  account: '/account',
  methods: '/methods',
  caughtMail: '/caught-mail',
  layouts: (workspaceId = ':workspaceId') => `/w/${workspaceId}/layouts`,
  bench: (workspaceId = ':workspaceId', layoutId = ':layoutId') => `/w/${workspaceId}/layouts/${layoutId}`,
  releases: (workspaceId = ':workspaceId') => `/w/${workspaceId}/releases`,
  release: (workspaceId = ':workspaceId', releaseId = ':releaseId') =>
    `/w/${workspaceId}/releases/${releaseId}`,
  people: (workspaceId = ':workspaceId') => `/w/${workspaceId}/people`,
}
