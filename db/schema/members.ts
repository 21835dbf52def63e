import { int, mysqlTable, varchar } from 'drizzle-orm/mysql-core'

import { user } from '@/db/schema/auth'
import { instant, memberRef } from '@/db/schema/columns'

/** What a member told us beside the sign-in: a place (kept as a cell, never a point) and how to print figures. */
export const memberProfile = mysqlTable('member_profile', {
  memberId: memberRef()
    .primaryKey()
    .references(() => user.id, { onDelete: 'cascade' }),
  placeLabel: varchar({ length: 120 }),
  placeCell: varchar({ length: 24 }),
  placeState: varchar({ length: 2 }),
  units: varchar({ length: 8 }).notNull().default('us'),
  /** Pickups to which the member did not come. */
  noShows: int({ unsigned: true }).notNull().default(0),
  theme: varchar({ length: 8 }).notNull().default('system'),
  updatedAt: instant().notNull(),
})
