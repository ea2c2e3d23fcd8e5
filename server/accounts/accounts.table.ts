/** Rows of the sign-in package's tables. Dates are ISO text, booleans 0 or 1. */
import type { Role } from '@shared/protocol/roles'

export interface UserTable {
  id: string
  name: string
  email: string
  email_verified: 0 | 1
  image: string | null
  created_at: string
  updated_at: string
}

export interface SessionTable {
  id: string
  expires_at: string
  token: string
  created_at: string
  updated_at: string
  ip_address: string | null
  user_agent: string | null
  user_id: string
  active_organization_id: string | null
}

export interface AccountTable {
  id: string
  account_id: string
  provider_id: string
  user_id: string
  access_token: string | null
  refresh_token: string | null
  id_token: string | null
  access_token_expires_at: string | null
  refresh_token_expires_at: string | null
  scope: string | null
  password: string | null
  created_at: string
  updated_at: string
}

export interface VerificationTable {
  id: string
  identifier: string
  value: string
  expires_at: string
  created_at: string
  updated_at: string
}

export interface OrganizationTable {
  id: string
  name: string
  slug: string
  logo: string | null
  created_at: string
  metadata: string | null
}

export interface MemberTable {
  id: string
  organization_id: string
  user_id: string
  role: Role
  created_at: string
}

export interface InvitationTable {
  id: string
  organization_id: string
  email: string
  role: Role
  /** The package spells it `canceled`; the protocol says `cancelled`. */
  status: 'pending' | 'accepted' | 'canceled' | 'rejected'
  expires_at: string
  created_at: string
  inviter_id: string
}
