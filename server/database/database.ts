/** The map of all tables. Each domain declares its own rows beside its repository. */
import type {
  AccountTable,
  InvitationTable,
  MemberTable,
  OrganizationTable,
  SessionTable,
  UserTable,
  VerificationTable,
} from '../accounts/accounts.table'
import type { LayoutEditBaseTable, LayoutEditReceiptTable, LayoutEditTable } from '../edits/edits.table'
import type { LayoutTable } from '../layouts/layout.table'
import type { LayoutReleaseTable, LayoutReleaseWithdrawalTable } from '../releases/releases.table'

export interface Database {
  user: UserTable
  session: SessionTable
  account: AccountTable
  verification: VerificationTable
  organization: OrganizationTable
  member: MemberTable
  invitation: InvitationTable
  layout: LayoutTable
  layout_edit: LayoutEditTable
  layout_edit_base: LayoutEditBaseTable
  layout_edit_receipt: LayoutEditReceiptTable
  layout_release: LayoutReleaseTable
  layout_release_withdrawal: LayoutReleaseWithdrawalTable
}
