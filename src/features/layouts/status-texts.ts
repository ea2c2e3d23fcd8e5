import type { LayoutStatus } from '@shared/protocol/layouts'

export const STATUS_NAMES: Record<LayoutStatus, string> = {
  draft: 'Draft',
  inReview: 'In review',
  released: 'Released',
  withdrawn: 'Withdrawn',
}
