import { sql } from 'drizzle-orm';
import { check, index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { moment, ownId } from './columns';

export const ROLES = ['member', 'host', 'librarian', 'admin'] as const;
export type Role = (typeof ROLES)[number];

export const users = sqliteTable(
  'users',
  {
    id: ownId(),
    /** lower case */
    email: text('email').notNull().unique(),
    name: text('name').notNull(),
    /** argon2id, in PHC form */
    passwordHash: text('password_hash').notNull(),
    emailVerifiedAt: moment('email_verified_at'),
    suspendedAt: moment('suspended_at'),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [check('users_email_lower', sql`${table.email} = lower(${table.email})`)],
);

export const userRoles = sqliteTable(
  'user_roles',
  {
    userId: text('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    role: text('role', { enum: ROLES }).notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.userId, table.role] }),
    check('user_roles_role', sql`${table.role} in ('member', 'host', 'librarian', 'admin')`),
  ],
);

/** Sign-ins. The id is the SHA-256 of what the cookie holds, so a copy of the database opens no account. */
export const sessions = sqliteTable(
  'sessions',
  {
    id: text('id').primaryKey(),
    userId: text('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    /** seconds since 1970: end of the idle limit */
    expiresAt: integer('expires_at').notNull(),
    createdAt: moment('created_at').notNull(),
    seenAt: moment('seen_at').notNull(),
    userAgent: text('user_agent').notNull(),
  },
  (table) => [index('sessions_user').on(table.userId), index('sessions_expires').on(table.expiresAt)],
);

/** One-time links sent by mail. The id is the SHA-256 of what the link holds. */
export const mailTokens = sqliteTable(
  'mail_tokens',
  {
    id: text('id').primaryKey(),
    purpose: text('purpose', { enum: ['verify-email', 'reset-password', 'change-email'] }).notNull(),
    userId: text('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    /** the address it proves */
    email: text('email').notNull(),
    expiresAt: moment('expires_at').notNull(),
    usedAt: moment('used_at'),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [index('mail_tokens_user').on(table.userId, table.purpose)],
);

export const invitations = sqliteTable(
  'invitations',
  {
    id: ownId(),
    /** SHA-256 of what the link holds */
    tokenHash: text('token_hash').notNull().unique(),
    email: text('email').notNull(),
    roles: text('roles', { mode: 'json' }).$type<Role[]>().notNull(),
    invitedBy: text('invited_by').references(() => users.id, { onDelete: 'set null' }),
    createdAt: moment('created_at').notNull(),
    expiresAt: moment('expires_at').notNull(),
    acceptedAt: moment('accepted_at'),
    revokedAt: moment('revoked_at'),
  },
  (table) => [index('invitations_email').on(table.email)],
);
