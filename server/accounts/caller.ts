import type { IncomingHttpHeaders } from 'node:http'
import { CLIENT_ADDRESS_HEADER } from './auth'

/** What the sign-in package learns of a request: nothing that the client could forge but its own cookie. */
export type Caller = Headers

export function callerOf(headers: IncomingHttpHeaders, clientAddress: string | undefined): Caller {
  const caller = new Headers()
  if (headers.cookie) caller.set('cookie', headers.cookie)
  if (headers['user-agent']) caller.set('user-agent', headers['user-agent'].slice(0, 400))
  if (clientAddress) caller.set(CLIENT_ADDRESS_HEADER, clientAddress)
  return caller
}
