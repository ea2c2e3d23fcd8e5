import { type Kysely, sql } from 'kysely'

/**
 * People, sessions and workspaces. The tables and columns are those of the sign-in package with
 * snake_case names; the checks, the unique membership and the triggers are ours.
 */
export async function up(db: Kysely<unknown>): Promise<void> {
  await db.schema
    .createTable('user')
    .addColumn('id', 'text', (column) => column.notNull().primaryKey())
    .addColumn('name', 'text', (column) => column.notNull())
    .addColumn('email', 'text', (column) => column.notNull().unique())
    .addColumn('email_verified', 'integer', (column) => column.notNull().check(sql`email_verified in (0, 1)`))
    .addColumn('image', 'text')
    .addColumn('created_at', 'date', (column) => column.notNull())
    .addColumn('updated_at', 'date', (column) => column.notNull())
    .execute()

  await db.schema
    .createTable('session')
    .addColumn('id', 'text', (column) => column.notNull().primaryKey())
    .addColumn('expires_at', 'date', (column) => column.notNull())
    .addColumn('token', 'text', (column) => column.notNull().unique())
    .addColumn('created_at', 'date', (column) => column.notNull())
    .addColumn('updated_at', 'date', (column) => column.notNull())
    .addColumn('ip_address', 'text')
    .addColumn('user_agent', 'text')
    .addColumn('user_id', 'text', (column) => column.notNull().references('user.id').onDelete('cascade'))
    .addColumn('active_organization_id', 'text')
    .execute()
  await db.schema.createIndex('session_user_id_idx').on('session').column('user_id').execute()

  await db.schema
    .createTable('account')
    .addColumn('id', 'text', (column) => column.notNull().primaryKey())
    .addColumn('account_id', 'text', (column) => column.notNull())
    .addColumn('provider_id', 'text', (column) => column.notNull())
    .addColumn('user_id', 'text', (column) => column.notNull().references('user.id').onDelete('cascade'))
    .addColumn('access_token', 'text')
    .addColumn('refresh_token', 'text')
    .addColumn('id_token', 'text')
    .addColumn('access_token_expires_at', 'date')
    .addColumn('refresh_token_expires_at', 'date')
    .addColumn('scope', 'text')
    .addColumn('password', 'text')
    .addColumn('created_at', 'date', (column) => column.notNull())
    .addColumn('updated_at', 'date', (column) => column.notNull())
    .execute()
  await db.schema.createIndex('account_user_id_idx').on('account').column('user_id').execute()

  await db.schema
    .createTable('verification')
    .addColumn('id', 'text', (column) => column.notNull().primaryKey())
    .addColumn('identifier', 'text', (column) => column.notNull())
    .addColumn('value', 'text', (column) => column.notNull())
    .addColumn('expires_at', 'date', (column) => column.notNull())
    .addColumn('created_at', 'date', (column) => column.notNull())
    .addColumn('updated_at', 'date', (column) => column.notNull())
    .execute()
  await db.schema.createIndex('verification_identifier_idx').on('verification').column('identifier').execute()

  await db.schema
    .createTable('organization')
    .addColumn('id', 'text', (column) => column.notNull().primaryKey())
    .addColumn('name', 'text', (column) => column.notNull())
    .addColumn('slug', 'text', (column) => column.notNull().unique())
    .addColumn('logo', 'text')
    .addColumn('created_at', 'date', (column) => column.notNull())
    .addColumn('metadata', 'text')
    .execute()

  const isRole = sql`role in ('viewer', 'shop', 'designer', 'manager', 'admin')`
  await db.schema
    .createTable('member')
    .addColumn('id', 'text', (column) => column.notNull().primaryKey())
    .addColumn('organization_id', 'text', (column) =>
      column.notNull().references('organization.id').onDelete('cascade'),
    )
    .addColumn('user_id', 'text', (column) => column.notNull().references('user.id').onDelete('cascade'))
    .addColumn('role', 'text', (column) => column.notNull().check(isRole))
    .addColumn('created_at', 'date', (column) => column.notNull())
    .execute()
  await db.schema.createIndex('member_organization_id_idx').on('member').column('organization_id').execute()
  await db.schema.createIndex('member_user_id_idx').on('member').column('user_id').execute()
  await db.schema
    .createIndex('member_once_per_organization')
    .on('member')
    .columns(['organization_id', 'user_id'])
    .unique()
    .execute()

  await db.schema
    .createTable('invitation')
    .addColumn('id', 'text', (column) => column.notNull().primaryKey())
    .addColumn('organization_id', 'text', (column) =>
      column.notNull().references('organization.id').onDelete('cascade'),
    )
    .addColumn('email', 'text', (column) => column.notNull())
    .addColumn('role', 'text', (column) => column.notNull().check(isRole))
    .addColumn('status', 'text', (column) => column.notNull())
    .addColumn('expires_at', 'date', (column) => column.notNull())
    .addColumn('created_at', 'date', (column) => column.notNull())
    .addColumn('inviter_id', 'text', (column) => column.notNull().references('user.id').onDelete('cascade'))
    .execute()
  await db.schema
    .createIndex('invitation_organization_id_idx')
    .on('invitation')
    .column('organization_id')
    .execute()
  await db.schema.createIndex('invitation_email_idx').on('invitation').column('email').execute()

  // Two admins who demote each other in the same instant must not leave a workspace without one:
  // the check that the service makes first cannot see that, the database can.
  const noOtherAdmin = sql`not exists (
    select 1 from member where organization_id = old.organization_id and role = 'admin' and id <> old.id
  )`
  await sql`
    create trigger member_keep_last_admin_on_update before update of role on member
    when old.role = 'admin' and new.role <> 'admin' and ${noOtherAdmin}
    begin select raise(abort, 'last-admin'); end
  `.execute(db)
  await sql`
    create trigger member_keep_last_admin_on_delete before delete on member
    when old.role = 'admin' and ${noOtherAdmin}
    begin select raise(abort, 'last-admin'); end
  `.execute(db)
}
