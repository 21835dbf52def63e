import { customType, datetime, varchar } from 'drizzle-orm/mysql-core'

/** UTC, milliseconds. Not `timestamp`: its range ends in 2038. */
export const instant = () => datetime({ mode: 'date', fsp: 3 })

/** better-auth's key of a person. */
export const memberRef = () => varchar({ length: 36 })

/** 128 random bits, base64url: what stands in addresses, links and mails instead of the integer key. */
export const publicId = () => varchar({ length: 22 }).notNull().unique()

/** JSON with a type of ours; MariaDB keeps it as checked text, so the driver may hand back a string. */
export const jsonOf = <T>() =>
  customType<{ data: T; driverData: string }>({
    dataType: () => 'json',
    toDriver: (value) => JSON.stringify(value),
    fromDriver: (value) => (typeof value === 'string' ? (JSON.parse(value) as T) : (value as T)),
  })()
