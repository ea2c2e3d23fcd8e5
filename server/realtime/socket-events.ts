/**
 * What each event of a socket does. Every handler is wrapped once: bad input gets an answer where
 * one is expected, and no error of ours or of theirs ends the process.
 */
import type { Logger } from 'pino'
import type { z } from 'zod'
import {
  joinRequestSchema,
  leaveRequestSchema,
  MAX_OPERATIONS_PER_EDIT,
  presenceUpdateSchema,
  PROTOCOL_VERSION,
  submitRequestSchema,
  type JoinReply,
  type RejectReason,
  type SubmitOutcome,
} from '@shared/protocol/realtime'
import { refusal } from '../edits/edits.service'
import type { LayoutRooms } from './layout-rooms'
import type { SocketLimits } from './socket-limits'
import type { RealtimeSocket } from './socket-server'

export interface SocketEventParts {
  rooms: LayoutRooms
  limits: SocketLimits
  logger: Pick<Logger, 'error' | 'warn'>
}

export function handleEvents(socket: RealtimeSocket, { rooms, limits, logger }: SocketEventParts): void {
  const principal = () => socket.data.principal
  /** The limits answer a little later, and not all after the same time: one event after the other keeps their order. */
  let earlier = Promise.resolve()

  on('layout:join', async (payload, answer: (reply: JoinReply) => void) => {
    const refuse = (reason: RejectReason, message: string) => answer({ ok: false, reason, message })
    if (!(await limits.allow(socket.id, 'join')))
      return refuse('rateLimited', 'Too many attempts. Wait a little.')
    const request = parse(joinRequestSchema, payload)
    if (!request) return refuse('invalid', 'This request cannot be read.')
    if (request.protocolVersion !== PROTOCOL_VERSION) {
      return refuse('protocolVersion', 'This page is of another version. Reload it.')
    }
    answer(rooms.join(socket.id, principal(), request))
  })

  on('layout:leave', async (payload) => {
    if (parse(leaveRequestSchema, payload)) rooms.leave(socket.id)
  })

  on('edit:submit', async (payload, answer: (outcome: SubmitOutcome) => void) => {
    const count = operationCount(payload)
    if (count > MAX_OPERATIONS_PER_EDIT)
      return answer(refusal('tooLarge', 'This edit has too many operations.'))
    const request = parse(submitRequestSchema, payload)
    if (!request) return answer(refusal('invalid', 'This edit cannot be read.'))
    const { layoutId, ...edit } = request
    const isWithinLimits =
      (await limits.allow(socket.id, 'edit')) && (await limits.allow(socket.id, 'operation', count))
    rooms.submit(socket.id, layoutId, edit, answer, !isWithinLimits)
  })

  on('presence:update', async (payload) => {
    if (!(await limits.allow(socket.id, 'presence'))) return
    const update = parse(presenceUpdateSchema, payload)
    if (update) rooms.updatePresence(socket.id, update)
  })

  function on<Answer>(
    event: 'layout:join' | 'layout:leave' | 'edit:submit' | 'presence:update',
    handle: (payload: unknown, answer: (answer: Answer) => void) => Promise<void>,
  ): void {
    // What arrives is whatever was sent: the typed signature of the event is a hope until it is parsed.
    const listener = (payload: unknown, reply: unknown) => {
      const answer = typeof reply === 'function' ? (reply as (answer: Answer) => void) : () => undefined
      earlier = earlier
        .then(() => handle(payload, answer))
        .catch((error: unknown) => {
          logger.error({ err: error, event, userId: principal().userId }, 'A socket event failed')
        })
    }
    socket.on(event, listener)
  }
}

function parse<Schema extends z.ZodType>(schema: Schema, payload: unknown): z.infer<Schema> | null {
  const parsed = schema.safeParse(payload)
  return parsed.success ? parsed.data : null
}

/** Before the schema looks at each of them: a hundred thousand wrong operations would make as many issues. */
function operationCount(payload: unknown): number {
  if (typeof payload !== 'object' || payload === null || !('operations' in payload)) return 0
  return Array.isArray(payload.operations) ? payload.operations.length : 0
}
