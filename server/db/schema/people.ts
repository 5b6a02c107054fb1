import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { ROLES } from '../../../src/domain/access/policy';

export const users = sqliteTable(
  'users',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    name: text('name').notNull(),
    /** Lower case. */
    email: text('email').notNull(),
    role: text('role', { enum: ROLES }).notNull(),
    /** Argon2id; null until an invitation is accepted. */
    passwordHash: text('password_hash'),
    disabled: integer('disabled', { mode: 'boolean' }).notNull().default(false),
    /** SHA-256 of the invitation's token; the token itself is never stored. */
    invitationHash: text('invitation_hash'),
    invitationExpiresAt: integer('invitation_expires_at'),
    lastSeenAt: integer('last_seen_at'),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [
    uniqueIndex('users_email').on(t.email),
    uniqueIndex('users_invitation_hash').on(t.invitationHash),
    check('users_role', sql`${t.role} in ('administrator', 'restorer', 'appraiser', 'collector')`),
    check('users_email_lower', sql`${t.email} = lower(${t.email})`),
  ],
);

export const sessions = sqliteTable(
  'sessions',
  {
    /** SHA-256 of the cookie's session id. */
    idHash: text('id_hash').primaryKey(),
    /** Null before sign-in. */
    userId: integer('user_id').references(() => users.id, { onDelete: 'cascade' }),
    /** express-session's record as JSON. */
    data: text('data').notNull(),
    expiresAt: integer('expires_at').notNull(),
  },
  (t) => [index('sessions_user').on(t.userId), index('sessions_expiry').on(t.expiresAt)],
);

/** A person or firm that owns sets. */
export const owners = sqliteTable(
  'owners',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    name: text('name').notNull(),
    email: text('email').notNull().default(''),
    phone: text('phone').notNull().default(''),
    /** The collector who sees these sets when signed in. */
    userId: integer('user_id').references(() => users.id),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [index('owners_user').on(t.userId)],
);
