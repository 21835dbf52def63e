import { isStaff, type Caller } from '@/server/http/caller'
import type { MemberRow } from '@/server/members/member-store'
import { themeChoice, unitSystem } from '@/shared/contracts/values'
import type { Me } from '@/shared/contracts/members'

export function presentMe(caller: Caller, row: MemberRow, waiting: Me['waiting']): Me {
  const { profile } = row
  const place =
    profile?.placeCell && profile.placeState
      ? {
          label: profile.placeLabel ?? profile.placeState,
          cell: profile.placeCell,
          state: profile.placeState,
        }
      : undefined
  const { quietFrom, quietUntil, quietZone } = profile ?? {}
  const quiet =
    quietFrom && quietUntil && quietZone ? { from: quietFrom, until: quietUntil, zone: quietZone } : undefined
  return {
    name: row.name,
    email: row.email,
    emailVerified: row.emailVerified,
    roles: caller.roles,
    secondFactor: { enabled: caller.hasSecondFactor, required: isStaff(caller) },
    ...(place ? { place } : {}),
    units: unitSystem.catch('us').parse(profile?.units),
    theme: themeChoice.catch('system').parse(profile?.theme),
    mail: { reminders: profile?.reminderMail ?? true, ...(quiet ? { quiet } : {}) },
    ...(row.seller ? { sellerId: row.seller.publicId } : {}),
    waiting,
  }
}
