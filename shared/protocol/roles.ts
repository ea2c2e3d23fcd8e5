import { z } from 'zod'

/** Ordered from least to most; each role includes the one before it, but `shop` adds only inspection. */
export const ROLES = ['viewer', 'shop', 'designer', 'manager', 'admin'] as const
export const roleSchema = z.enum(ROLES)
export type Role = z.infer<typeof roleSchema>

/** Whether a role may do at least what the other may. The server's policy decides; pages hide what it would refuse. */
export const roleCovers = (role: Role, least: Role): boolean => ROLES.indexOf(role) >= ROLES.indexOf(least)
