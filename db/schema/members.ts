import { boolean, int, mysqlTable, varchar } from 'drizzle-orm/mysql-core'

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
  /** Reminders by mail; what tells of money or of a changed order always comes. */
  reminderMail: boolean().notNull().default(true),
  // Quiet hours on the wall clock of the member's own zone, "22:00" to "07:00"; all three or none.
  quietFrom: varchar({ length: 5 }),
  quietUntil: varchar({ length: 5 }),
  quietZone: varchar({ length: 40 }),
  updatedAt: instant().notNull(),
})
