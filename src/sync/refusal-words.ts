import type { LayoutStatus } from '@shared/protocol/layouts'
import type { RejectReason } from '@shared/protocol/realtime'

export function refusalWords(reason: RejectReason): string {
  switch (reason) {
    case 'signedOut':
      return 'You are signed out. Sign in again; what is not saved yet is kept in this browser.'
    case 'notFound':
      return 'You no longer have access to this layout.'
    case 'forbidden':
      return 'Your role does not allow this.'
    case 'protocolVersion':
      return 'This page is of an older version. Reload it.'
    case 'frozen':
      return 'This revision is frozen.'
    case 'rateLimited':
      return 'Too many windows or requests at once. Close some and reload.'
    case 'invalid':
    case 'tooLarge':
      return 'The server cannot read what this page sends. Reload it.'
    case 'notJoined':
    case 'unavailable':
      return 'The server does not answer at the moment.'
  }
}

/** Why nothing can be edited here. */
export function readOnlyWords(status: LayoutStatus): string {
  switch (status) {
    case 'released':
      return 'This revision is released and no longer changes. Start the next revision to edit.'
    case 'withdrawn':
      return 'This revision is withdrawn and no longer changes. Start the next revision to edit.'
    case 'draft':
    case 'inReview':
      return 'Your role allows reading, not editing.'
  }
}
