import { index, integer, primaryKey, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';

export const people = sqliteTable(
  'people',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    name: text('name').notNull(),
    email: text('email').notNull(),
    passwordHash: text('password_hash'),
    /** SHA-256 of the one-time sign-in code, until it is used. */
    codeHash: text('code_hash'),
    codeExpiresAt: integer('code_expires_at'),
    disabledAt: integer('disabled_at'),
    createdAt: integer('created_at').notNull(),
    version: integer('version').notNull().default(1),
  },
  (t) => [uniqueIndex('people_public_id').on(t.publicId), uniqueIndex('people_email').on(t.email)],
);

export const personRoles = sqliteTable(
  'person_roles',
  {
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    role: text('role', { enum: ['reporter', 'editor', 'copy-desk', 'administrator'] }).notNull(),
  },
  (t) => [primaryKey({ columns: [t.personId, t.role] })],
);

export const sessions = sqliteTable(
  'sessions',
  {
    id: integer('id').primaryKey(),
    /** SHA-256 of the random session id that the token carries. */
    tokenHash: text('token_hash').notNull(),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    createdAt: integer('created_at').notNull(),
    expiresAt: integer('expires_at').notNull(),
  },
  (t) => [uniqueIndex('sessions_token_hash').on(t.tokenHash), index('sessions_person_id').on(t.personId)],
);

/** Failed sign-ins by account key and by address, counted over a window. */
export const signInFailures = sqliteTable(
  'sign_in_failures',
  {
    id: integer('id').primaryKey(),
    bucket: text('bucket').notNull(),
    at: integer('at').notNull(),
  },
  (t) => [index('sign_in_failures_bucket_at').on(t.bucket, t.at)],
);

/** One row while an empty newsroom waits for its first administrator. */
export const firstAdministratorCodes = sqliteTable('first_administrator_codes', {
  id: integer('id').primaryKey(),
  codeHash: text('code_hash').notNull(),
  usedAt: integer('used_at'),
});
