import { bigint, boolean, index, int, mysqlTable, text, varchar } from 'drizzle-orm/mysql-core'

import { instant } from '@/db/schema/columns'

// The tables better-auth 1.7 reads and writes by these names; its `user` is our member.
export const user = mysqlTable('user', {
  id: varchar({ length: 36 }).primaryKey(),
  name: varchar({ length: 120 }).notNull(),
  email: varchar({ length: 254 }).notNull().unique(),
  emailVerified: boolean().notNull().default(false),
  image: text(),
  createdAt: instant().notNull(),
  updatedAt: instant().notNull(),
  role: varchar({ length: 60 }).notNull().default('member'),
  banned: boolean().notNull().default(false),
  banReason: text(),
  banExpires: instant(),
  twoFactorEnabled: boolean().notNull().default(false),
})

export const session = mysqlTable(
  'session',
  {
    id: varchar({ length: 36 }).primaryKey(),
    token: varchar({ length: 255 }).notNull().unique(),
    userId: varchar({ length: 36 })
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    expiresAt: instant().notNull(),
    createdAt: instant().notNull(),
    updatedAt: instant().notNull(),
    ipAddress: varchar({ length: 64 }),
    userAgent: text(),
    impersonatedBy: varchar({ length: 36 }),
  },
  (t) => [index('k_session_user').on(t.userId)],
)

export const account = mysqlTable(
  'account',
  {
    id: varchar({ length: 36 }).primaryKey(),
    accountId: varchar({ length: 255 }).notNull(),
    providerId: varchar({ length: 60 }).notNull(),
    userId: varchar({ length: 36 })
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    accessToken: text(),
    refreshToken: text(),
    idToken: text(),
    accessTokenExpiresAt: instant(),
    refreshTokenExpiresAt: instant(),
    scope: text(),
    password: text(),
    createdAt: instant().notNull(),
    updatedAt: instant().notNull(),
  },
  (t) => [index('k_account_user').on(t.userId)],
)

export const verification = mysqlTable(
  'verification',
  {
    id: varchar({ length: 36 }).primaryKey(),
    identifier: varchar({ length: 255 }).notNull(),
    value: text().notNull(),
    expiresAt: instant().notNull(),
    createdAt: instant().notNull(),
    updatedAt: instant().notNull(),
  },
  (t) => [index('k_verification_identifier').on(t.identifier)],
)

export const rateLimit = mysqlTable('rate_limit', {
  id: varchar({ length: 36 }).primaryKey(),
  key: varchar({ length: 255 }).notNull().unique(),
  count: int().notNull(),
  lastRequest: bigint({ mode: 'number' }).notNull(),
})

export const twoFactor = mysqlTable(
  'two_factor',
  {
    id: varchar({ length: 36 }).primaryKey(),
    secret: text().notNull(),
    backupCodes: text().notNull(),
    userId: varchar({ length: 36 })
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    verified: boolean().notNull().default(true),
    failedVerificationCount: int().notNull().default(0),
    lockedUntil: instant(),
  },
  (t) => [index('k_two_factor_user').on(t.userId)],
)
