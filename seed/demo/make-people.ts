import { inTransaction } from '@/db/transaction'
import { buildMembers, type MemberWish } from '@/seed/build-member'
import { growers } from '@/seed/demo/growers.facts'
import { farms } from '@/seed/demo/farms.facts'
import { DEMO_PASSWORD, namedPeople } from '@/seed/demo/named-people.facts'
import { setSecondFactor } from '@/seed/demo/set-second-factor'
import { need, type Actor } from '@/seed/demo/stage'
import { requirePlace } from '@/server/places/find-place'
import type { Role } from '@/shared/api/endpoint'

interface Person {
  key: string
  email: string
  name: string
  zip: string
  staffRole?: 'moderator' | 'admin'
}

const mailName = (name: string) => name.toLowerCase().replace(/[^a-z]+/g, '.')

function everybody(): Person[] {
  const named = namedPeople.map(({ key, email, name, zip }): Person => {
    const isStaff = key === 'moderator' || key === 'admin'
    return { key, email, name, zip, ...(isStaff ? { staffRole: key } : {}) }
  })
  const owners = farms
    .filter(({ key }) => !named.some((person) => person.key === key))
    .map(({ key, owner, zip }): Person => ({ key, email: `${key}@farms.example`, name: owner, zip }))
  const buyers = growers.map(([name, zip]): Person => ({
    key: `grower ${name}`,
    email: `${mailName(name)}@growers.example`,
    name,
    zip,
  }))
  return [...named, ...owners, ...buyers]
}

async function wishOf({ email, name, zip, staffRole }: Person, at: Date): Promise<MemberWish> {
  const { label, cellId, state } = await requirePlace(zip, '#/near')
  const role = staffRole ? `member,${staffRole}` : 'member'
  return { email, name, password: DEMO_PASSWORD, role, place: { label, cell: cellId, state }, at }
}

function actorOf(
  { key, email, name, zip, staffRole }: Person,
  { memberId, state }: { memberId: string; state: string },
): Actor {
  const sells = farms.some((farm) => farm.key === key)
  const roles: Role[] = ['member', ...(staffRole ? [staffRole] : []), ...(sells ? (['seller'] as const) : [])]
  const caller = {
    memberId,
    name,
    email,
    emailVerified: true,
    roles,
    hasSecondFactor: Boolean(staffRole),
    sessionId: '',
  }
  return { caller, zip, state }
}

/** Everybody of the demo by key, as members who can sign in; staff with their second factor set. */
export async function makePeople(at: Date): Promise<Map<string, Actor>> {
  const people = everybody()
  const wishes = await Promise.all(people.map((person) => wishOf(person, at)))
  const made = await inTransaction((tx) => buildMembers(tx, wishes))
  for (const { key, factorSecret } of namedPeople) {
    const at = people.findIndex((person) => person.key === key)
    if (factorSecret) await setSecondFactor(need(made[at], key).memberId, factorSecret)
  }
  return new Map(
    people.map((person, index) => {
      const state = need(wishes[index]?.place?.state, `place of ${person.name}`)
      return [person.key, actorOf(person, { memberId: need(made[index], person.name).memberId, state })]
    }),
  )
}
