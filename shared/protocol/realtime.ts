/**
 * Socket events and their payloads. Rules with ids stand in SPEC.md beside this file.
 * Names: `noun:verb` from the client, past tense from the server.
 */
import { z } from 'zod'
import { type LayoutDocument, partIdSchema } from '../layout/layout-document'
import { type Operation, operationSchema } from '../layout/operations'
import type { LayoutStatus } from './layouts'
import type { Role } from './roles'

export const PROTOCOL_VERSION = 1
export const MAX_OPERATIONS_PER_EDIT = 400
/** JSON text of one edit's operations. The socket itself refuses messages of MAX_MESSAGE_BYTES by closing. */
export const MAX_EDIT_BYTES = 90_000
export const MAX_MESSAGE_BYTES = 128 * 1024
/** A document beyond this would be slow to open for everybody. */
export const MAX_DOCUMENT_BYTES = 1_000_000
/** A client that missed more edits than this gets the whole document instead. */
export const MAX_CATCH_UP_EDITS = 500
/** Pointer ghosts are pleasant at 20 Hz and not dearer than the edits themselves. */
export const PRESENCE_INTERVAL_MS = 50

const id = z.string().min(1).max(64)
/** Author of log entries that no browser sent: status changes and renames over HTTP. */
export const SERVER_CLIENT_ID = 'server'
const clientIdSchema = id.refine((clientId) => clientId !== SERVER_CLIENT_ID, 'This name is taken')

export const joinRequestSchema = z.strictObject({
  layoutId: id,
  /**
   * Random, new for each opened layout: a duplicated tab must not count on in the same sequence.
   * What an earlier one left unsent is sent under its own client id.
   */
  clientId: clientIdSchema,
  protocolVersion: z.number().int(),
  /** Null on first join. */
  lastRevision: z.number().int().nonnegative().nullable(),
  epoch: z.string().max(64).nullable(),
})

export const leaveRequestSchema = z.strictObject({ layoutId: id })

export const submitRequestSchema = z.strictObject({
  layoutId: id,
  clientId: clientIdSchema,
  /** Strictly increasing per client; an edit once sent is never changed. */
  clientSeq: z.number().int().positive(),
  editId: id,
  baseRevision: z.number().int().nonnegative(),
  /** Shown in notices and history: "Move Pinion". */
  label: z.string().max(120),
  operations: z.array(operationSchema).min(1).max(MAX_OPERATIONS_PER_EDIT),
})

/** What a person is doing; never stored, never part of the log. */
export const presenceUpdateSchema = z.strictObject({
  layoutId: id,
  cursor: z.strictObject({ xMm: z.number().finite(), yMm: z.number().finite() }).nullable(),
  selection: z.array(partIdSchema).max(50),
  /** Field being typed in, such as "hub:A:lengthMm". */
  editing: z.string().max(120).nullable(),
  ghost: z
    .strictObject({ part: partIdSchema, stationMm: z.number().finite(), lengthMm: z.number().finite() })
    .nullable(),
})

export type JoinRequest = z.infer<typeof joinRequestSchema>
export type SubmitRequest = z.infer<typeof submitRequestSchema>
export type PresenceUpdate = z.infer<typeof presenceUpdateSchema>

export const REJECT_REASONS = [
  'frozen', // the layout was frozen before this edit
  'forbidden', // the role may not edit
  'invalid', // the operations break the document's rules
  'tooLarge',
  'rateLimited',
  'notJoined',
  'signedOut',
  'protocolVersion',
  'notFound',
  'unavailable', // not stored; try again
] as const
export type RejectReason = (typeof REJECT_REASONS)[number]

/** Something both people should know about an accepted edit. */
export interface EditNotice {
  kind: 'overwrote' | 'dropped'
  /** Words for the target: "length of Pinion". */
  what: string
  /** Whose value was overwritten, or who removed the part. */
  byName: string | null
  byUserId: string | null
}

/** Status changes stand in the same sequence as edits (with no operations), so that what came before a freeze is in it. */
export type LogEntryKind = 'edit' | 'review' | 'reviewTakenBack' | 'freeze' | 'withdraw' | 'nextRevision'

export interface AcceptedEdit {
  kind: LogEntryKind
  revision: number
  editId: string
  clientId: string
  clientSeq: number
  userId: string
  userName: string
  label: string
  operations: Operation[]
  notices: EditNotice[]
  acceptedAt: string
}

export type SubmitOutcome =
  | { outcome: 'accepted'; edit: AcceptedEdit }
  | { outcome: 'adjusted'; edit: AcceptedEdit }
  | { outcome: 'noEffect'; revision: number; notices: EditNotice[] }
  | { outcome: 'rejected'; reason: RejectReason; message: string }

export interface Person {
  /** Socket id of that window. */
  connectionId: string
  userId: string
  name: string
  role: Role
  /** Index into the presence colours of the client. */
  colourIndex: number
}

export interface PresenceState extends Person {
  cursor: PresenceUpdate['cursor']
  selection: string[]
  editing: string | null
  ghost: PresenceUpdate['ghost']
}

export interface LayoutAccess {
  role: Role
  canEdit: boolean
  status: LayoutStatus
  revisionLetter: string
}

export type JoinReply =
  | {
      ok: true
      epoch: string
      revision: number
      access: LayoutAccess
      you: Person
      people: PresenceState[]
      /** Either the edits after `lastRevision` or the whole document. */
      sync: { kind: 'edits'; edits: AcceptedEdit[] } | { kind: 'snapshot'; document: LayoutDocument }
    }
  | { ok: false; reason: RejectReason; message: string }

export interface ClientToServerEvents {
  'layout:join': (request: JoinRequest, reply: (answer: JoinReply) => void) => void
  'layout:leave': (request: { layoutId: string }) => void
  'edit:submit': (request: SubmitRequest, reply: (answer: SubmitOutcome) => void) => void
  'presence:update': (update: PresenceUpdate) => void
}

export interface ServerToClientEvents {
  'edit:accepted': (message: { layoutId: string; edit: AcceptedEdit }) => void
  /** To the person whose removal made somebody's edit come to nothing; such an edit has no revision. */
  'edit:dropped': (message: {
    layoutId: string
    userName: string
    label: string
    notices: EditNotice[]
  }) => void
  /** Status, letter or role changed: freeze, withdraw, next revision, review, change of role. */
  'access:changed': (message: { layoutId: string; access: LayoutAccess; byName: string | null }) => void
  /** The person may no longer see this layout; the socket leaves it. */
  'access:revoked': (message: { layoutId: string; reason: RejectReason }) => void
  /** Coalesced: everyone in the layout, at most once per PRESENCE_INTERVAL_MS. */
  'presence:changed': (message: { layoutId: string; people: PresenceState[] }) => void
  /** A list or a release of the workspace changed; clients refetch by key. */
  'workspace:changed': (message: { workspaceId: string; what: 'layouts' | 'releases' | 'people' }) => void
}
