import type { Role } from '@shared/protocol/roles'

export const ROLE_NAMES: Record<Role, string> = {
  viewer: 'Viewer',
  shop: 'Shop',
  designer: 'Designer',
  manager: 'Manager',
  admin: 'Admin',
}

export const ROLE_DESCRIPTIONS: Record<Role, string> = {
  viewer: 'Reads drafts and releases, comments.',
  shop: 'As viewer, and records inspection readings and assembly sign-offs on released layouts.',
  designer: 'Edits layouts, asks for review, imports and exports.',
  manager: 'As designer, and freezes, withdraws and starts the next revision.',
  admin: 'As manager, and invites people, changes roles and removes people.',
}
