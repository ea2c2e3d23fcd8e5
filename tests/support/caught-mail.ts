import type { APIRequestContext } from '@playwright/test'
import { z } from 'zod'
import { caughtMailSchema, type CaughtMail } from '@shared/protocol/accounts'

const POLL_MS = 200
const LIMIT_MS = 15_000

/** The newest mail to this address that the local SMTP server has received. */
export async function mailTo(request: APIRequestContext, address: string): Promise<CaughtMail> {
  const endAt = Date.now() + LIMIT_MS
  while (Date.now() < endAt) {
    const response = await request.get('/api/caught-mail')
    const { mails } = z.object({ mails: z.array(caughtMailSchema) }).parse(await response.json())
    const [newest] = mails.filter((mail) => mail.to === address).sort((a, b) => b.at.localeCompare(a.at))
    if (newest) return newest
    await new Promise((resolve) => setTimeout(resolve, POLL_MS))
  }
  throw new Error(`No mail to ${address} came within ${LIMIT_MS} ms`)
}
