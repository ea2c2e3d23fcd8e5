import { z } from 'zod'

/** The one error shape of every HTTP answer that is not 2xx. `fields` maps a field path to a message. */
export const ERROR_CODES = [
  'bad-request',
  'unauthenticated',
  'forbidden',
  'not-found',
  'conflict',
  'frozen',
  'fails', // freezing refused: failing findings without acceptance
  'too-many-requests',
  'payload-too-large',
  'unsupported-media-type',
  'unavailable',
  'internal',
] as const
export const errorBodySchema = z.strictObject({
  error: z.strictObject({
    code: z.enum(ERROR_CODES),
    message: z.string(),
    fields: z.record(z.string(), z.string()).optional(),
  }),
})
export type ErrorCode = (typeof ERROR_CODES)[number]
export type ErrorBody = z.infer<typeof errorBodySchema>
