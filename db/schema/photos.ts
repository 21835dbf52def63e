import { date, index, int, mysqlTable, smallint, varchar } from 'drizzle-orm/mysql-core'

import { instant, memberRef } from '@/db/schema/columns'

export const photo = mysqlTable(
  'photo',
  {
    /** 32 hex digits, made by the server; also the file's name. */
    id: varchar({ length: 32 }).primaryKey(),
    memberId: memberRef().notNull(),
    widthPx: smallint({ unsigned: true }).notNull(),
    heightPx: smallint({ unsigned: true }).notNull(),
    /** Difference hash of a 9 by 8 grey copy, 16 hex digits: near copies differ in few bits. */
    looksLike: varchar({ length: 16 }).notNull(),
    /** Average colour, shown while the picture loads. */
    ground: varchar({ length: 7 }).notNull(),
    takenOn: date({ mode: 'string' }),
    bytes: int({ unsigned: true }).notNull(),
    createdAt: instant().notNull(),
  },
  (t) => [index('k_photo_member').on(t.memberId, t.createdAt), index('k_photo_looks').on(t.looksLike)],
)
