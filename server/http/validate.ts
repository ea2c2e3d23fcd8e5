import type { Request } from 'express'
import { z } from 'zod'
import { HttpError } from './http-error'

/** The first message of each field, keyed by its dot path; '' stands for the whole body. */
export function fieldMessages(error: z.ZodError): Record<string, string> {
  const fields: Record<string, string> = {}
  for (const issue of error.issues) {
    const path = issue.path.map(String).join('.')
    fields[path] ??= issue.message
  }
  return fields
}

export function validate<Schema extends z.ZodType>(schema: Schema, value: unknown): z.output<Schema> {
  const parsed = schema.safeParse(value)
  if (parsed.success) return parsed.data
  throw new HttpError('bad-request', 'Some of this is not usable.', fieldMessages(parsed.error))
}

/** A body that is missing or not JSON arrives as undefined and fails the schema like any other. */
export function parseBody<Schema extends z.ZodType>(schema: Schema, request: Request): z.output<Schema> {
  return validate(schema, request.body as unknown)
}

/** Path parameters are ids of ours; anything else is simply not there. */
export function pathId(request: Request, name: string): string {
  const value = request.params[name]
  const parsed = z
    .string()
    .regex(/^[A-Za-z0-9_-]{1,64}$/)
    .safeParse(value)
  if (!parsed.success) throw new HttpError('not-found', 'This does not exist, or you may not see it.')
  return parsed.data
}
