import { z } from 'zod'

/** Ordered from least to most; each role includes the one before it, but `shop` adds only inspection. */
export const ROLES = ['viewer', 'shop', 'designer', 'manager', 'admin'] as const
export const roleSchema = z.enum(ROLES)
export type Role = z.infer<typeof roleSchema>
